package stirwright.core.internal;

import java.util.Locale;
import java.util.Optional;
import stirwright.correlation.Figures;
import stirwright.rheology.MeasuredWindow;

/** Where a shear rate lies beside those at which the fluid was measured. */
final class WindowUse {
    /** What prints as 0.0. */
    private static final double LEAST_SHOWN = 0.05;

    private WindowUse() {}

    /**
     * By how many decades a shear rate is extrapolated to.
     *
     * @param what the shear rate in words, which start the sentence
     * @param rate 1/s; NaN where there is none
     * @return empty inside of the window, and where nothing is known of it
     */
    static Optional<String> outside(MeasuredWindow window, String what, double rate) {
        if (!window.known() || !(rate > 0 && rate < Double.POSITIVE_INFINITY) || window.contains(rate)) {
            return Optional.empty();
        }
        double decades = window.decadesOutside(rate);
        return Optional.of(what + " " + Figures.show(rate) + " 1/s is "
                + (decades < LEAST_SHOWN ? "less than 0.1" : String.format(Locale.ROOT, "%.1f", decades))
                + " decades outside the measured window " + inWords(window));
    }

    private static String inWords(MeasuredWindow window) {
        if (Double.isNaN(window.min())) {
            return "up to " + Figures.show(window.max()) + " 1/s";
        }
        return Double.isNaN(window.max()) ? "from " + Figures.show(window.min()) + " 1/s on"
                : Figures.show(window.min()) + " to " + Figures.show(window.max()) + " 1/s";
    }
}
