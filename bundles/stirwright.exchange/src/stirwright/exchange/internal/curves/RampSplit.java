package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.DoubleStream;

/**
 * Parts of a run of shear rates: stretches of constant rate, and ramps between the turns. Rates within 2 % are one
 * step, since set rates are met no better; that figure and those below are common practice, no source.
 */
final class RampSplit {
    private static final double SAME = 0.02;
    /** A rate that is held keeps within this share. */
    private static final double STILL = 0.002;
    /** The next step of a ramp is hardly wider than this many of the one before. */
    private static final double WIDER = 1.6;
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
        List<Part> ramp = new ArrayList<>();
        for (int i = 0; i < steps.size(); i++) {
            Part step = steps.get(i);
            boolean many = steps.size() > 1 && step.end - step.begin >= Math.max(LEAST_CONSTANT, 4 * usual) && !trending(rates, step);
            Part hold = many ? trimmed(rates, step) : step;
            if (many && still(rates, hold)) {
                // The first point of a hold ends the ramp before it, the last one begins the ramp behind it.
                boolean after = ramp.size() > 1 && goesOn(rates[ramp.get(ramp.size() - 2).begin], rates[ramp.getLast().begin], rates[hold.begin]);
                boolean between = after && i + 2 < steps.size() && goesOn(rates[steps.get(i + 2).begin], rates[steps.get(i + 1).begin], rates[hold.begin]);
                hold = new Part(hold.begin + (after && hold.begin == step.begin ? 1 : 0), hold.end - (between && hold.end == step.end ? 1 : 0));
                ramp.add(new Part(step.begin, hold.begin));
                parts.addAll(ramps(rates, ramp));
                parts.add(hold);
                ramp = new ArrayList<>(List.of(new Part(hold.end, step.end)));
            } else if (i == 0 && beforeARamp(rates, steps, usual)) {
                parts.add(step);
            } else {
                ramp.add(step);
            }
        }
        parts.addAll(ramps(rates, ramp));
        return parts;
    }

    /** Without the last points of a dense ramp on the way to the hold, and the first ones on the way from it. */
    private static Part trimmed(double[] rates, Part step) {
        double median = median(Arrays.stream(rates, step.begin, step.end));
        double scatter = 4 * median(Arrays.stream(rates, step.begin, step.end).map(r -> Math.abs(r - median))) + 1e-3 * median;
        int begin = step.begin;
        int end = step.end;
        while (Math.abs(rates[begin] - median) > scatter) {
            begin++;
        }
        while (Math.abs(rates[end - 1] - median) > scatter) {
            end--;
        }
        return new Part(begin, end);
    }

    /** Whether a rate is the next one of a ramp, by the step before it. */
    private static boolean goesOn(double first, double second, double next) {
        double linear = (next - second) / (second - first);
        double log = Math.log(next / second) / Math.log(second / first);
        return linear > 0 && Math.min(linear, log) < WIDER;
    }

    /** Whether a rate stands still, and does not pass a turn of a dense ramp. */
    private static boolean still(double[] rates, Part hold) {
        double median = median(Arrays.stream(rates, hold.begin, hold.end));
        return median(Arrays.stream(rates, hold.begin, hold.end).map(r -> Math.abs(r - median))) <= STILL * median;
    }

    /** Two or more equal rates at the start, and a ramp that does not begin there. */
    private static boolean beforeARamp(double[] rates, List<Part> steps, int usual) {
        Part first = steps.get(0);
        int count = first.end - first.begin;
        if (count < 2 * usual || count < 2 || steps.size() <= LEAST_STEPS || !still(rates, first)) {
            return false;
        }
        double[] next = steps.stream().limit(LEAST_STEPS + 1).mapToDouble(s -> rates[s.begin]).toArray();
        double way = Math.signum(next[2] - next[1]);
        boolean ramp = way != 0 && Math.signum(next[3] - next[2]) == way;
        return ramp && (count > 2 || Math.signum(next[1] - next[0]) != way);
    }

    /** How many rates differ by more than 2 %, in whatever order. */
    static int distinct(double[] rates) {
        double[] sorted = rates.clone();
        Arrays.sort(sorted);
        return stepCount(sorted);
    }

    private static double median(DoubleStream values) {
        double[] sorted = values.sorted().toArray();
        return sorted[sorted.length / 2];
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

    private static List<Part> ramps(double[] rates, List<Part> all) {
        List<Part> steps = all.stream().filter(s -> s.end > s.begin).toList();
        if (steps.isEmpty()) {
            return List.of();
        }
        List<Run> runs = joined(rates, steps, turns(rates, steps));
        List<Part> parts = new ArrayList<>();
        for (int i = 0; i < runs.size(); i++) {
            Part last = steps.get(runs.get(i).last);
            int begin = i == 0 ? steps.get(0).begin : parts.get(i - 1).end;
            parts.add(new Part(begin, i == runs.size() - 1 || runs.get(i).jump ? last.end : middle(last)));
        }
        boolean steady = parts.stream().allMatch(p -> direction(Arrays.copyOfRange(rates, p.begin, p.end)) != 0);
        return steady ? parts : List.of(new Part(steps.get(0).begin, steps.getLast().end));
    }

    /** A rate that was measured twice at the turn belongs to both ramps. */
    private static int middle(Part step) {
        return step.begin + (step.end - step.begin + 1) / 2;
    }

    /** First and last step of each run between turns; neighbours share the step at the turn. */
    private static List<Run> turns(double[] rates, List<Part> steps) {
        double least = Double.MAX_VALUE;
        double most = 0;
        for (Part step : steps) {
            least = Math.min(least, rates[step.begin]);
            most = Math.max(most, rates[step.begin]);
        }
        double back = Math.max(LEAST_TURN, TURN * Math.log(most / least));
        List<Run> runs = new ArrayList<>();
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
                    runs.add(new Run(start, turn, false));
                    start = turn;
                }
                direction = down ? -1 : 1;
                high = i;
                low = i;
            }
        }
        runs.add(new Run(start, steps.size() - 1, false));
        return runs;
    }

    /**
     * Steps between two turns; neighbours share the step at the turn.
     *
     * @param jump whether the rates start anew behind it
     */
    private record Run(int first, int last, boolean jump) {}

    /**
     * Runs that are too short join the one before, and so does the one behind them, which goes the same way; but one jump
     * back to where the run before began starts a new ramp.
     */
    private static List<Run> joined(double[] rates, List<Part> steps, List<Run> runs) {
        List<Run> joined = new ArrayList<>();
        boolean swallow = false;
        for (int i = 0; i < runs.size(); i++) {
            Run run = runs.get(i);
            boolean brief = run.last - run.first + 1 < LEAST_STEPS;
            Run before = joined.isEmpty() ? null : joined.getLast();
            if (before == null || !brief && !swallow) {
                joined.add(run);
                swallow = brief;
            } else if (brief && !swallow && i + 1 < runs.size() && isJump(rates, steps, before, run)) {
                joined.set(joined.size() - 1, new Run(before.first, before.last, true));
            } else {
                joined.set(joined.size() - 1, new Run(before.first, run.last, false));
                swallow = brief;
            }
        }
        return joined;
    }

    /** A stray point is left for a rate near the one before it; a new ramp begins near the start of the last one. */
    private static boolean isJump(double[] rates, List<Part> steps, Run before, Run run) {
        if (run.last - run.first != 1 || before.last - before.first + 1 < LEAST_STEPS) {
            return false;
        }
        double start = Math.log(rates[steps.get(before.first).begin]);
        double usualEnd = Math.log(rates[steps.get(before.last - 1).begin]);
        double now = Math.log(rates[steps.get(run.last).begin]);
        return Math.abs(now - start) < Math.abs(now - usualEnd);
    }
}
