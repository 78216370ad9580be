package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import stirwright.correlation.Correlation;
import stirwright.correlation.FluidClass;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.rheology.Fluid;
import stirwright.rheology.FluidModel;
import stirwright.rheology.MeasuredWindow;
import stirwright.rheology.Newtonian;
import stirwright.rheology.PowerLaw;

/** What flags a case, and what is only noted, as the contract page says of {@code status}. */
class DoubtsTest {
    private static final Correlation KS = Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.ten", 10,
            b -> b.fluids(FluidClass.NEWTONIAN));
    private static final Correlation WIDE = Invented.constant(Quantity.POWER_NUMBER, "np.five", 5,
            b -> b.nominal(Measure.W_OVER_D, 0.2));

    private static CaseResult check(Map<String, Double> vessel, SpeedDemand demand, FluidModel model, MeasuredWindow window) {
        return new CrossCheck(Invented.catalogue(KS, WIDE)).check(new CaseSpec("case", Invented.FAMILY, vessel, demand,
                new Fluid(model, 1000, window), Choices.NONE, List.of("from the reader")));
    }

    private static CaseResult check(Map<String, Double> vessel) {
        return check(vessel, new SpeedDemand.At(2), new Newtonian(0.01), MeasuredWindow.UNKNOWN);
    }

    @Test
    void everythingGivenIsOk() {
        CaseResult result = check(Invented.vessel());
        assertEquals(List.of(), result.flags());
        assertEquals(Status.OK, result.status());
        assertTrue(result.notes().contains("from the reader"));
        assertTrue(result.notes().stream().anyMatch(n -> n.startsWith("defaults: liquid_volume_m3 = 2.651")), result.notes().toString());
    }

    @Test
    void aDefaultThatThePickReadsIsFlaggedAnotherIsNoted() {
        Map<String, Double> vessel = Invented.vessel();
        vessel.remove("blade_width");
        vessel.remove("liquid_height");
        CaseResult result = check(vessel);
        assertEquals(List.of("assumed: blade_width_m = 0.1 (D/5)"), result.flags());
        assertTrue(result.notes().stream().anyMatch(n -> n.contains("liquid_height_m = 1.5 (T)")), result.notes().toString());
    }

    @Test
    void theLiquidHeightMattersWhenTheTargetIsPowerPerVolume() {
        Map<String, Double> vessel = Invented.vessel();
        vessel.remove("liquid_height");
        CaseResult result = check(vessel, new SpeedDemand.ForPowerPerVolume(100), new Newtonian(0.01), MeasuredWindow.UNKNOWN);
        assertEquals(List.of("assumed: liquid_height_m = 1.5 (T)"), result.flags());
    }

    @Test
    void anUnqualifiedShearRateConstantFlagsOnlyWhereThePowerRestsOnIt() {
        CaseResult thinning = check(Invented.vessel(), new SpeedDemand.At(2), new PowerLaw(2, 0.5), MeasuredWindow.UNKNOWN);
        assertEquals(1, thinning.flags().size(), thinning.flags().toString());
        assertTrue(thinning.flags().get(0).contains("invented.ks.ten does not qualify: fluid shear-thinning"));
        assertEquals(Status.OK, check(Invented.vessel()).status());
    }

    @Test
    void shearRateOutsideTheMeasuredWindowIsFlaggedInDecades() {
        CaseResult result = check(Invented.vessel(), new SpeedDemand.At(2), new Newtonian(1), new MeasuredWindow(200, 1000));
        assertEquals(List.of("shear rate 20 1/s is 1.0 decades outside the measured window 200 to 1000 1/s"), result.flags());
        assertEquals(Status.OK, check(Invented.vessel(), new SpeedDemand.At(2), new Newtonian(1), new MeasuredWindow(20, 1000)).status());
    }

    @Test
    void aLevelNearTheBladesIsACautionThatDefersToTheMaker() {
        Map<String, Double> vessel = Invented.vessel();
        vessel.put("liquid_height", 0.7);
        CaseResult result = check(vessel);
        assertEquals(Status.FLAGGED, result.status());
        assertTrue(result.flags().get(0).startsWith("caution: liquid level 0.2 m"), result.flags().toString());
        assertTrue(result.flags().get(0).contains("maker's minimum submergence"));
        vessel.put("liquid_height", 0.76);
        assertEquals(Status.OK, check(vessel).status());
    }

    @Test
    void bafflesThatReachIntoTheSweptCircleAreACaution() {
        Map<String, Double> vessel = Invented.vessel();
        vessel.put("impeller_diameter", 1.22);
        vessel.put("blade_width", 0.244);
        CaseResult result = check(vessel);
        assertTrue(result.flags().stream().anyMatch(f -> f.startsWith("caution: baffles of 0.15 m")), result.flags().toString());
        vessel.put("baffle_width", 0.13);
        assertTrue(check(vessel).flags().stream().noneMatch(f -> f.contains("baffles")));
    }

    /** V = 1.3 m3 in T = 1.5 m stands at 0.736 m; the impeller is at 0.5 m. */
    @Test
    void theLiquidHeightFollowsFromAGivenVolume() {
        Map<String, Double> vessel = Invented.vessel();
        vessel.remove("liquid_height");
        vessel.put("liquid_volume", 1.3);
        CaseResult result = check(vessel);
        assertTrue(result.flags().get(0).startsWith("caution: liquid level 0.2356 m"), result.flags().toString());
    }
}
