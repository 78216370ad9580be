package stirwright.correlation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Verdicts as the contract page words them: near is a tenth, for the Reynolds number a factor 1.5. */
class BoundTest {
    private static final Geometry SIX_BLADES = p -> p.equals(Dimensions.BLADE_COUNT) ? 6 : p.equals(Dimensions.BAFFLE_COUNT) ? 4 : 1;

    private static OperatingPoint reynolds(double value) {
        return new OperatingPoint() {
            @Override
            public double get(Variable variable) {
                return variable.equals(Variable.REYNOLDS) ? value : Double.NaN;
            }

            @Override
            public FluidClass fluid() {
                return FluidClass.SHEAR_THINNING;
            }
        };
    }

    @ParameterizedTest
    @CsvSource({
        "100, INSIDE", "1000, INSIDE", "500, INSIDE",
        "99, NEAR", "66.7, NEAR", "66.6, OUTSIDE", "1500, NEAR", "1501, OUTSIDE", "NaN, OUTSIDE",
    })
    void reynoldsNumberIsNearWithinAFactor(double found, Verdict expected) {
        Bound bound = new Bound.Range(Measure.REYNOLDS, 100, 1000, "");
        assertEquals(expected, bound.verdict(SIX_BLADES, reynolds(found)));
    }

    @ParameterizedTest
    @CsvSource({
        "0.2, INSIDE", "0.5, INSIDE", "0.181, NEAR", "0.179, OUTSIDE", "0.549, NEAR", "0.551, OUTSIDE",
    })
    void otherNumbersAreNearWithinATenthOfTheBound(double found, Verdict expected) {
        assertEquals(expected, Measure.D_OVER_T.verdict(found, 0.2, 0.5));
    }

    @Test
    void openEndsNeverFail() {
        Bound bound = new Bound.Range(Measure.REYNOLDS, 1e4, Double.POSITIVE_INFINITY, "");
        assertEquals(Verdict.INSIDE, bound.verdict(SIX_BLADES, reynolds(1e12)));
        assertEquals("Reynolds number at least 10000", bound.words());
        assertEquals("Reynolds number 9000", bound.found(SIX_BLADES, reynolds(9000)));
    }

    @Test
    void countsAndClassesAreInOrOut() {
        assertEquals(Verdict.INSIDE, new Bound.OneOf(Measure.BLADE_COUNT, List.of(4.0, 6.0)).verdict(SIX_BLADES, reynolds(1)));
        Bound four = new Bound.OneOf(Measure.BLADE_COUNT, List.of(4.0));
        assertEquals(Verdict.OUTSIDE, four.verdict(SIX_BLADES, reynolds(1)));
        assertEquals("blade count 4", four.words());
        Bound fluids = new Bound.InClass(Classifier.FLUID, List.of("newtonian"));
        assertEquals(Verdict.OUTSIDE, fluids.verdict(SIX_BLADES, reynolds(1)));
        assertEquals("fluid shear-thinning", fluids.found(SIX_BLADES, reynolds(1)));
        assertEquals(Verdict.INSIDE,
                new Bound.InClass(Classifier.BAFFLING, List.of("baffled")).verdict(SIX_BLADES, reynolds(1)));
    }

    @Test
    void roundingOfRatiosAndAnglesDoesNotFailABound() {
        Geometry sixtyDegrees = p -> Dimensions.BLADE_ANGLE.fromColumn(60);
        assertEquals(Verdict.INSIDE, new Bound.OneOf(Measure.BLADE_ANGLE, List.of(60.0)).verdict(sixtyDegrees, reynolds(1)));
        assertEquals(Verdict.INSIDE, Measure.D_OVER_T.verdict(0.6096 / 1.8288, 0.2, 1.0 / 3));
        assertEquals(Verdict.NEAR, Measure.D_OVER_T.verdict(1.000001 / 3, 0.2, 1.0 / 3));
    }

    @Test
    void notStatedNeedsAReason() {
        assertEquals(Verdict.NOT_STATED, new Bound.NotStated(Measure.D_OVER_T, "not in the table").verdict(SIX_BLADES, reynolds(1)));
        assertThrows(ContractException.class, () -> new Bound.NotStated(Measure.D_OVER_T, " "));
    }

    @Test
    void worstOfVerdictsFollowsTheContractsOrder() {
        assertEquals(List.of(Verdict.INSIDE, Verdict.NOT_STATED, Verdict.NEAR, Verdict.OUTSIDE), List.of(Verdict.values()));
        assertEquals(Verdict.NEAR, Verdict.NOT_STATED.worseOf(Verdict.NEAR));
        assertEquals(Verdict.OUTSIDE, Verdict.OUTSIDE.worseOf(Verdict.NEAR));
    }
}
