package stirwright.correlation;

import static stirwright.correlation.Dimensions.BAFFLE_COUNT;
import static stirwright.correlation.Dimensions.BAFFLE_WIDTH;
import static stirwright.correlation.Dimensions.BLADE_ANGLE;
import static stirwright.correlation.Dimensions.BLADE_LENGTH;
import static stirwright.correlation.Dimensions.BLADE_THICKNESS;
import static stirwright.correlation.Dimensions.BLADE_WIDTH;
import static stirwright.correlation.Dimensions.CLEARANCE;
import static stirwright.correlation.Dimensions.IMPELLER_COUNT;
import static stirwright.correlation.Dimensions.IMPELLER_DIAMETER;
import static stirwright.correlation.Dimensions.IMPELLER_HEIGHT;
import static stirwright.correlation.Dimensions.IMPELLER_SPACING;
import static stirwright.correlation.Dimensions.LIQUID_HEIGHT;
import static stirwright.correlation.Dimensions.LIQUID_VOLUME;
import static stirwright.correlation.Dimensions.VESSEL_DIAMETER;

/** The hard limits between dimensions that every family starts with; an unknown dimension breaks none. */
final class VesselRules {

    /** Common practice, no source: the thickest blades in publications have 0.034 D. */
    private static final double THICKEST = 0.1;

    /** Common practice, no source: a cone or a dished bottom lowers the volume, nothing raises it. */
    private static final double LEAST_FILL = 0.2;
    private static final double MOST_FILL = 1.1;

    /** Common practice, no source: an anchor or a ribbon may rise somewhat above the liquid, not by more. */
    private static final double HIGHEST = 1.3;

    private VesselRules() {}

    static void addTo(Family.Builder family) {
        family.below(IMPELLER_DIAMETER, VESSEL_DIAMETER, 1)
                .below(CLEARANCE, LIQUID_HEIGHT, 1)
                .below(BAFFLE_WIDTH, VESSEL_DIAMETER, 0.5)
                .below(BLADE_WIDTH, IMPELLER_DIAMETER, 1)
                .below(BLADE_LENGTH, IMPELLER_DIAMETER, 1)
                .below(BLADE_THICKNESS, IMPELLER_DIAMETER, THICKEST)
                .rule(BAFFLE_WIDTH, "above 0 while baffle_count is",
                        g -> !(g.get(BAFFLE_COUNT) > 0 && g.get(BAFFLE_WIDTH) <= 0))
                .below(IMPELLER_HEIGHT, LIQUID_HEIGHT, HIGHEST)
                .rule(IMPELLER_COUNT, "few enough for the liquid: the uppermost impeller stands clearance_m + (count - 1) impeller_spacing_m"
                        + " above the bottom", g -> !(top(g) >= g.get(LIQUID_HEIGHT)))
                .rule(CLEARANCE, "above half the height of the blades", g -> !(g.get(CLEARANCE) <= halfBlade(g)))
                .rule(LIQUID_VOLUME, "from " + LEAST_FILL + " to " + MOST_FILL + " times pi/4 T^2 H",
                        g -> !(fill(g) < LEAST_FILL || fill(g) > MOST_FILL));
    }

    private static double top(Geometry g) {
        return g.get(CLEARANCE) + (g.get(IMPELLER_COUNT) - 1) * g.get(IMPELLER_SPACING);
    }

    /** NaN for a family without blades of a width, and for one whose clearance is that of its lower edge. */
    private static double halfBlade(Geometry g) {
        if (!Double.isNaN(g.get(IMPELLER_HEIGHT))) {
            return Double.NaN;
        }
        double angle = g.get(BLADE_ANGLE);
        return g.get(BLADE_WIDTH) / 2 * (Double.isNaN(angle) ? 1 : Math.sin(angle));
    }

    private static double fill(Geometry g) {
        double t = g.get(VESSEL_DIAMETER);
        return g.get(LIQUID_VOLUME) / (Math.PI / 4 * t * t * g.get(LIQUID_HEIGHT));
    }
}
