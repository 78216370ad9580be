package stirwright.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StyledText;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import org.junit.jupiter.api.Test;
import stirwright.chart.ChartView;
import stirwright.correlation.Correlation;
import stirwright.workbench.internal.session.Row;

/** The table of candidates, its card and what both do to the chart. */
class CandidatesTest {
    private static final List<String> DEMO = List.of("demo", "--window");

    @Test
    void aClickOnAHeadSortsAndASecondTurnsRound() throws Exception {
        OpenWindow.use(DEMO, window -> {
            List<Row> byValue = window.outcome().rows().stream().sorted(Comparator.comparingDouble(Row::value)).toList();
            clickHead(window, "Np");
            assertEquals(byValue.stream().map(Row::key).toList(), keys(window));
            clickHead(window, "Np");
            assertEquals(byValue.reversed().stream().map(Row::value).toList(),
                    window.on(() -> rows(window).stream().map(Row::value).toList()));
            window.type("Speed, rev/min", "200");
            double[] values = window.on(() -> rows(window).stream().mapToDouble(Row::value).toArray());
            for (int i = 1; i < values.length; i++) {
                assertTrue(values[i] <= values[i - 1], "the order is lost when numbers change: " + Arrays.toString(values));
            }
        });
    }

    @Test
    void theCardHasFormulaRangeAndSourceOfTheSelected() throws Exception {
        OpenWindow.use(DEMO, window -> {
            for (Row row : window.outcome().rows()) {
                select(window, row);
                Correlation correlation = row.correlation().orElseThrow();
                String card = window.on(() -> window.find(StyledText.class, "card of the selected candidate").getText());
                assertTrue(card.startsWith(row.title()), card);
                for (String part : List.of(row.why(), correlation.formula(), correlation.citation().toString(), correlation.id(),
                        correlation.transcription().words(), correlation.validity().get(0).words())) {
                    assertTrue(card.contains(part), () -> "the card lacks '" + part + "': " + card);
                }
                row.failedBounds().forEach(b -> assertTrue(card.contains(b.substring(0, b.indexOf(" is "))), b));
            }
        });
    }

    @Test
    void selectingARowDrawsItsCurveStronger() throws Exception {
        OpenWindow.use(DEMO, window -> {
            byte[] before = drawn(window);
            select(window, window.outcome().rows().get(1));
            assertFalse(Arrays.equals(before, drawn(window)), "the chart does not show what is selected");
            assertEquals(window.outcome().rows().get(1).key(), window.on(() -> window.session().selected().orElseThrow().key()));
        });
    }

    @Test
    void aCurveIsSwitchedOffAndOn() throws Exception {
        OpenWindow.use(DEMO, window -> {
            select(window, window.outcome().rows().get(0));
            byte[] before = drawn(window);
            check(window, 1, false);
            byte[] without = drawn(window);
            assertFalse(Arrays.equals(before, without), "the curve is still there");
            window.type("Speed, rev/min", "180");
            assertFalse(window.on(() -> table(window).getItem(1).getChecked()), "the mark comes back by itself");
            check(window, 1, true);
            assertTrue(Arrays.equals(before, drawn(window)), "the curve does not come back");
        });
    }

    @Test
    void theMenuSaysWhatWouldBeUndone() throws Exception {
        OpenWindow.use(DEMO, window -> {
            becomes(window, List.of("&Undo", "&Redo"));
            window.type("Density, kg/m3", "1700");
            becomes(window, List.of("&Undo set density", "&Redo"));
            window.run(() -> window.session().editor().undo());
            becomes(window, List.of("&Undo", "&Redo set density"));
        });
    }

    private static void becomes(OpenWindow window, List<String> labels) throws Exception {
        OpenWindow.await(labels.toString(), () -> {
            try {
                return editMenu(window).equals(labels);
            } catch (Exception failure) {
                throw new AssertionError(failure);
            }
        });
    }

    private static List<String> editMenu(OpenWindow window) throws Exception {
        return window.on(() -> {
            var edit = Arrays.stream(window.shell().getMenuBar().getItems()).filter(i -> i.getText().contains("Edit")).findFirst()
                    .orElseThrow().getMenu();
            edit.notifyListeners(SWT.Show, new Event());
            return Arrays.stream(edit.getItems()).map(i -> i.getText().replaceAll("\t.*", "")).toList();
        });
    }

    private static void clickHead(OpenWindow window, String title) throws Exception {
        window.run(() -> {
            TableColumn column = Arrays.stream(table(window).getColumns()).filter(c -> c.getText().equals(title)).findFirst()
                    .orElseThrow();
            column.notifyListeners(SWT.Selection, new Event());
        });
    }

    private static void select(OpenWindow window, Row row) throws Exception {
        window.run(() -> notify(window, item(window, row), SWT.NONE));
    }

    private static void check(OpenWindow window, int index, boolean on) throws Exception {
        window.run(() -> {
            TableItem item = table(window).getItem(index);
            assertNotEquals(on, item.getChecked());
            item.setChecked(on);
            notify(window, item, SWT.CHECK);
        });
    }

    private static void notify(OpenWindow window, TableItem item, int detail) {
        Event event = new Event();
        event.item = item;
        event.detail = detail;
        table(window).notifyListeners(SWT.Selection, event);
    }

    private static TableItem item(OpenWindow window, Row row) {
        return Arrays.stream(table(window).getItems()).filter(i -> ((Row) i.getData()).key().equals(row.key())).findFirst()
                .orElseThrow();
    }

    private static List<Row> rows(OpenWindow window) {
        return Arrays.stream(table(window).getItems()).map(i -> (Row) i.getData()).toList();
    }

    private static List<String> keys(OpenWindow window) throws Exception {
        return window.on(() -> rows(window).stream().map(Row::key).toList());
    }

    private static Table table(OpenWindow window) {
        return window.find(Table.class, "candidates");
    }

    /** The chart's dots, without cursor and focus. */
    private static byte[] drawn(OpenWindow window) throws Exception {
        return window.on(() -> {
            ChartView chart = window.all(ChartView.class, c -> true).get(0);
            return chart.image(600, 400, 1, stirwright.chart.Palette.light()).data;
        });
    }
}
