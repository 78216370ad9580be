package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import stirwright.correlation.Correlation;
import stirwright.correlation.Quantity;
import stirwright.rheology.Fluid;
import stirwright.rheology.FluidModel;
import stirwright.rheology.MeasuredWindow;
import stirwright.rheology.Newtonian;
import stirwright.rheology.PowerLaw;

/** Every shear rate of a result is held against the rates at which the fluid was measured. */
class WindowUseTest {
    private static final Correlation KS = Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.ten", 10);
    private static final Correlation FIVE = Invented.constant(Quantity.POWER_NUMBER, "np.five", 5);
    private static final Correlation MORE = Invented.constant(Quantity.POWER_NUMBER, "np.more", 500);

    private static CaseResult check(SpeedDemand demand, FluidModel model, MeasuredWindow window, Correlation... all) {
        return new CrossCheck(Invented.catalogue(all)).check(new CaseSpec("case", Invented.FAMILY, Invented.vessel(),
                demand, new Fluid(model, 1000, window), Choices.NONE, List.of()));
    }

    /** P/V = 5 * 1000 * 8 * 0.03125/2.6507 = 471.57 W/m3 in 0.01 Pa s: sqrt of their ratio, 217.2 1/s; 0.8 decades above 35. */
    @Test
    void thePowerBasedAverageIsNotedAndFlagsNothing() {
        CaseResult result = check(new SpeedDemand.At(2), new Newtonian(0.01), new MeasuredWindow(1, 35), KS, FIVE);
        assertEquals(List.of(), result.flags());
        assertEquals(Status.OK, result.status());
        assertEquals(List.of("the power-based average shear rate 217.2 1/s is 0.8 decades outside the measured window"
                + " 1 to 35 1/s; nothing else rests on it"), decades(result.notes()));
    }

    @Test
    void theAverageAtTheImpellerFlags() {
        CaseResult result = check(new SpeedDemand.At(2), new PowerLaw(1, 0.5), new MeasuredWindow(Double.NaN, 2), KS, FIVE);
        assertEquals(List.of("shear rate 20 1/s is 1.0 decades outside the measured window up to 2 1/s"),
                decades(result.flags()));
        assertEquals(1, decades(result.notes()).size());
    }

    @Test
    void aLittleOutsideIsNotZeroDecades() {
        CaseResult result = check(new SpeedDemand.At(2), new Newtonian(1), new MeasuredWindow(20.5, 1000), KS, FIVE);
        assertEquals(List.of("shear rate 20 1/s is less than 0.1 decades outside the measured window 20.5 to 1000 1/s"),
                result.flags());
    }

    @Test
    void otherCandidatesSpeakForThemselves() {
        CaseResult result = check(new SpeedDemand.ForPowerPerVolume(100), new PowerLaw(1, 0.5), new MeasuredWindow(10, 1e4),
                KS, FIVE, MORE);
        CandidateResult pick = result.pick().orElseThrow();
        assertEquals("invented.np.five", pick.correlation());
        assertEquals(List.of(), decades(pick.notes()));
        // The hundredfold power number meets the target at a speed that is lower by its cube root, so at 2.58 1/s.
        List<String> other = decades(Invented.row(result, "np.more").notes());
        assertEquals(1, other.size(), other::toString);
        assertTrue(other.get(0).startsWith("its shear rate 2."), other::toString);
        assertEquals(List.of(), decades(result.notes()));
    }

    @Test
    void nothingIsSaidInsideOrWithoutAWindow() {
        for (MeasuredWindow window : List.of(MeasuredWindow.UNKNOWN, new MeasuredWindow(1, 1000))) {
            CaseResult result = check(new SpeedDemand.At(2), new Newtonian(0.01), window, KS, FIVE, MORE);
            assertEquals(List.of(), decades(result.flags()));
            assertEquals(List.of(), decades(result.notes()));
        }
    }

    private static List<String> decades(List<String> sentences) {
        return sentences.stream().filter(s -> s.contains("decades outside the measured window")).toList();
    }
}
