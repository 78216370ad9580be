package stirwright.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.Text;
import org.junit.jupiter.api.Test;
import stirwright.chart.Curve;
import stirwright.core.CandidateResult;
import stirwright.core.QuantityResult;
import stirwright.correlation.Bound;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.workbench.internal.session.Outcome;
import stirwright.workbench.internal.session.Row;
import stirwright.workbench.internal.session.View;

/** What is doubtful looks doubtful, and what is asked for says why. */
class DoubtTest {
    private static final List<String> DEMO = List.of("demo", "--window");

    @Test
    void aFigureOutsideTheRangeOfItsCorrelationSaysSo() throws Exception {
        OpenWindow.use(DEMO, window -> {
            window.type("Blade count", "3");
            CandidateResult pick = window.outcome().main().result().pick().orElseThrow();
            QuantityResult flow = window.outcome().main().result().quantities().stream()
                    .filter(q -> q.quantity().equals(Quantity.FLOW_NUMBER) && q.id().equals(pick.flowCorrelation())).findFirst()
                    .orElseThrow();
            assertTrue(flow.verdict().fails(), "a flow number for three blades: choose another case for this test");
            String reason = String.join("; ", flow.failedBounds());
            assertTrue(window.on(() -> window.all(Label.class, l -> l.isVisible() && l.getText().equals(flow.verdict().id())
                    && String.valueOf(l.getToolTipText()).contains(reason)).size() >= 1), "pumping passes for a sure number");
            window.type("Blade count", "6");
        });
    }

    @Test
    void aLawWithoutAStatedRangeIsStrongInTheRegimeOfTheCaseAlone() throws Exception {
        OpenWindow.use(DEMO, window -> {
            window.choose("Family", "anchor");
            window.type("Impeller diameter, m", "0.56");
            for (View view : List.of(View.POWER_NUMBER, View.POWER)) {
                window.run(() -> window.session().show(view));
                Outcome outcome = window.outcome();
                List<Row> unstated = outcome.rows().stream().filter(r -> r.correlation().flatMap(c -> c.bound(Measure.REYNOLDS))
                        .filter(Bound::stated).isEmpty()).toList();
                assertFalse(unstated.isEmpty(), "choose another family for this test");
                RegimeLimits limits = outcome.catalogue().family("anchor").orElseThrow().regimes()
                        .forFluid(outcome.main().result().pick().orElseThrow().state().orElseThrow().fluid());
                double here = outcome.main().result().pick().orElseThrow().state().orElseThrow().reynolds();
                for (Row row : unstated) {
                    Curve curve = outcome.picture().curves().stream().filter(c -> c.id().equals(row.key())).findFirst().orElseThrow();
                    int strong = 0;
                    for (int i = 0; view == View.POWER_NUMBER && i < curve.x().length; i++) {
                        assertTrue(!curve.inside()[i] || limits.at(curve.x()[i]) == limits.at(here), row.key() + " at " + curve.x()[i]);
                        strong += curve.inside()[i] ? 1 : 0;
                    }
                    assertTrue(view != View.POWER_NUMBER || row.verdict().fails() || strong > 0, row.key() + " is nowhere strong");
                }
            }
            assertTrue(window.on(() -> window.all(Label.class, l -> l.isVisible() && l.getText().equals("none known")).size() == 1),
                    "an anchor has no flow number, and pumping says nothing");
        });
    }

    @Test
    void captionsSayWhatIsMeant() throws Exception {
        OpenWindow.use(DEMO, window -> {
            assertEquals("C: impeller centre above the bottom", meaning(window, "Clearance"));
            window.choose("Family", "anchor");
            assertEquals("C: lower edge of the impeller above the bottom", meaning(window, "Clearance"));
            assertTrue(window.on(() -> window.all(Label.class, l -> l.isVisible() && l.getText().matches(".*(m[23]|\\^n)\\b.*"))
                    .isEmpty()), "exponents are written in two ways");
        });
    }

    private static String meaning(OpenWindow window, String caption) throws Exception {
        return window.on(() -> window.all(Label.class, l -> l.getText().equals(caption)).get(0).getToolTipText());
    }

    @Test
    void aReasonIsAskedForWhereItIsNeeded() throws Exception {
        OpenWindow.use(DEMO, window -> {
            Text reason = window.on(() -> window.find(Text.class, "reason for picking the selected candidate"));
            Button pick = window.on(() -> window.all(Button.class, b -> b.getText().equals("Pick this")).get(0));
            Outcome outcome = window.outcome();
            assertEquals("recommended", outcome.rows().get(0).role().id());
            assertFalse(window.on(reason::isVisible), "a reason for the recommended");
            assertTrue(window.on(pick::isEnabled));
            window.run(() -> window.session().select(outcome.rows().get(1).key()));
            assertTrue(window.on(reason::isVisible));
            assertFalse(window.on(pick::isEnabled));
            assertTrue(window.on(pick::getToolTipText).startsWith("A reason is needed"), "grey without a word");
            window.type("reason for picking the selected candidate", "tested");
            window.press("Pick this");
            assertFalse(window.on(reason::isVisible));
            assertTrue(window.on(() -> window.all(Button.class, b -> b.getText().equals("Use the recommended")).get(0).isVisible()));
        });
    }

    @Test
    void longNamesKeepTheirEndsAndFamiliesAreWhole() throws Exception {
        OpenWindow.use(DEMO, window -> {
            LooksTest.size(window, LooksTest.NORMAL);
            window.run(() -> {
                Table table = window.find(Table.class, "candidates");
                int cut = 0;
                for (var item : table.getItems()) {
                    String title = ((Row) item.getData()).title();
                    String shown = item.getText(1);
                    if (!shown.equals(title)) {
                        cut++;
                        assertTrue(title.endsWith(shown.substring(shown.indexOf('\u2026') + 1)), shown);
                        assertFalse(shown.endsWith("\u2026"), shown);
                    }
                }
                assertTrue(cut > 0, "nothing was cut, so nothing was tested");
                Combo family = window.find(Combo.class, "Family");
                GC gc = new GC(family);
                gc.setFont(family.getFont());
                for (String title : family.getItems()) {
                    // The arrow and the frame take about as much as two lines are high.
                    assertTrue(gc.textExtent(title).x + 2 * gc.getFontMetrics().getHeight() <= family.getSize().x,
                            title + " of " + gc.textExtent(title).x + " in " + family.getBounds() + " in " + family.getParent().getBounds());
                }
                gc.dispose();
            });
        });
    }
}
