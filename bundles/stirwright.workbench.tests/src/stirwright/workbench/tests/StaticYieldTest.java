package stirwright.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.eclipse.swt.custom.StyledText;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;
import org.junit.jupiter.api.Test;
import stirwright.rheology.YieldRange;
import stirwright.study.Amounts;
import stirwright.study.StudyFiles;
import stirwright.workbench.internal.flow.FlowCurves;
import stirwright.workbench.internal.flow.FlowSheet;
import stirwright.workbench.internal.session.Page;
import stirwright.workbench.internal.widgets.Names;

/** What a vane gave, typed into the window. */
class StaticYieldTest {
    private static final List<String> DEMO = List.of("demo", "--window");
    private static final String FIELD = "Static yield stress, Pa";
    private static final String REASON = "reason for picking the selected model";

    @Test
    void itIsASourceOfTheRangeAndOneStepToUndo() throws Exception {
        OpenWindow.use(DEMO, window -> {
            YieldRange fitted = FlowPageTest.add(window, InventedCurves.ramps()).yield().orElseThrow();
            byte[] before = bytes(window);
            assertTrue(fitted.high() < 60, fitted.toString());
            window.type(FIELD, "0.06 kPa");
            FlowSheet sheet = FlowPageTest.settle(window);
            assertEquals(60, sheet.yield().orElseThrow().high(), 1e-12);
            assertEquals(fitted.low(), sheet.yield().orElseThrow().low(), 0.0);
            assertTrue(card(window).contains("static, as given for the fluid: 60 Pa; start-up after rest"), card(window));
            LooksTest.size(window, LooksTest.NORMAL);
            LooksTest.picture(window, "flow-static-yield");
            window.run(() -> window.session().undo());
            assertEquals(fitted.high(), FlowPageTest.settle(window).yield().orElseThrow().high(), 0.0);
            assertArrayEquals(before, bytes(window));
            assertEquals("", window.on(() -> window.find(Text.class, FIELD).getText()));
        });
    }

    @Test
    void aPickKeepsItAndWidensItsRangeByIt() throws Exception {
        OpenWindow.use(DEMO, window -> {
            double low = FlowPageTest.add(window, InventedCurves.ramps()).yield().orElseThrow().low();
            window.type(FIELD, "60");
            FlowPageTest.settle(window);
            window.press("Pick this model");
            FlowPageTest.settle(window);
            assertEquals(OptionalDouble.of(60), amount(window, "static_yield_stress_Pa"));
            assertEquals(OptionalDouble.of(60), amount(window, "yield_stress_high_Pa"));
            assertEquals(low, amount(window, "yield_stress_low_Pa").orElseThrow(), 1e-5 * low);
            assertEquals(60, window.outcome().main().result().pick().orElseThrow().yieldEffect().high(), 0.0);
            String notes = String.join("\n", window.outcome().main().result().notes());
            assertTrue(notes.contains("static yield stress 60 Pa: start-up after rest needs its own check"), notes);
        });
    }

    @Test
    void besideAPowerLawItStaysAndBoundsNothing() throws Exception {
        OpenWindow.use(DEMO, window -> {
            FlowPageTest.add(window, InventedCurves.ramps());
            window.type(FIELD, "60");
            window.run(() -> FlowPageTest.of(window, FlowCurves.class).select("power-law"));
            FlowPageTest.settle(window);
            window.type(REASON, "the plant's sheet asks for one");
            window.press("Pick this model");
            FlowPageTest.settle(window);
            assertEquals(OptionalDouble.of(60), amount(window, "static_yield_stress_Pa"));
            assertEquals(OptionalDouble.empty(), amount(window, "yield_stress_high_Pa"));
            assertEquals(Optional.empty(), window.outcome().main().result().refusal());
            assertEquals("60", window.on(() -> window.find(Text.class, FIELD).getText()), "it can be seen beside any model here");
        });
    }

    @Test
    void itStandsWithTheBoundsOnTheCasePageAndIsRefusedThere() throws Exception {
        OpenWindow.use(DEMO, window -> {
            double power = window.outcome().rows().get(0).power();
            window.type(FIELD, "300");
            assertEquals(power, window.outcome().rows().get(0).power(), 0.0, "no running power rests on it");
            window.type(FIELD, "-3");
            String refusal = window.outcome().main().result().refusal().orElseThrow().words();
            assertTrue(refusal.startsWith("static_yield_stress_Pa -3 "), refusal);
            assertEquals(1, (int) window.on(() -> window.all(Label.class,
                    l -> l.isVisible() && l.getText().startsWith("static yield stress (Pa) -3 must be")).size()));
            String tip = window.on(() -> window.all(Label.class, l -> l.isVisible() && l.getText().equals("Static yield stress"))
                    .get(0).getToolTipText());
            assertTrue(tip.contains("measured with a vane or a stress ramp"), tip);
            window.choose("Model", "Power law");
            window.run(() -> assertEquals(List.of(), window.all(Text.class, t -> FIELD.equals(Names.of(t)))));
            FlowPageTest.turnTo(window, Page.FLOW_CURVE);
            assertEquals("-3", window.on(() -> window.find(Text.class, FIELD).getText()));
        });
    }

    private static OptionalDouble amount(OpenWindow window, String column) throws Exception {
        return window.on(() -> Amounts.get(FlowPageTest.fluid(window).getAmounts(), column));
    }

    private static String card(OpenWindow window) throws Exception {
        return window.on(() -> window.find(StyledText.class, "card of the selected model").getText());
    }

    private static byte[] bytes(OpenWindow window) throws Exception {
        return window.on(() -> StudyFiles.bytes(window.session().editor().study()));
    }
}
