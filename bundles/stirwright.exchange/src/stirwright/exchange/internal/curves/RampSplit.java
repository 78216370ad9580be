package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Parts of a run of shear rates: stretches of constant rate, and ramps between the turns. Rates within 2 % are one
 * step, since set rates are met no better; that figure and those below are common practice, no source.
 */
final class RampSplit {
    private static final double SAME = 0.02;
    /** Fewer points at one rate are a step of a ramp. */
    private static final int LEAST_CONSTANT = 5;
    /** A ramp has at least three steps; a shorter one is a stray point. */
    private static final int LEAST_STEPS = 3;
    /** A turn goes back by this share of the decades that the run spans, and by 30 % at least. */
    private static final double TURN = 0.15;
    private static final double LEAST_TURN = Math.log(1.3);
    /** Correlation of the logarithm of the rate with the count of steps; even a linear ramp from zero has 0.87. */
    private static final double STEADY = 0.8;

    private RampSplit() {}

    /** @param end behind its last rate */
    record Part(int begin, int end) {}

    /** @param rates each above 0 */
    static List<Part> split(double[] rates) {
        List<Part> steps = steps(rates);
        int usual = steps.stream().mapToInt(s -> s.end - s.begin).sorted().skip(steps.size() / 2).findFirst().orElse(0);
        List<Part> parts = new ArrayList<>();
        int from = 0;
        for (int i = 0; i < steps.size() && steps.size() > 1; i++) {
            Part step = steps.get(i);
            if (step.end - step.begin >= Math.max(LEAST_CONSTANT, 4 * usual) && !trending(rates, step)) {
                parts.addAll(ramps(rates, steps.subList(from, i)));
                parts.add(step);
                from = i + 1;
            }
        }
        parts.addAll(ramps(rates, steps.subList(from, steps.size())));
        return parts;
    }

    /** Whether all rates are one. */
    static boolean constant(double[] rates) {
        double least = Double.MAX_VALUE;
        double most = 0;
        for (double rate : rates) {
            least = Math.min(least, rate);
            most = Math.max(most, rate);
        }
        return most <= least * (1 + 2 * SAME);
    }

    static int stepCount(double[] rates) {
        return steps(rates).size();
    }

    /** 1 up, -1 down, 0 neither throughout. */
    static int direction(double[] rates) {
        List<Part> steps = steps(rates);
        if (steps.size() < 2) {
            return 0;
        }
        double middle = (steps.size() - 1) / 2.0;
        double mean = steps.stream().mapToDouble(s -> Math.log(rates[s.begin])).average().orElseThrow();
        double product = 0;
        double square = 0;
        double places = 0;
        for (int i = 0; i < steps.size(); i++) {
            double log = Math.log(rates[steps.get(i).begin]) - mean;
            product += (i - middle) * log;
            square += log * log;
            places += (i - middle) * (i - middle);
        }
        double correlation = product / Math.sqrt(square * places);
        return correlation >= STEADY ? 1 : correlation <= -STEADY ? -1 : 0;
    }

    private static List<Part> steps(double[] rates) {
        List<Part> steps = new ArrayList<>();
        int begin = 0;
        for (int i = 1; i <= rates.length; i++) {
            if (i == rates.length || Math.abs(rates[i] / rates[begin] - 1) > SAME) {
                steps.add(new Part(begin, i));
                begin = i;
            }
        }
        return steps;
    }

    /** A dense ramp moves within 2 % too, but always the same way. */
    private static boolean trending(double[] rates, Part step) {
        int net = 0;
        for (int i = step.begin + 1; i < step.end; i++) {
            net += (int) Math.signum(rates[i] - rates[i - 1]);
        }
        return Math.abs(net) > (step.end - step.begin - 1) / 2;
    }

    private static List<Part> ramps(double[] rates, List<Part> steps) {
        if (steps.isEmpty()) {
            return List.of();
        }
        List<int[]> runs = joined(turns(rates, steps));
        List<Part> parts = new ArrayList<>();
        for (int i = 0; i < runs.size(); i++) {
            int begin = i == 0 ? steps.get(0).begin : parts.get(i - 1).end;
            int end = i == runs.size() - 1 ? steps.getLast().end : middle(steps.get(runs.get(i)[1]));
            parts.add(new Part(begin, end));
        }
        boolean steady = parts.stream().allMatch(p -> direction(Arrays.copyOfRange(rates, p.begin, p.end)) != 0);
        return steady ? parts : List.of(new Part(steps.get(0).begin, steps.getLast().end));
    }

    /** A rate that was measured twice at the turn belongs to both ramps. */
    private static int middle(Part step) {
        return step.begin + (step.end - step.begin + 1) / 2;
    }

    /** First and last step of each run between turns; neighbours share the step at the turn. */
    private static List<int[]> turns(double[] rates, List<Part> steps) {
        double least = Double.MAX_VALUE;
        double most = 0;
        for (Part step : steps) {
            least = Math.min(least, rates[step.begin]);
            most = Math.max(most, rates[step.begin]);
        }
        double back = Math.max(LEAST_TURN, TURN * Math.log(most / least));
        List<int[]> runs = new ArrayList<>();
        int start = 0;
        int high = 0;
        int low = 0;
        int direction = 0;
        for (int i = 1; i < steps.size(); i++) {
            double rate = Math.log(rates[steps.get(i).begin]);
            high = rate > Math.log(rates[steps.get(high).begin]) ? i : high;
            low = rate < Math.log(rates[steps.get(low).begin]) ? i : low;
            boolean down = direction >= 0 && Math.log(rates[steps.get(high).begin]) - rate > back;
            boolean up = direction <= 0 && rate - Math.log(rates[steps.get(low).begin]) > back;
            if (down || up) {
                int turn = down ? high : low;
                if (direction != 0) {
                    runs.add(new int[] {start, turn});
                    start = turn;
                }
                direction = down ? -1 : 1;
                high = i;
                low = i;
            }
        }
        runs.add(new int[] {start, steps.size() - 1});
        return runs;
    }

    /** Runs that are too short join the one before, and so does the one behind them, which goes the same way. */
    private static List<int[]> joined(List<int[]> runs) {
        List<int[]> joined = new ArrayList<>();
        boolean swallow = false;
        for (int[] run : runs) {
            boolean shorty = run[1] - run[0] + 1 < LEAST_STEPS;
            if (joined.isEmpty() || !shorty && !swallow) {
                joined.add(run.clone());
                swallow = shorty;
            } else {
                joined.getLast()[1] = run[1];
                swallow = shorty;
            }
        }
        return joined;
    }
}
