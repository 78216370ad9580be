package stirwright.cards.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;

/** From numbers to places along one axis, and the ticks on it. Immutable. */
record Scale(double least, double most, boolean logarithmic, boolean whole, double from, double to) {
    private static final double[] STEPS = {1, 2, 5, 10};
    private static final int TICKS = 6;
    /** Below so many decades their twos and fives are marked too. */
    private static final double FEW_DECADES = 3;
    private static final int LEAST_PLAIN = -2;
    private static final int MOST_PLAIN = 2;

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

    /** The exponent of ten by which a tick is written; empty where it is written in full. */
    OptionalInt exponent(double tick) {
        int decade = (int) Math.round(Math.log10(Math.abs(tick)));
        boolean power = logarithmic && Math.abs(tick / Math.pow(10, decade) - 1) < 1e-9;
        return power && (decade < LEAST_PLAIN || decade > MOST_PLAIN) ? OptionalInt.of(decade) : OptionalInt.empty();
    }
}
