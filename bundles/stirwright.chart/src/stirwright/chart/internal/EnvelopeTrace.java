package stirwright.chart.internal;

import org.eclipse.swt.graphics.Device;
import org.eclipse.swt.graphics.Path;
import stirwright.chart.Curve;
import stirwright.chart.Envelope;

/** An envelope made ready for painting: one closed path for each stretch without a gap. */
final class EnvelopeTrace {
    /** How far beyond the axis a course is still followed, in pixels: what is far outside only has to stay outside. */
    private static final double BEYOND = 2000;

    private final Curve curve;
    private final Path path;

    EnvelopeTrace(Device device, Envelope envelope, Curve curve, Scale x, Scale y) {
        this.curve = curve;
        path = new Path(device);
        int from = 0;
        int count = envelope.x().length;
        for (int i = 0; i <= count; i++) {
            if (i == count || gap(envelope, i, x, y)) {
                close(envelope, from, i, x, y);
                from = i + 1;
            }
        }
    }

    private static boolean gap(Envelope envelope, int i, Scale x, Scale y) {
        return Double.isNaN(x.pixel(envelope.x()[i])) || Double.isNaN(y.pixel(envelope.low()[i]))
                || Double.isNaN(y.pixel(envelope.high()[i]));
    }

    private void close(Envelope envelope, int from, int to, Scale x, Scale y) {
        if (to - from < 2) {
            return;
        }
        for (int i = from; i < to; i++) {
            if (i == from) {
                path.moveTo(at(x, envelope.x()[i]), at(y, envelope.high()[i]));
            } else {
                path.lineTo(at(x, envelope.x()[i]), at(y, envelope.high()[i]));
            }
        }
        for (int i = to - 1; i >= from; i--) {
            path.lineTo(at(x, envelope.x()[i]), at(y, envelope.low()[i]));
        }
        path.close();
    }

    private static float at(Scale scale, double value) {
        return (float) Math.clamp(scale.pixel(value), -BEYOND, 2 * BEYOND + scale.length());
    }

    Curve curve() {
        return curve;
    }

    Path path() {
        return path;
    }

    /** Gives the path back to the system. */
    void dispose() {
        path.dispose();
    }
}
