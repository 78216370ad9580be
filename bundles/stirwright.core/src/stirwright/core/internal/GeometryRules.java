package stirwright.core.internal;

import static stirwright.correlation.Dimensions.BAFFLE_WIDTH;
import static stirwright.correlation.Dimensions.BLADE_LENGTH;
import static stirwright.correlation.Dimensions.BLADE_WIDTH;
import static stirwright.correlation.Dimensions.CLEARANCE;
import static stirwright.correlation.Dimensions.IMPELLER_DIAMETER;
import static stirwright.correlation.Dimensions.LIQUID_HEIGHT;
import static stirwright.correlation.Dimensions.VESSEL_DIAMETER;
import static stirwright.correlation.Dimensions.WALL_GAP;

import java.util.Set;
import stirwright.core.CaseRefusedException;
import stirwright.correlation.Figures;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.GeometryParameter.Kind;

/** Hard limits: beyond them a geometry does not exist or a unit was mistaken. */
public final class GeometryRules {

    /** Common practice, no source: a longer dimension is a length in mm. */
    private static final double LONGEST = 50;

    /** A wall gap may differ from (T - D)/2 by this share of T, as the case table's contract says. */
    private static final double GAP_SHARE = 0.01;

    private GeometryRules() {}

    public static void checkLimits(GeometryParameter parameter, double value) {
        if (parameter.kind() == Kind.COUNT && value != Math.rint(value)) {
            throw refusal(parameter, value, "is not a whole number");
        }
        if (!(value >= parameter.min() && value <= parameter.max())) {
            throw refusal(parameter, value, "is not " + allowed(parameter));
        }
        if (parameter.kind() == Kind.LENGTH && value > LONGEST) {
            throw refusal(parameter, value, "is above " + Figures.show(LONGEST) + " m; is it in mm");
        }
    }

    private static String allowed(GeometryParameter parameter) {
        double least = parameter.toColumn(parameter.min());
        double most = parameter.toColumn(parameter.max());
        if (parameter.max() == Double.MAX_VALUE) {
            return parameter.min() == Double.MIN_VALUE ? "above 0" : "at least " + Figures.show(least);
        }
        return "from " + Figures.show(least) + " to " + Figures.show(most);
    }

    /** Checks dimensions against each other; says "below", since equal sizes touch. */
    public static void checkTogether(Geometry g, Set<String> given) {
        below(g, IMPELLER_DIAMETER, VESSEL_DIAMETER, 1);
        below(g, CLEARANCE, LIQUID_HEIGHT, 1);
        below(g, BAFFLE_WIDTH, VESSEL_DIAMETER, 0.5);
        below(g, BLADE_WIDTH, IMPELLER_DIAMETER, 1);
        below(g, BLADE_LENGTH, IMPELLER_DIAMETER, 1);
        double fromDiameters = (g.get(VESSEL_DIAMETER) - g.get(IMPELLER_DIAMETER)) / 2;
        if (given.contains(WALL_GAP.id())
                && Math.abs(g.get(WALL_GAP) - fromDiameters) > GAP_SHARE * g.get(VESSEL_DIAMETER)) {
            throw refusal(WALL_GAP, g.get(WALL_GAP), "contradicts (T - D)/2 = " + Figures.show(fromDiameters)
                    + " m by more than 1 % of the vessel diameter");
        }
    }

    private static void below(Geometry g, GeometryParameter smaller, GeometryParameter larger, double share) {
        double limit = share * g.get(larger);
        if (g.get(smaller) >= limit) {
            throw refusal(smaller, g.get(smaller), "is not below " + (share == 1 ? "" : Figures.show(share) + " times ")
                    + larger.column() + " " + Figures.show(g.get(larger)));
        }
    }

    private static CaseRefusedException refusal(GeometryParameter parameter, double value, String reason) {
        return new CaseRefusedException(parameter.column(), Figures.show(parameter.toColumn(value)), reason);
    }
}
