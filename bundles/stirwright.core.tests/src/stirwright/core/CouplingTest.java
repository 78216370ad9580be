package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import stirwright.correlation.Correlation;
import stirwright.correlation.FluidClass;
import stirwright.correlation.Quantity;
import stirwright.correlation.Variable;
import stirwright.rheology.FluidModel;
import stirwright.rheology.HerschelBulkley;
import stirwright.rheology.Newtonian;
import stirwright.rheology.PowerLaw;

/** The loop between speed, shear rate, viscosity and a shear-rate constant that depends on them. */
class CouplingTest {
    private static final Correlation NP = Invented.constant(Quantity.POWER_NUMBER, "np.five", 5);
    private static final Correlation NQ = Invented.formula(
            Invented.anywhere(Quantity.FLOW_NUMBER, "nq.rising", Variable.REYNOLDS).constant("a", 0.1).constant("b", 0.1),
            "{a} Re^{b}", (g, k) -> p -> k.get("a") * Math.pow(p.reynolds(), k.get("b")));

    private static FluidState state(Correlation constant, SpeedDemand demand, FluidModel model) {
        CaseResult result = new CrossCheck(Invented.catalogue(NP, NQ, constant)).check(Invented.demand(demand, model));
        return result.pick().orElseThrow().state().orElseThrow();
    }

    @Test
    void constantThatStaysGivesTheShearRateByHand() {
        FluidState s = state(Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.ten", 10),
                new SpeedDemand.At(2), new PowerLaw(8, 0.5));
        assertEquals(20, s.shearRate(), 0);
        // 8 * 20^-0.5 = 1.788854 Pa s; 1000 * 2 * 0.25/1.788854 = 279.508
        assertEquals(1.788854381999832, s.viscosity(), 1e-12);
        assertEquals(279.5084971874737, s.reynolds(), 1e-9);
        assertEquals(0.5, s.flowIndex(), 1e-12);
        assertEquals(FluidClass.SHEAR_THINNING, s.fluid());
    }

    @Test
    void constantThatDependsOnTheLocalFlowIndexConverges() {
        Correlation ks = Invented.formula(
                Invented.anywhere(Quantity.SHEAR_RATE_CONSTANT, "ks.index", Variable.FLOW_INDEX).constant("a", 10),
                "{a} (1 + n)", (g, k) -> p -> k.get("a") * (1 + p.get(Variable.FLOW_INDEX)));
        HerschelBulkley fluid = new HerschelBulkley(12, 3, 0.6);
        FluidState s = state(ks, new SpeedDemand.At(1.5), fluid);
        double rate = s.shearRate();
        // Local flow index of a Herschel-Bulkley fluid: n K g^n/(ty + K g^n).
        double viscous = 3 * Math.pow(rate, 0.6);
        assertEquals(10 * (1 + 0.6 * viscous / (12 + viscous)), s.shearRateConstant(), 1e-10);
        assertEquals(FluidClass.YIELD_STRESS, s.fluid());
    }

    @Test
    void constantThatDependsOnTheReynoldsNumberConverges() {
        Correlation ks = Invented.formula(
                Invented.anywhere(Quantity.SHEAR_RATE_CONSTANT, "ks.reynolds", Variable.REYNOLDS)
                        .constant("a", 10).constant("b", 0.2),
                "{a} Re^{b}", (g, k) -> p -> k.get("a") * Math.pow(p.reynolds(), k.get("b")));
        FluidState s = state(ks, new SpeedDemand.At(2), new PowerLaw(8, 0.5));
        assertEquals(10 * Math.pow(s.reynolds(), 0.2), s.shearRateConstant(), 1e-9 * s.shearRateConstant());
        // By hand: ks = 10 Re^0.2, Re = 1000*2*0.25/(8 (2 ks)^-0.5) = 62.5 (2 ks)^0.5, so
        // ks^0.9 = 10 * 62.5^0.2 * 2^0.1, ks = 34.99.
        assertEquals(Math.pow(10 * Math.pow(62.5, 0.2) * Math.pow(2, 0.1), 1 / 0.9), s.shearRateConstant(), 1e-8);
    }

    @Test
    void constantThatDependsOnTheFlowNumberConverges() {
        Correlation ks = Invented.formula(
                Invented.anywhere(Quantity.SHEAR_RATE_CONSTANT, "ks.flow", Variable.FLOW_NUMBER).constant("a", 30),
                "{a} Nq", (g, k) -> p -> k.get("a") * p.get(Variable.FLOW_NUMBER));
        FluidState s = state(ks, new SpeedDemand.At(2), new PowerLaw(8, 0.5));
        assertEquals(30 * 0.1 * Math.pow(s.reynolds(), 0.1), s.shearRateConstant(), 1e-9);
    }

    /** A loop without a solution: the constant is always twice what it should be. */
    @Test
    void noConvergenceIsAnOutcomeWithAMessage() {
        Correlation never = Invented.formula(
                Invented.anywhere(Quantity.SHEAR_RATE_CONSTANT, "ks.never", Variable.VISCOSITY).constant("a", 2),
                "{a} times what gave the viscosity",
                // Viscosity 8 (ks N)^-0.5 at N = 2 gives back ks = (8/mu)^2/2.
                (g, k) -> p -> k.get("a") * Math.pow(8 / p.get(Variable.VISCOSITY), 2) / 2);
        Correlation ten = Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.ten", 10);
        CaseResult result = new CrossCheck(Invented.catalogue(NP, never, ten))
                .check(Invented.at(2, new PowerLaw(8, 0.5)));
        QuantityResult lost = result.quantities().stream()
                .filter(q -> q.id().equals("invented.ks.never")).findFirst().orElseThrow();
        assertEquals(Role.EXCLUDED, lost.role());
        assertTrue(lost.why().contains("does not converge"), lost.why());
        assertEquals("invented.ks.ten", result.pick().orElseThrow().shearRateCorrelation());
    }

    /** The plain iteration ks -> 8000/ks^2 runs away from its fixed point 20, which is not where it starts. */
    @Test
    void loopThatPlainIterationRunsAwayFromIsSolved() {
        Correlation steep = Invented.formula(
                Invented.anywhere(Quantity.SHEAR_RATE_CONSTANT, "ks.steep", Variable.VISCOSITY).constant("a", 8000),
                "{a} over the square", (g, k) -> p -> {
                    // Viscosity 8 (ks N)^-0.5 at N = 2 gives back ks = (8/mu)^2/2.
                    double implied = Math.pow(8 / p.get(Variable.VISCOSITY), 2) / 2;
                    return k.get("a") / (implied * implied);
                });
        FluidState s = state(steep, new SpeedDemand.At(2), new PowerLaw(8, 0.5));
        assertEquals(20, s.shearRateConstant(), 1e-9, "8000/ks^2 = ks has the root 20");
    }

    @Test
    void newtonianFluidIsCalledNewtonian() {
        FluidState s = state(Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.ten", 10),
                new SpeedDemand.At(2), new Newtonian(0.5));
        assertEquals(FluidClass.NEWTONIAN, s.fluid());
        assertEquals(1000, s.reynolds(), 1e-9);
    }
}
