package stirwright.correlation;

import java.util.function.ToDoubleFunction;

/**
 * One dimension or count of a vessel or impeller: name, symbol, unit, meaning, hard limits, and
 * what stands in when nobody gave it. Immutable; the {@code with...} methods return a copy, so
 * that a family takes a parameter from {@link Dimensions} and gives it its own meaning and default.
 */
public final class GeometryParameter extends Term {

    /** What a parameter measures, which settles its unit. */
    public enum Kind {
        /** In m. */
        LENGTH("m", "_m", 1),
        /** In rad; people and tables write degrees. */
        ANGLE("rad", "_deg", Math.PI / 180),
        /** In m3. */
        VOLUME("m3", "_m3", 1),
        /** A whole number. */
        COUNT("-", "", 1),
        /** A pure number. */
        RATIO("-", "", 1);

        private final String unit;
        private final String columnSuffix;
        private final double siPerColumnUnit;

        Kind(String unit, String columnSuffix, double siPerColumnUnit) {
            this.unit = unit;
            this.columnSuffix = columnSuffix;
            this.siPerColumnUnit = siPerColumnUnit;
        }

        public String unit() {
            return unit;
        }
    }

    /** How much a value that nobody gave deserves to be shown. */
    public enum Default {
        /** There is none: the value must be given. */
        NONE,
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
    private final Default defaultKind;
    private final String defaultWords;
    private final ToDoubleFunction<Geometry> defaultValue;

    private GeometryParameter(
            String id, String title, Kind kind, String symbol, String meaning, double min, double max,
            Default defaultKind, String defaultWords, ToDoubleFunction<Geometry> defaultValue) {
        super(id, title);
        this.kind = kind;
        this.symbol = symbol;
        this.meaning = meaning;
        this.min = min;
        this.max = max;
        this.defaultKind = defaultKind;
        this.defaultWords = defaultWords;
        this.defaultValue = defaultValue;
    }

    /**
     * A parameter with neither default nor upper limit; lengths and volumes must be above zero,
     * counts at least 1.
     *
     * @param meaning how it is measured, in one sentence that replaces a figure
     */
    public static GeometryParameter of(String id, String title, Kind kind, String symbol, String meaning) {
        double min = kind == Kind.COUNT ? 1 : Double.MIN_VALUE;
        return new GeometryParameter(
                id, title, kind, symbol, meaning, min, Double.MAX_VALUE, Default.NONE, "", g -> Double.NaN);
    }

    public GeometryParameter withMeaning(String meaningHere) {
        return new GeometryParameter(
                id(), title(), kind, symbol, meaningHere, min, max, defaultKind, defaultWords, defaultValue);
    }

    /** Hard limits in the SI unit, both included; beyond them a case is refused. */
    public GeometryParameter withLimits(double least, double most) {
        return new GeometryParameter(
                id(), title(), kind, symbol, meaning, least, most, defaultKind, defaultWords, defaultValue);
    }

    /** Standard geometry that stands in for a blank and is marked as assumed. */
    public GeometryParameter assumedAs(String words, ToDoubleFunction<Geometry> value) {
        return new GeometryParameter(
                id(), title(), kind, symbol, meaning, min, max, Default.ASSUMED, words, value);
    }

    /** What everybody means by a blank. */
    public GeometryParameter usually(String words, ToDoubleFunction<Geometry> value) {
        return new GeometryParameter(
                id(), title(), kind, symbol, meaning, min, max, Default.USUAL, words, value);
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

    public Default defaultKind() {
        return defaultKind;
    }

    /** The default in words, for instance "D/5". */
    public String defaultWords() {
        return defaultWords;
    }

    /** The default in the SI unit; it may read parameters that the family lists before this one. */
    public double defaultValue(Geometry geometry) {
        return defaultValue.applyAsDouble(geometry);
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
