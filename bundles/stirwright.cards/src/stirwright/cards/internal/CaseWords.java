package stirwright.cards.internal;

import java.util.Set;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Figures;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.GeometryParameter.Kind;
import stirwright.correlation.OperatingPoint;
import stirwright.correlation.Variable;

/** A case in words, as far as a formula reads it; each word begins with a comma. */
final class CaseWords {
    private CaseWords() {}

    /** Lengths over the impeller diameter where the formula reads that too. */
    static String dimensions(Geometry geometry, Set<GeometryParameter> read) {
        StringBuilder words = new StringBuilder();
        boolean scaled = read.contains(Dimensions.IMPELLER_DIAMETER);
        for (GeometryParameter each : read) {
            boolean ratio = scaled && each.kind() == Kind.LENGTH && !each.equals(Dimensions.IMPELLER_DIAMETER);
            String unit = ratio || each.kind().columnUnit().equals("-") ? "" : " " + each.kind().columnUnit();
            words.append(", ").append(each.symbol()).append(ratio ? "/D " : " ").append(Figures.show(
                    ratio ? geometry.ratio(each, Dimensions.IMPELLER_DIAMETER) : each.toColumn(geometry.get(each)))).append(unit);
        }
        return words.toString();
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
