package stirwright.chart.internal;

/** Values to pixels and back, for one axis in one place; without rounding, since curves are drawn between pixels. */
public final class Scale {
    private final Span span;
    private final double start;
    private final double end;
    private final double origin;
    private final double perPixel;

    /** From the pixel of the lower end to that of the upper end, which is above it on a vertical axis. */
    public Scale(Span span, double start, double end) {
        this.span = span;
        this.start = start;
        this.end = end;
        origin = span.along(span.least());
        perPixel = (span.along(span.most()) - origin) / (end - start);
    }

    /** Not a number when the value has no place on the axis. */
    public double pixel(double value) {
        double along = span.along(value);
        return Double.isFinite(along) ? start + (along - origin) / perPixel : Double.NaN;
    }

    /** The value under a pixel. */
    public double value(double pixel) {
        return span.value(origin + (pixel - start) * perPixel);
    }

    /** The part of the axis in view. */
    public Span span() {
        return span;
    }

    /** Length in pixels. */
    public double length() {
        return Math.abs(end - start);
    }

    /** Whether a pixel is on the axis, with half a pixel to spare. */
    public boolean covers(double pixel) {
        return pixel >= Math.min(start, end) - 0.5 && pixel <= Math.max(start, end) + 0.5;
    }

    /** The nearest pixel on the axis. */
    public double clamp(double pixel) {
        return Math.clamp(pixel, Math.min(start, end), Math.max(start, end));
    }
}
