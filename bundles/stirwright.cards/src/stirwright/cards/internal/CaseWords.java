package stirwright.cards.internal;

import static stirwright.correlation.Dimensions.BAFFLE_WIDTH;
import static stirwright.correlation.Dimensions.IMPELLER_DIAMETER;
import static stirwright.correlation.Dimensions.LIQUID_HEIGHT;
import static stirwright.correlation.Dimensions.VESSEL_DIAMETER;

import java.util.Set;
import stirwright.correlation.Figures;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.GeometryParameter.Kind;
import stirwright.correlation.OperatingPoint;
import stirwright.correlation.Variable;

/** A case in words, as far as a formula reads it; each word begins with a comma. */
final class CaseWords {
    private static final Set<GeometryParameter> BY_VESSEL = Set.of(LIQUID_HEIGHT, BAFFLE_WIDTH);

    private CaseWords() {}

    /** Lengths over the impeller or the vessel diameter where the formula reads that too. */
    static String dimensions(Geometry geometry, Set<GeometryParameter> read) {
        StringBuilder words = new StringBuilder();
        for (GeometryParameter each : read) {
            words.append(", ");
            if (each.equals(VESSEL_DIAMETER) && read.contains(IMPELLER_DIAMETER)) {
                ratio(words, geometry, IMPELLER_DIAMETER, VESSEL_DIAMETER);
            } else if (BY_VESSEL.contains(each) && read.contains(VESSEL_DIAMETER)) {
                ratio(words, geometry, each, VESSEL_DIAMETER);
            } else if (each.kind() == Kind.LENGTH && !each.equals(IMPELLER_DIAMETER) && read.contains(IMPELLER_DIAMETER)) {
                ratio(words, geometry, each, IMPELLER_DIAMETER);
            } else {
                String unit = each.kind().columnUnit();
                words.append(each.symbol()).append(' ').append(Figures.show(each.toColumn(geometry.get(each))))
                        .append(unit.equals("-") ? "" : " " + unit);
            }
        }
        return words.toString();
    }

    private static void ratio(StringBuilder words, Geometry geometry, GeometryParameter over, GeometryParameter under) {
        words.append(over.symbol()).append('/').append(under.symbol()).append(' ').append(Figures.show(geometry.ratio(over, under)));
    }

    static String variables(OperatingPoint point, Set<Variable> reads) {
        StringBuilder words = new StringBuilder();
        for (Variable each : reads) {
            words.append(", ").append(each.symbol()).append(' ').append(Figures.show(point.get(each)))
                    .append(each.unit().equals("-") ? "" : " " + each.unit());
        }
        return words.toString();
    }
}
