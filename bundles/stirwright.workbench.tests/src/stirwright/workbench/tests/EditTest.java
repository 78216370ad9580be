package stirwright.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableItem;
import org.eclipse.swt.widgets.Text;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import stirwright.chart.Curve;
import stirwright.correlation.Figures;
import stirwright.study.StudyFiles;
import stirwright.workbench.internal.session.Outcome;
import stirwright.workbench.internal.session.Row;
import stirwright.workbench.internal.session.View;

/** What is edited in the window shows in chart and table at once, with the numbers of the command line. */
class EditTest {
    private static final List<String> DEMO = List.of("demo", "--window");

    @TempDir
    Path folder;

    @Test
    void everyEditShowsTheNumbersOfTheCommandLine() throws Exception {
        OpenWindow.use(DEMO, window -> {
            agrees(window);
            window.type("Speed, rev/min", "240");
            assertEquals(4.0, window.outcome().rows().get(0).speed(), 1e-15, "240 rev/min are 4 rev/s");
            agrees(window);
            window.type("Consistency, Pa s^n", "3.35");
            agrees(window);
            window.type("Impeller diameter, m", "180 mm");
            agrees(window);
            window.choose("Model", "Casson");
            window.type("Plastic viscosity, Pa s", "0.21");
            agrees(window);
            window.choose("Family", "pitched-blade turbine");
            assertEquals("pitchedblade", window.outcome().main().familyId());
            agrees(window);
            window.choose("Settled by", "target shear rate");
            window.type("Target shear rate, 1/s", "40");
            agrees(window);
        });
    }

    @Test
    void boundsOfTheYieldStressGoWithTheModelThatHasOne() throws Exception {
        OpenWindow.use(DEMO, window -> {
            window.type("Yield stress, Pa", "9");
            window.type("Lowest yield stress, Pa", "5");
            window.type("Highest yield stress, Pa", "14");
            agrees(window);
            String notes = String.join("\n", window.outcome().main().result().notes());
            assertTrue(notes.contains("yield stress given as 5 to 14 Pa"), notes);
            window.type("Lowest yield stress, Pa", "10");
            assertTrue(window.outcome().main().result().refusal().orElseThrow().words().contains("must not be above the yield stress"));
            window.choose("Model", "Power law");
            assertEquals(Optional.empty(), window.outcome().main().result().refusal());
            window.run(() -> window.session().editor().undo());
            assertTrue(window.outcome().main().result().refusal().isPresent(), "undone, the bounds are there again");
        });
    }

    @Test
    void undoToTheStartAndRedoToTheEndGiveTheSameFiles() throws Exception {
        OpenWindow.use(DEMO, window -> {
            byte[] start = bytes(window);
            window.type("Speed, rev/min", "95.5");
            window.choose("Model", "Power law");
            window.choose("Family", "pitched-blade turbine");
            window.type("Blade angle, deg", "30");
            window.run(() -> window.session().turnTo(window.session().editor().study().getCases().get(2)));
            window.press("disc turbine");
            pickSecond(window, "a colleague measured it");
            byte[] end = bytes(window);
            assertFalse(java.util.Arrays.equals(start, end));
            int steps = 0;
            while (window.on(() -> window.session().editor().canUndo())) {
                window.run(() -> window.session().editor().undo());
                steps++;
            }
            assertTrue(steps >= 6, "only " + steps + " steps");
            assertArrayEquals(start, bytes(window));
            window.settle();
            while (window.on(() -> window.session().editor().canRedo())) {
                window.run(() -> window.session().editor().redo());
            }
            assertArrayEquals(end, bytes(window));
        });
    }

    @Test
    void pickingAnotherCandidateAsksForAReasonAndKeepsIt() throws Exception {
        OpenWindow.use(DEMO, window -> {
            String recommended = window.outcome().rows().get(0).correlationId();
            Row other = window.outcome().rows().get(1);
            select(window, other);
            assertFalse(window.on(() -> window.all(org.eclipse.swt.widgets.Button.class, b -> b.getText().equals("Pick this")).get(0)
                    .isEnabled()), "a pick without a reason");
            pickSecond(window, "tested with this slip");
            Row pick = window.outcome().rows().get(0);
            assertEquals(other.correlationId(), pick.correlationId());
            assertEquals("chosen", pick.role().id());
            List<Map<String, String>> console = agrees(window);
            assertEquals("chosen", console.get(0).get("role"));
            assertTrue(console.get(0).get("notes").contains("tested with this slip"), console.get(0).get("notes"));
            window.press("Use the recommended");
            assertEquals(recommended, window.outcome().rows().get(0).correlationId());
            agrees(window);
        });
    }

    @Test
    void whatCannotBeReadStaysWithItsReasonAndTheNumbersStayToo() throws Exception {
        OpenWindow.use(DEMO, window -> {
            double power = window.outcome().rows().get(0).power();
            byte[] before = bytes(window);
            window.type("Density, kg/m3", "12 furlongs");
            assertArrayEquals(before, bytes(window));
            assertEquals(power, window.outcome().rows().get(0).power(), 0.0);
            assertEquals("12 furlongs", window.on(() -> window.find(Text.class, "Density, kg/m3").getText()));
            assertTrue(shown(window, "furlongs"), "no word beside the field");
            assertTrue(window.on(() -> window.all(org.eclipse.swt.widgets.Link.class,
                    l -> l.getText().contains("Fields that cannot be read: 1")).size() == 1));
            window.type("Density, kg/m3", "1.8 g/cm3");
            assertFalse(shown(window, "furlongs"));
            agrees(window);
        });
    }

    @Test
    void aRefusedCaseNamesItsFieldAndComesBack() throws Exception {
        OpenWindow.use(DEMO, window -> {
            window.type("Impeller diameter, m", "0.9");
            assertTrue(window.outcome().main().result().refusal().isPresent(), "an impeller wider than the vessel");
            assertTrue(shown(window, "impeller diameter (m) 0.9"), "no word beside the field");
            assertEquals(0, (int) window.on(() -> table(window).getItemCount()));
            window.type("Impeller diameter, m", "0.2");
            assertFalse(shown(window, "impeller diameter (m) 0.9"));
            agrees(window);
        });
    }

    @Test
    void severalFamiliesStandSideBySide() throws Exception {
        OpenWindow.use(DEMO, window -> {
            int alone = window.outcome().rows().size();
            window.press("pitched-blade turbine");
            Outcome both = window.outcome();
            assertEquals(2, both.sheets().size());
            assertTrue(both.rows().size() > alone);
            assertEquals(both.rows().size(), both.picture().curves().size());
            assertEquals(both.rows().size(), both.rows().stream().map(Row::style).distinct().count(), "two curves look alike");
            agrees(window);
        });
    }

    @Test
    void everyViewDrawsThePickThroughTheOperatingPoint() throws Exception {
        OpenWindow.use(DEMO, window -> {
            for (View view : View.values()) {
                window.run(() -> window.session().show(view));
                Outcome outcome = window.outcome();
                assertEquals(view, outcome.view());
                Curve pick = outcome.picture().curves().stream().filter(Curve::pick).findFirst().orElseThrow();
                double x = outcome.picture().operatingPoint().orElseThrow().x();
                double y = outcome.picture().operatingPoint().orElseThrow().y();
                assertEquals(y, interpolated(pick, x), 0.01 * y, view + ": the curve misses its own point");
            }
        });
    }

    /** Between the points of a curve, straight on the logarithms. */
    private static double interpolated(Curve curve, double x) {
        int i = 1;
        while (i < curve.x().length - 1 && curve.x()[i] < x) {
            i++;
        }
        double share = Math.log(x / curve.x()[i - 1]) / Math.log(curve.x()[i] / curve.x()[i - 1]);
        return curve.y()[i - 1] * Math.pow(curve.y()[i] / curve.y()[i - 1], share);
    }

    /** The table on the screen, the chart and the command line say the same. */
    private List<Map<String, String>> agrees(OpenWindow window) throws Exception {
        Outcome outcome = window.outcome();
        Path study = Files.createTempFile(folder, "edited", ".stir");
        window.run(() -> StudyFiles.write(window.session().editor().study(), study));
        String name = window.on(() -> window.session().current().orElseThrow().getName());
        List<Map<String, String>> console = Console.rows(study, name, outcome.catalogue());
        String family = outcome.main().familyId();
        List<Row> own = outcome.rows().stream().filter(r -> r.familyId().equals(family)).toList();
        assertEquals(console.stream().map(r -> r.get("correlation")).toList(), own.stream().map(Row::correlationId).toList());
        for (int i = 0; i < own.size(); i++) {
            Row row = own.get(i);
            Map<String, String> line = console.get(i);
            assertEquals(number(line, "power_number"), row.value(), 0.0, row.key());
            assertEquals(number(line, "power_W"), row.power(), 0.0, row.key());
            assertEquals(number(line, "torque_N_m"), row.torque(), 0.0, row.key());
            assertEquals(number(line, "deviation_from_pick"), row.deviation(), 0.0, row.key());
            assertEquals(line.get("verdict"), row.verdict().id(), row.key());
            assertEquals(line.get("role"), row.role().id(), row.key());
        }
        assertEquals(number(console.get(0), "reynolds"), outcome.picture().operatingPoint().orElseThrow().x(), 0.0);
        assertEquals(own.get(0).value(), outcome.picture().operatingPoint().orElseThrow().y(), 0.0);
        assertEquals(outcome.rows().stream().map(r -> r.title() + " " + Figures.show(r.value())).toList(), onScreen(window));
        return console;
    }

    private static double number(Map<String, String> line, String column) {
        return line.get(column).isEmpty() ? Double.NaN : Double.parseDouble(line.get(column));
    }

    /** Candidate and value of each row as the table shows them, cut names made whole. */
    private static List<String> onScreen(OpenWindow window) throws Exception {
        return window.on(() -> {
            List<String> rows = new ArrayList<>();
            int value = List.of(table(window).getColumns()).stream().map(c -> c.getText()).toList().indexOf("Np");
            for (TableItem item : table(window).getItems()) {
                String title = ((Row) item.getData()).title();
                String[] shown = item.getText(1).split("\u2026");
                assertTrue(title.startsWith(shown[0]) && title.endsWith(shown[shown.length - 1]),
                        title + " is shown as " + item.getText(1));
                rows.add(title + " " + item.getText(value).strip().replaceAll("[\u2007\u2008]", ""));
            }
            return rows;
        });
    }

    private static Table table(OpenWindow window) {
        return window.find(Table.class, "candidates");
    }

    private static boolean shown(OpenWindow window, String words) throws Exception {
        return window.on(() -> !window.all(org.eclipse.swt.widgets.Label.class,
                l -> l.isVisible() && l.getText().contains(words)).isEmpty());
    }

    private static void select(OpenWindow window, Row row) throws Exception {
        window.run(() -> {
            for (TableItem item : table(window).getItems()) {
                if (((Row) item.getData()).key().equals(row.key())) {
                    table(window).setSelection(item);
                    Event event = new Event();
                    event.item = item;
                    table(window).notifyListeners(SWT.Selection, event);
                }
            }
        });
    }

    private static void pickSecond(OpenWindow window, String reason) throws Exception {
        select(window, window.outcome().rows().get(1));
        window.type("reason for picking the selected candidate", reason);
        window.press("Pick this");
    }

    private static byte[] bytes(OpenWindow window) throws Exception {
        return window.on(() -> StudyFiles.bytes(window.session().editor().study()));
    }
}
