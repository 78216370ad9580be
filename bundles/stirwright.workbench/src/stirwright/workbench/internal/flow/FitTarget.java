package stirwright.workbench.internal.flow;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import stirwright.correlation.Figures;
import stirwright.workbench.internal.Messages;

/**
 * Curves that models are fitted to together.
 *
 * @param key what it is known by from one state of the study to the next
 * @param title as it stands in the list
 */
public record FitTarget(String key, String title, List<CurveData> curves) {
    /** Curves whose temperatures differ by less were measured at one temperature; common practice, no source. */
    static final double SAME_TEMPERATURE = 0.5;

    public FitTarget {
        curves = List.copyOf(curves);
    }

    /**
     * What there is to fit to, the one that is taken first unless somebody says otherwise. Up and down ramps are not averaged
     * and temperatures are not mixed by default: the average of two fluids is none of them. Up comes before down since its
     * stresses are the larger ones in a product that breaks down.
     */
    static List<FitTarget> of(List<CurveData> all) {
        List<CurveData> used = all.stream().filter(CurveData::used).toList();
        List<FitTarget> targets = new ArrayList<>();
        Map<String, List<CurveData>> groups = groups(used);
        if (groups.size() > 1) {
            groups.forEach((title, curves) -> targets.add(new FitTarget("group " + title, title, curves)));
        }
        if (!used.isEmpty()) {
            targets.add(new FitTarget("all", used.size() == 1 ? used.get(0).label() : FlowWords.Target_all, used));
        }
        if (used.size() > 1) {
            used.forEach(c -> targets.add(new FitTarget("curve " + c.label(), Messages.bind(FlowWords.Target_one, c.label()), List.of(c))));
        }
        return targets;
    }

    private static Map<String, List<CurveData>> groups(List<CurveData> used) {
        List<Double> temperatures = temperatures(used);
        Map<String, List<CurveData>> groups = new LinkedHashMap<>();
        used.stream().sorted(Comparator.<CurveData>comparingInt(c -> ramp(c.ramp())))
                .forEach(c -> groups.computeIfAbsent(title(c, temperatures), t -> new ArrayList<>()).add(c));
        return groups;
    }

    private static int ramp(String word) {
        return word.equals(CurveData.UP) ? 0 : word.equals(CurveData.DOWN) ? 2 : 1;
    }

    private static String title(CurveData curve, List<Double> temperatures) {
        String ramp = curve.ramp().equals(CurveData.UP) ? FlowWords.Target_up
                : curve.ramp().equals(CurveData.DOWN) ? FlowWords.Target_down : FlowWords.Target_noRamp;
        if (temperatures.size() < 2) {
            return ramp;
        }
        return Double.isNaN(curve.temperature()) ? Messages.bind(FlowWords.Target_unknownTemperature, ramp)
                : Messages.bind(FlowWords.Target_atTemperature, ramp, Figures.show(nearest(curve.temperature(), temperatures)));
    }

    /** One of each group of temperatures that count as one, from cold to hot; NaN stands for those not known. */
    static List<Double> temperatures(List<CurveData> curves) {
        List<Double> distinct = new ArrayList<>();
        curves.stream().map(CurveData::temperature).sorted().forEach(t -> {
            boolean known = distinct.stream().anyMatch(d -> Math.abs(d - t) <= SAME_TEMPERATURE || d.isNaN() && t.isNaN());
            if (!known) {
                distinct.add(t);
            }
        });
        return distinct;
    }

    private static double nearest(double temperature, List<Double> temperatures) {
        return temperatures.stream().filter(t -> Math.abs(t - temperature) <= SAME_TEMPERATURE).findFirst().orElse(temperature);
    }

    /** Whether it pools what was measured at different temperatures. */
    boolean mixesTemperatures() {
        return temperatures(curves).size() > 1;
    }

    /** Whether it pools up and down ramps. */
    boolean mixesRamps() {
        return curves.stream().anyMatch(c -> c.ramp().equals(CurveData.UP)) && curves.stream().anyMatch(c -> c.ramp().equals(CurveData.DOWN));
    }
}
