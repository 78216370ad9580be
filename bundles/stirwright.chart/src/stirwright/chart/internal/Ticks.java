package stirwright.chart.internal;

import java.util.ArrayList;
import java.util.List;

/** Where an axis is ticked. */
public final class Ticks {
    private static final double[] STEPS = {1, 2, 5, 10};
    private static final int[] STRIDES = {1, 2, 3, 5, 10, 20, 50};

    private Ticks() { }

    /** One tick with its label. */
    public record Tick(double value, String label) { }

    /** Labelled ticks at least about {@code gap} pixels apart, in ascending order; at least two where the axis allows. */
    public static List<Tick> of(Scale scale, double gap) {
        Span span = scale.span();
        double decades = Math.log10(span.most() / span.least());
        if (!span.log() || decades < 1) {
            return linear(span, scale.length(), gap);
        }
        return decades < 2 && scale.length() / decades * Math.log10(2) >= gap ? oneTwoFive(span) : decades(scale, gap);
    }

    private static List<Tick> decades(Scale scale, double gap) {
        Span span = scale.span();
        int first = (int) Math.ceil(Math.log10(span.least()) - 1e-9);
        int last = (int) Math.floor(Math.log10(span.most()) + 1e-9);
        double perDecade = scale.length() / Math.log10(span.most() / span.least());
        int stride = STRIDES[0];
        for (int i = 1; i < STRIDES.length && stride * perDecade < gap; i++) {
            stride = STRIDES[i];
        }
        List<Tick> ticks = new ArrayList<>();
        for (int exponent = Math.ceilDiv(first, stride) * stride; exponent <= last; exponent += stride) {
            ticks.add(new Tick(Math.pow(10, exponent), Numbers.decade(exponent)));
        }
        return ticks;
    }

    private static List<Tick> oneTwoFive(Span span) {
        List<Tick> ticks = new ArrayList<>();
        for (int exponent = (int) Math.floor(Math.log10(span.least())); Math.pow(10, exponent) <= span.most(); exponent++) {
            for (int i = 0; i < 3; i++) {
                double value = STEPS[i] * Math.pow(10, exponent);
                if (value >= span.least() * (1 - 1e-9) && value <= span.most() * (1 + 1e-9)) {
                    ticks.add(new Tick(value, i == 0 ? Numbers.decade(exponent) : Numbers.tick(value, value)));
                }
            }
        }
        return ticks;
    }

    /** Steps of 1, 2 or 5. On a logarithmic axis of less than a decade the gap widens, since the upper ticks crowd. */
    private static List<Tick> linear(Span span, double length, double gap) {
        double width = span.most() - span.least();
        double crowding = span.log() ? span.most() * Math.log(span.most() / span.least()) / width : 1;
        double rough = width * Math.min(0.5, gap * crowding / Math.max(1, length));
        double power = Math.pow(10, Math.floor(Math.log10(rough)));
        double step = 10 * power;
        for (double candidate : STEPS) {
            if (candidate * power >= rough * 0.999) {
                step = candidate * power;
                break;
            }
        }
        List<Tick> ticks = new ArrayList<>();
        long last = (long) Math.floor(span.most() / step + 1e-9);
        for (long i = (long) Math.ceil(span.least() / step - 1e-9); i <= last; i++) {
            ticks.add(new Tick(i * step, Numbers.tick(i * step, step)));
        }
        return ticks;
    }

    /** The values 1 to 9 of the decade that holds {@code value}, as far as they are in view; none on a linear axis. */
    public static double[] minor(Span span, double value) {
        if (!span.log() || !(value > 0) || !Double.isFinite(value)) {
            return new double[0];
        }
        double decade = Math.pow(10, Math.floor(Math.log10(value)));
        return java.util.stream.IntStream.rangeClosed(1, 10).mapToDouble(i -> i * decade)
                .filter(minor -> minor >= span.least() && minor <= span.most()).toArray();
    }
}
