package stirwright.correlation;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.ToDoubleFunction;

/**
 * One dimension or count of a vessel or impeller: name, symbol, unit, meaning, hard limits, and
 * what stands in when nobody gave it. Immutable; {@code with...}, {@link #derivedAs}, {@link
 * #usually} and {@link #assumedAs} return a copy, so that a family takes a parameter from {@link
 * Dimensions} and gives it its own meaning and default.
 *
 * <p>A blank takes the first fallback that gives a finite number: what is derived, in the order in
 * which it was told; then what is usual or assumed. The functions are stateless and may be called
 * from several threads at once. They may read every parameter that was given, whatever its place,
 * and those that the family lists before this one; the rest is NaN.
 */
public final class GeometryParameter extends Term {

    /** What a parameter measures, which settles its unit. */
    public enum Kind {
        /** In m. */
        LENGTH("m", "_m", "m", 1),
        /** In rad; people and tables write degrees. */
        ANGLE("rad", "_deg", "degrees", Math.PI / 180),
        /** In m3. */
        VOLUME("m3", "_m3", "m3", 1),
        /** A whole number. */
        COUNT("-", "", "-", 1),
        /** A pure number. */
        RATIO("-", "", "-", 1);

        private final String unit;
        private final String columnSuffix;
        private final String columnUnit;
        private final double siPerColumnUnit;

        Kind(String unit, String columnSuffix, String columnUnit, double siPerColumnUnit) {
            this.unit = unit;
            this.columnSuffix = columnSuffix;
            this.columnUnit = columnUnit;
            this.siPerColumnUnit = siPerColumnUnit;
        }

        /** The SI unit; {@code "-"} for a pure number. */
        public String unit() {
            return unit;
        }

        /** The unit in which people and tables write it; {@code "-"} for a pure number. */
        public String columnUnit() {
            return columnUnit;
        }
    }

    /** How much a value that nobody gave deserves to be shown. */
    public enum Default {
        /** Nothing stands in: the value was given, or must be. */
        NONE,
        /** Follows from what was given, for instance T = D + 2 c; neither flagged nor doubtful in itself. */
        DERIVED,
        /** What everybody means by a blank, for instance one impeller. */
        USUAL,
        /** The standard geometry, assumed; results that rest on it are flagged. */
        ASSUMED
    }

    private final Kind kind;
    private final String symbol;
    private final String meaning;
    private final double min;
    private final double max;
    private final List<Fallback> fallbacks;

    private GeometryParameter(
            String id, String title, Kind kind, String symbol, String meaning, double min, double max,
            List<Fallback> fallbacks) {
        super(id, title);
        this.kind = kind;
        this.symbol = symbol;
        this.meaning = meaning;
        this.min = min;
        this.max = max;
        this.fallbacks = fallbacks;
    }

    /**
     * A parameter with neither default nor upper limit; lengths and volumes must be above zero,
     * counts at least 1.
     *
     * @param meaning how it is measured, in one sentence that replaces a figure
     */
    public static GeometryParameter of(String id, String title, Kind kind, String symbol, String meaning) {
        double min = kind == Kind.COUNT ? 1 : Double.MIN_VALUE;
        return new GeometryParameter(id, title, kind, symbol, meaning, min, Double.MAX_VALUE, List.of());
    }

    public GeometryParameter withMeaning(String meaningHere) {
        return new GeometryParameter(id(), title(), kind, symbol, meaningHere, min, max, fallbacks);
    }

    /** Hard limits in the SI unit, both included; beyond them a case is refused. */
    public GeometryParameter withLimits(double least, double most) {
        return new GeometryParameter(id(), title(), kind, symbol, meaning, least, most, fallbacks);
    }

    /**
     * Follows from other dimensions where those were given: give NaN where not. Several are tried in
     * the order in which they were told, before what is usual or assumed.
     */
    public GeometryParameter derivedAs(String words, ToDoubleFunction<Geometry> value) {
        return with(new Fallback(Default.DERIVED, words, value));
    }

    /** What everybody means by a blank, in place of what was usual or assumed so far. */
    public GeometryParameter usually(String words, ToDoubleFunction<Geometry> value) {
        return with(new Fallback(Default.USUAL, words, value));
    }

    /** Standard geometry, marked as assumed, in place of what was usual or assumed so far. */
    public GeometryParameter assumedAs(String words, ToDoubleFunction<Geometry> value) {
        return with(new Fallback(Default.ASSUMED, words, value));
    }

    private GeometryParameter with(Fallback added) {
        List<Fallback> all = new ArrayList<>(fallbacks);
        if (added.kind() != Default.DERIVED) {
            all.removeIf(f -> f.kind() != Default.DERIVED);
        }
        all.add(added);
        all.sort(Comparator.comparing(Fallback::kind));
        return new GeometryParameter(id(), title(), kind, symbol, meaning, min, max, List.copyOf(all));
    }

    public Kind kind() {
        return kind;
    }

    public String symbol() {
        return symbol;
    }

    public String meaning() {
        return meaning;
    }

    public double min() {
        return min;
    }

    public double max() {
        return max;
    }

    /** What stands in for a blank, in the order in which it is tried; empty when the value must be given. */
    public List<Fallback> fallbacks() {
        return fallbacks;
    }

    /** The name of the column that holds this parameter in a table. */
    public String column() {
        return id() + kind.columnSuffix;
    }

    /** From the column's unit to the SI unit. */
    public double fromColumn(double value) {
        return value * kind.siPerColumnUnit;
    }

    /** From the SI unit to the column's unit. */
    public double toColumn(double value) {
        return value / kind.siPerColumnUnit;
    }
}
