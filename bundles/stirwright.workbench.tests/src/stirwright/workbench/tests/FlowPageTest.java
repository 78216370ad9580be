package stirwright.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.List;
import java.util.Locale;
import org.eclipse.e4.ui.internal.workbench.swt.AbstractPartRenderer;
import org.eclipse.e4.ui.model.application.ui.basic.MWindow;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StyledText;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Link;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableItem;
import org.eclipse.swt.widgets.Text;
import org.junit.jupiter.api.Test;
import stirwright.chart.Rule;
import stirwright.core.FluidState;
import stirwright.rheology.FitOptions;
import stirwright.rheology.FlowCurve;
import stirwright.rheology.ModelFit;
import stirwright.rheology.ModelKind;
import stirwright.rheology.RankedFits;
import stirwright.study.Amounts;
import stirwright.study.Curve;
import stirwright.study.Curves;
import stirwright.study.Fluid;
import stirwright.study.StudyFiles;
import stirwright.workbench.internal.flow.FlowCurves;
import stirwright.workbench.internal.flow.FlowSheet;
import stirwright.workbench.internal.flowpage.FlowBelow;
import stirwright.workbench.internal.flowpage.FlowHead;
import stirwright.workbench.internal.session.Page;
import stirwright.workbench.internal.session.Pages;
import stirwright.workbench.internal.widgets.WordBar;

/** The flow-curve page in a real window: what it shows of invented curves, and the pick. */
class FlowPageTest {
    private static final List<String> DEMO = List.of("demo", "--window");
    /** Of a hundred thousand points on a busy machine. */
    private static final Duration PATIENCE = Duration.ofSeconds(60);
    private static final String REASON = "reason for picking the selected model";

    /** On the window's thread. */
    static <T> T of(OpenWindow window, Class<T> type) {
        return ((MWindow) window.shell().getData(AbstractPartRenderer.OWNING_ME)).getContext().get(type);
    }

    static void turnTo(OpenWindow window, Page page) throws Exception {
        window.run(() -> of(window, Pages.class).turnTo(page));
        window.settle();
    }

    static FlowSheet settle(OpenWindow window) throws Exception {
        window.settle();
        FlowCurves flow = window.on(() -> of(window, FlowCurves.class));
        OpenWindow.await("the fits", PATIENCE, () -> {
            boolean[] settled = new boolean[1];
            window.display().syncExec(() -> settled[0] = flow.fresh());
            return settled[0];
        });
        return window.on(() -> flow.sheet().orElseThrow());
    }

    /** On the window's thread, or while nothing changes. */
    static Fluid fluid(OpenWindow window) {
        return window.session().current().orElseThrow().getFluid();
    }

    static FlowSheet add(OpenWindow window, List<Curve> curves) throws Exception {
        window.run(() -> window.session().editor().edit("take", () -> fluid(window).getCurves().addAll(curves)));
        turnTo(window, Page.FLOW_CURVE);
        return settle(window);
    }

    private static FlowCurve points(Curve curve) {
        return FlowCurve.of(Curves.rates(curve), Curves.stresses(curve));
    }

    @Test
    void nothingOfThePageIsMadeBeforeItIsShown() throws Exception {
        OpenWindow.use(DEMO, window -> {
            window.run(() -> {
                assertEquals(List.of(), window.all(Control.class, c -> c instanceof FlowHead || c instanceof FlowBelow));
                assertTrue(of(window, FlowCurves.class).sheet().isEmpty());
            });
            window.type("Speed, rev/min", "150");
            assertTrue(window.on(() -> of(window, FlowCurves.class).sheet().isEmpty()), "nothing is fitted before");
        });
    }

    @Test
    void pagesAreTurnedByTheArrowKeysAndTheZonesStay() throws Exception {
        OpenWindow.use(DEMO, window -> {
            window.run(() -> {
                WordBar pages = window.find(WordBar.class, "pages; arrow keys turn them");
                Event right = new Event();
                right.keyCode = SWT.ARROW_RIGHT;
                pages.notifyListeners(SWT.KeyDown, right);
            });
            assertEquals(Page.FLOW_CURVE, window.on(() -> of(window, Pages.class).current()));
            settle(window);
            window.run(() -> {
                assertTrue(window.all(Link.class, l -> l.isVisible() && l.getText().equals("<a>Import flow curve</a>")).size() == 1, "one link");
                assertTrue(window.all(Label.class, l -> l.isVisible() && l.getText().contains("glaze slip has no measured flow curve")).size() == 1);
                assertFalse(window.find(Table.class, "candidates").isVisible());
            });
            turnTo(window, Page.CASE);
            window.run(() -> assertTrue(window.find(Table.class, "candidates").isVisible()));
        });
    }

    @Test
    void theModelsAreThoseOfTheSamePointsByTheRegressionItself() throws Exception {
        OpenWindow.use(DEMO, window -> {
            FlowSheet sheet = add(window, InventedCurves.ramps());
            assertEquals("up ramps", sheet.target().orElseThrow().title(), "up and down are not averaged");
            RankedFits fits = RankedFits.of(points(fluid(window).getCurves().get(0)), FitOptions.DEFAULT);
            assertEquals(fits.attempts().stream().map(RankedFits.Attempt::kind).toList(),
                    sheet.rows().stream().filter(r -> !r.key().equals("in use")).map(r -> r.kind()).toList());
            ModelFit best = fits.recommended().orElseThrow();
            assertEquals(ModelKind.HERSCHEL_BULKLEY, best.kind(), "what the points were made from");
            assertTrue(best.estimate("yield_stress").interval().contains(12), best.toString());
            window.run(() -> {
                TableItem first = window.find(Table.class, "models").getItem(0);
                assertEquals("1", first.getText(1));
                assertEquals("Herschel-Bulkley", first.getText(2));
                assertEquals(String.format(Locale.ROOT, "%.2f", 100 * best.rmsRelative()), first.getText(4));
            });
            String card = window.on(() -> window.find(StyledText.class, "card of the selected model").getText());
            for (String part : List.of("Weighted by relative deviation", "up over down at the average at the impeller",
                    "line 9: shear stress -0.2 Pa", "SHA-256 0123456789abcdef", "glaze-slip-invented.csv", "viscosity in mPa s")) {
                assertTrue(card.contains(part), () -> part + " is not in\n" + card);
            }
        });
    }

    @Test
    void aPickIsOneStepAndTheCaseUsesIt() throws Exception {
        OpenWindow.use(DEMO, window -> {
            FlowSheet sheet = add(window, InventedCurves.ramps());
            byte[] unpicked = window.on(() -> StudyFiles.bytes(window.session().editor().study()));
            assertEquals(sheet.reason(), window.on(() -> window.find(Text.class, REASON).getText()), "the recommendation's reason");
            window.type(REASON, "as thick as it comes out of the store");
            window.press("Pick this model");
            FlowSheet picked = settle(window);
            Fluid fluid = fluid(window);
            assertEquals("herschel-bulkley", fluid.getModel());
            assertEquals("as thick as it comes out of the store", fluid.getModelReason());
            double[] values = ModelKind.values(sheet.rows().get(0).model().orElseThrow());
            assertEquals(values[0], Amounts.get(fluid.getAmounts(), "yield_stress_Pa").orElseThrow(), 1e-5 * values[0]);
            assertEquals(values[1], Amounts.get(fluid.getAmounts(), "consistency_Pa_sn").orElseThrow(), 1e-5 * values[1]);
            assertEquals(values[2], Amounts.get(fluid.getAmounts(), "flow_index").orElseThrow(), 1e-5 * values[2]);
            assertEquals(InventedCurves.LEAST, Amounts.get(fluid.getAmounts(), "shear_rate_min_1_s").orElseThrow(), 1e-12);
            assertEquals(InventedCurves.MOST, Amounts.get(fluid.getAmounts(), "shear_rate_max_1_s").orElseThrow(), 1e-9);
            double low = Amounts.get(fluid.getAmounts(), "yield_stress_low_Pa").orElseThrow();
            double high = Amounts.get(fluid.getAmounts(), "yield_stress_high_Pa").orElseThrow();
            assertTrue(low <= 9 && 12 <= high, low + " to " + high + " must hold the yield stress of both ramps");
            assertTrue(picked.rows().get(0).pick(), "the model in use is the fitted one");
            assertTrue(picked.rows().stream().noneMatch(r -> r.key().equals("in use")));
            FluidState state = window.outcome().main().result().pick().orElseThrow().state().orElseThrow();
            assertEquals(sheet.rows().get(0).model().orElseThrow().apparentViscosity(state.shearRate()), state.viscosity(), 1e-5 * state.viscosity());
            window.run(() -> window.session().undo());
            assertArrayEquals(unpicked, window.on(() -> StudyFiles.bytes(window.session().editor().study())), "one step");
        });
    }

    @Test
    void anotherModelNeedsAReasonOfItsOwn() throws Exception {
        OpenWindow.use(DEMO, window -> {
            add(window, InventedCurves.ramps());
            window.run(() -> of(window, FlowCurves.class).select("power-law"));
            settle(window);
            assertEquals("", window.on(() -> window.find(Text.class, REASON).getText()));
            try {
                window.press("Pick this model");
                throw new IllegalStateException("it was picked without a reason");
            } catch (AssertionError refused) {
                assertTrue(refused.getMessage().contains("cannot be pressed"), refused.getMessage());
            }
            window.type(REASON, "the plant's sheet asks for one");
            window.press("Pick this model");
            settle(window);
            assertEquals("power-law", fluid(window).getModel());
            assertTrue(Amounts.get(fluid(window).getAmounts(), "yield_stress_Pa").isEmpty(), "nothing of the model before is left");
            assertTrue(Amounts.get(fluid(window).getAmounts(), "yield_stress_low_Pa").isEmpty(), "a power law has no yield stress");
            assertTrue(window.outcome().main().computed());
        });
    }

    @Test
    void theShearRatesOfTheCaseAreMarkedWithTheirDistance() throws Exception {
        OpenWindow.use(DEMO, window -> {
            FlowSheet sheet = add(window, InventedCurves.ramps());
            double rate = window.outcome().main().result().pick().orElseThrow().state().orElseThrow().shearRate();
            assertEquals(new Rule(rate, "average at the impeller", ""), sheet.picture().rules().get(0));
            assertEquals("power-based average", sheet.picture().rules().get(1).words());
            turnTo(window, Page.CASE);
            window.type("Speed, rev/min", "2400");
            turnTo(window, Page.FLOW_CURVE);
            FlowSheet fast = settle(window);
            double beyond = window.outcome().main().result().pick().orElseThrow().state().orElseThrow().shearRate();
            assertTrue(beyond > InventedCurves.MOST && beyond > 5 * rate, beyond + " 1/s");
            assertEquals(beyond, fast.picture().rules().get(0).x(), 1e-9 * beyond);
            assertEquals(String.format(Locale.ROOT, "%.1f decades above", Math.log10(beyond / InventedCurves.MOST)),
                    fast.picture().rules().get(0).doubt());
            LooksTest.picture(window, "flow-extrapolated");
        });
    }

    @Test
    void whatIsFittedFollowsTheChoices() throws Exception {
        OpenWindow.use(DEMO, window -> {
            add(window, InventedCurves.ramps());
            window.choose("Fit to", "down ramps");
            FlowSheet down = settle(window);
            assertEquals(RankedFits.of(points(fluid(window).getCurves().get(1)), FitOptions.DEFAULT).recommended().orElseThrow().rmsRelative(),
                    down.rows().get(0).rms(), 0.0);
            window.choose("Fit to", "all used curves together");
            FlowSheet all = settle(window);
            assertEquals(2, all.target().orElseThrow().curves().size());
            assertTrue(window.on(() -> window.find(StyledText.class, "card of the selected model").getText()).contains("Up and down ramps are fitted together"));
            window.press("Robust");
            settle(window);
            assertTrue(window.on(() -> window.find(StyledText.class, "card of the selected model").getText()).contains("count less"));
            window.run(() -> {
                Table curves = window.find(Table.class, "measured curves; a check mark uses one");
                curves.getItem(0).setChecked(false);
                Event event = new Event();
                event.item = curves.getItem(0);
                event.detail = SWT.CHECK;
                curves.notifyListeners(SWT.Selection, event);
            });
            FlowSheet one = settle(window);
            assertEquals(1, one.target().orElseThrow().curves().size());
            assertFalse(fluid(window).getCurves().get(0).isUsed());
            assertFalse(one.picture().points().get(0).used(), "it is shown lighter");
        });
    }

    @Test
    void aRemovedCurveComesBackByUndo() throws Exception {
        OpenWindow.use(DEMO, window -> {
            add(window, InventedCurves.ramps());
            window.run(() -> {
                Table curves = window.find(Table.class, "measured curves; a check mark uses one");
                curves.setSelection(1);
                Event event = new Event();
                event.keyCode = SWT.DEL;
                curves.notifyListeners(SWT.KeyDown, event);
            });
            assertEquals(1, settle(window).curves().size());
            window.run(() -> window.session().undo());
            assertEquals(2, settle(window).curves().size());
        });
    }

    @Test
    void theDemoHasAnInventedFlowCurve() throws Exception {
        OpenWindow.use(DEMO, window -> {
            window.run(() -> window.session().turnTo(window.session().editor().study().getCases().get(1)));
            turnTo(window, Page.FLOW_CURVE);
            FlowSheet sheet = settle(window);
            assertEquals(2, sheet.curves().size());
            assertTrue(sheet.curves().stream().allMatch(c -> c.label().contains("invented")));
            LooksTest.size(window, LooksTest.NORMAL);
            LooksTest.picture(window, "flow-demo");
        });
    }

    @Test
    void severalTemperaturesGiveALaw() throws Exception {
        OpenWindow.use(DEMO, window -> {
            FlowSheet sheet = add(window, List.of(InventedCurves.curve("cold", "up", InventedCurves.UP, 10, 3),
                    InventedCurves.curve("warm", "up", InventedCurves.DOWN, 40, 4)));
            assertEquals("up ramps, 10 \u00B0C", sheet.target().orElseThrow().title(), "temperatures are not mixed");
            String card = window.on(() -> window.find(StyledText.class, "card of the selected model").getText());
            assertTrue(card.contains("by the law of Arrhenius from 10 to 40"), card);
        });
    }
}
