package stirwright.correlation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

/** Limits are closed below, open above, and may differ for shear-thinning fluids. */
class RegimeLimitsTest {
    private static final Citation PLAIN = Citation.of("invented for a test", "p. 1");
    private static final Citation THINNING = Citation.of("invented for a test too", "p. 2");
    private static final RegimeLimits BOTH =
            RegimeLimits.of(10, 1000, PLAIN).withShearThinning(40, 2000, THINNING, "From 40 to 100.");

    @Test
    void eachKindOfFluidHasItsOwn() {
        assertEquals(Regime.TRANSITIONAL, BOTH.at(20, FluidClass.NEWTONIAN));
        assertEquals(Regime.TRANSITIONAL, BOTH.at(20, FluidClass.SHEAR_THICKENING));
        assertEquals(Regime.LAMINAR, BOTH.at(20, FluidClass.SHEAR_THINNING));
        assertEquals(Regime.LAMINAR, BOTH.at(40, FluidClass.YIELD_STRESS));
        assertEquals(Regime.TRANSITIONAL, BOTH.at(41, FluidClass.SHEAR_THINNING));
        assertEquals(Regime.TURBULENT, BOTH.at(1500, FluidClass.NEWTONIAN));
        assertEquals(Regime.TRANSITIONAL, BOTH.at(1500, FluidClass.SHEAR_THINNING));
        assertEquals(Regime.TURBULENT, BOTH.at(2000, FluidClass.SHEAR_THINNING));
    }

    @Test
    void withoutASecondPairAllFluidsAreAlike() {
        RegimeLimits one = RegimeLimits.of(10, 1000, PLAIN);
        for (FluidClass fluid : FluidClass.values()) {
            assertEquals(Regime.TRANSITIONAL, one.at(20, fluid));
        }
        assertTrue(one.shearThinning().isEmpty());
        assertEquals("", one.remark());
    }

    @Test
    void eachPairHasItsSourceAndItsRemark() {
        assertEquals(PLAIN, BOTH.citation());
        assertEquals(10, BOTH.laminarUpTo());
        RegimeLimits thinning = BOTH.shearThinning().orElseThrow();
        assertEquals(THINNING, thinning.citation());
        assertEquals("From 40 to 100.", thinning.remark());
        assertEquals(thinning, BOTH.forFluid(FluidClass.SHEAR_THINNING));
    }

    @Test
    void theSecondPairAscendsToo() {
        RegimeLimits one = RegimeLimits.of(10, 1000, PLAIN);
        assertTrue(assertThrows(ContractException.class, () -> one.withShearThinning(40, 30, THINNING, "")).getMessage()
                .contains("40.0 and 30.0"));
    }
}
