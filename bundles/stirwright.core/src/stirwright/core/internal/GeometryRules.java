package stirwright.core.internal;

import static stirwright.correlation.Dimensions.IMPELLER_DIAMETER;
import static stirwright.correlation.Dimensions.VESSEL_DIAMETER;
import static stirwright.correlation.Dimensions.WALL_GAP;

import java.util.Set;
import stirwright.core.CaseRefusedException;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Family;
import stirwright.correlation.Figures;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.GeometryParameter.Kind;
import stirwright.correlation.GeometryRule;

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

    /** Checks dimensions against each other, as the family demands. */
    public static void checkTogether(Family family, VesselGeometry g, Set<String> given) {
        for (GeometryRule rule : family.rules()) {
            if (!rule.holds(g)) {
                throw refusal(rule.named(), g.get(rule.named()), whose(rule, g) + "is not " + rule.words(g));
            }
        }
        double fromDiameters = (g.get(VESSEL_DIAMETER) - g.get(IMPELLER_DIAMETER)) / 2;
        if (given.contains(WALL_GAP.id())
                && Math.abs(g.get(WALL_GAP) - fromDiameters) > GAP_SHARE * g.get(VESSEL_DIAMETER)) {
            throw refusal(WALL_GAP, g.get(WALL_GAP), "contradicts (T - D)/2 = " + Figures.show(fromDiameters)
                    + " m by more than 1 % of the vessel diameter");
        }
    }

    /** Nobody looks for a value that nobody gave, so it is said to be a default. */
    private static String whose(GeometryRule rule, VesselGeometry g) {
        return g.defaulted().contains(rule.named()) ? "(nobody gave it: " + g.defaultInWords(rule.named()) + ") " : "";
    }

    private static CaseRefusedException refusal(GeometryParameter parameter, double value, String reason) {
        return new CaseRefusedException(parameter.column(), Figures.show(parameter.toColumn(value)), reason);
    }
}
