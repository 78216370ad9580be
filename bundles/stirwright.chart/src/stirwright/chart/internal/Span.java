package stirwright.chart.internal;

/**
 * The part of an axis that is in view, and how one moves it.
 *
 * @param log true when the axis is logarithmic
 * @param least the lower end, above zero on a logarithmic axis
 * @param most the upper end, above {@code least}
 */
public record Span(boolean log, double least, double most) {
    /** Deeper than this nobody finds the way back: decades, or parts of the larger end on a linear axis. */
    private static final double NARROWEST = 1e-6;
    private static final double WIDEST_DECADES = 60;
    private static final double WIDEST = 1e15;

    /** How far a value stands along the axis: the value, or its decimal logarithm. */
    public double along(double value) {
        return log ? Math.log10(value) : value;
    }

    /** The value at a place along the axis. */
    public double value(double along) {
        return log ? Math.pow(10, along) : along;
    }

    /** The same axis between two values in either order; itself when they are too near or too far apart. */
    public Span between(double one, double other) {
        double low = Math.min(one, other);
        double high = Math.max(one, other);
        boolean fits = Double.isFinite(low) && Double.isFinite(high) && (log
                ? low > 0 && Math.log10(high / low) > NARROWEST && Math.log10(high) - Math.log10(low) < WIDEST_DECADES
                : high - low > NARROWEST * Math.max(Math.abs(low), Math.abs(high)) && high - low < WIDEST);
        return fits ? new Span(log, low, high) : this;
    }

    /** Shows 1/{@code factor} of what was in view, with the value {@code at} staying in its place. */
    public Span zoomed(double at, double factor) {
        double centre = along(at);
        return between(value(centre - (centre - along(least)) / factor), value(centre + (along(most) - centre) / factor));
    }

    /** Moves by a fraction of what is in view, towards larger values when it is positive. */
    public Span panned(double fraction) {
        double shift = (along(most) - along(least)) * fraction;
        return between(value(along(least) + shift), value(along(most) + shift));
    }
}
