package stirwright.general;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.FluidClass;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.OperatingPoint;
import stirwright.correlation.Variable;

/** Six upright blades of D/5 at D/T 1/3, H = T: what the published blend with baffles gets wrong at low Re. */
class PaddlePowerTest {
    private static final double BAFFLE_WIDTH = 0.03;

    private static final Map<GeometryParameter, Double> SIX_BLADES = Map.of(
            Dimensions.IMPELLER_DIAMETER, 0.1,
            Dimensions.VESSEL_DIAMETER, 0.3,
            Dimensions.LIQUID_HEIGHT, 0.3,
            Dimensions.BLADE_COUNT, 6.0,
            Dimensions.BLADE_WIDTH, 0.02,
            Dimensions.BLADE_ANGLE, Math.PI / 2,
            Dimensions.BAFFLE_COUNT, 4.0,
            Dimensions.BAFFLE_WIDTH, BAFFLE_WIDTH);

    /** The plateau is 5.8 (8.3 6^0.7/5); tables have Np Re from 65 to 71, so about 70 at Re 1. */
    @Test
    void staysOnTheLaminarBranchAtReynoldsOne() {
        double np = baffled(BAFFLE_WIDTH, 1);
        assertTrue(np > 65 && np < 75, () -> "power number " + np);
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-2, 1, 10, 100, 1e3, 1e4, 1e5})
    void isNeverBelowTheVesselWithoutBaffles(double reynolds) {
        double without = value(PaddlePower.unbaffledPitchedBlade(), 0, reynolds);
        assertTrue(baffled(BAFFLE_WIDTH, reynolds) >= without);
        assertEquals(without, baffled(1e-9, reynolds), 1e-6 * without);
    }

    @Test
    void tendsToThePlateauWithMoreBafflesThanAnyVesselHas() {
        assertEquals(8.3 * Math.pow(6, 0.7) / 5, baffled(3, 1e5), 1e-3);
    }

    @Test
    void givesUprightBladesTheSameValueAsADiscTurbine() {
        assertEquals(value(PaddlePower.baffledDiscTurbine(), BAFFLE_WIDTH, 500), baffled(BAFFLE_WIDTH, 500), 1e-12);
    }

    /** Where the criterion is just met, baffling is 0.44 and x is 4.5 times that, 1.98: (1 + 1.98^-3)^(-1/3) = 0.96. */
    @Test
    void reachesNearlyThePlateauWhereTheCriterionIsMet() {
        assertEquals(0.96, PaddlePower.withBaffles(0, 1, 4.5 * 0.44, 3), 0.005);
    }

    private static double baffled(double baffleWidth, double reynolds) {
        return value(PaddlePower.baffledPitchedBlade(), baffleWidth, reynolds);
    }

    private static double value(Correlation correlation, double baffleWidth, double reynolds) {
        Geometry vessel = parameter -> parameter.equals(Dimensions.BAFFLE_WIDTH)
                ? baffleWidth
                : SIX_BLADES.getOrDefault(parameter, Double.NaN);
        return correlation.bind(vessel).at(new At(reynolds));
    }

    private record At(double reynolds) implements OperatingPoint {
        @Override
        public double get(Variable variable) {
            return variable.equals(Variable.REYNOLDS) ? reynolds : Double.NaN;
        }

        @Override
        public FluidClass fluid() {
            return FluidClass.NEWTONIAN;
        }
    }
}
