package stirwright.cards.internal;

import java.util.ArrayList;
import java.util.List;
import stirwright.correlation.Figures;

/** From numbers to places along one axis, and the ticks on it. Immutable. */
record Scale(double least, double most, boolean logarithmic, boolean whole, double from, double to) {
    private static final double[] STEPS = {1, 2, 5, 10};
    private static final int TICKS = 6;
    /** Below so many decades their twos and fives are marked too. */
    private static final double FEW_DECADES = 2.2;
    private static final int LEAST_PLAIN = -2;
    private static final int MOST_PLAIN = 3;
    private static final String RAISED = "\u2070\u00B9\u00B2\u00B3\u2074\u2075\u2076\u2077\u2078\u2079";

    double at(double value) {
        double share = logarithmic ? Math.log(value / least) / Math.log(most / least) : (value - least) / (most - least);
        return from + share * (to - from);
    }

    /** Ascending. */
    List<Double> ticks() {
        return logarithmic ? decades() : even();
    }

    private List<Double> even() {
        double rough = (most - least) / TICKS;
        double decade = Math.pow(10, Math.floor(Math.log10(rough)));
        double step = 10 * decade;
        for (double each : STEPS) {
            if (each * decade >= rough) {
                step = each * decade;
                break;
            }
        }
        if (whole) {
            step = Math.max(1, Math.rint(step));
        }
        List<Double> ticks = new ArrayList<>();
        for (long i = (long) Math.ceil(least / step - 1e-9); i * step <= most + 1e-9 * step; i++) {
            ticks.add(i * step);
        }
        return ticks;
    }

    private List<Double> decades() {
        boolean few = Math.log10(most / least) < FEW_DECADES;
        List<Double> ticks = new ArrayList<>();
        for (int decade = (int) Math.floor(Math.log10(least)); decade <= Math.log10(most); decade++) {
            for (double part : few ? new double[] {1, 2, 5} : new double[] {1}) {
                double tick = part * Math.pow(10, decade);
                if (tick >= least * (1 - 1e-9) && tick <= most * (1 + 1e-9)) {
                    ticks.add(tick);
                }
            }
        }
        return ticks;
    }

    /** As the axis shows it; decades far from one as powers of ten. */
    String label(double tick) {
        int decade = (int) Math.round(Math.log10(Math.abs(tick)));
        boolean power = logarithmic && Math.abs(tick / Math.pow(10, decade) - 1) < 1e-9;
        if (!power || decade >= LEAST_PLAIN && decade <= MOST_PLAIN - 1) {
            return Figures.show(tick);
        }
        StringBuilder label = new StringBuilder(decade < 0 ? "10\u207B" : "10");
        String.valueOf(Math.abs(decade)).chars().forEach(digit -> label.append(RAISED.charAt(digit - '0')));
        return label.toString();
    }
}
