package stirwright.conformance;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;
import stirwright.correlation.Geometry;
import stirwright.correlation.OperatingPoint;

/**
 * What holds a correlation up: the numbers that it was compared with.
 *
 * @param lack why it has no number from outside, where its reference file says so
 */
public record Proof(Correlation correlation, List<Row> rows, Optional<String> lack) {

    /**
     * One comparison.
     *
     * @param place file and line
     * @param kind as the reference file says it
     * @param group printed, second author, independent, by hand, from memory
     * @param fromOutside whether the number comes from outside of what was typed in with the formula
     * @param tolerance relative
     * @param source where the expected number comes from
     * @param family of the impeller that was compared
     * @param geometry that impeller in its vessel
     * @param point the state in which both were compared
     */
    public record Row(
            String place, String kind, String group, boolean fromOutside, double expected, double computed,
            double tolerance, String source, Family family, Geometry geometry, OperatingPoint point) {

        /** Relative; NaN when nothing was computed. */
        public double deviation() {
            return computed / expected - 1;
        }
    }

    public Proof {
        rows = List.copyOf(rows);
    }

    public boolean hasRowFromOutside() {
        return rows.stream().anyMatch(Row::fromOutside);
    }

    /** How many rows there are of each group, in the order of the file. */
    public Map<String, Integer> counts() {
        Map<String, Integer> counts = new LinkedHashMap<>();
        rows.forEach(row -> counts.merge(row.group(), 1, Integer::sum));
        return counts;
    }

    /** The largest relative deviation, without its sign; 0 without rows. */
    public double worstDeviation() {
        return rows.stream().mapToDouble(row -> Math.abs(row.deviation())).max().orElse(0);
    }
}
