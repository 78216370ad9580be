package stirwright.workbench.internal.flow;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import stirwright.correlation.Figures;
import stirwright.exchange.Measurement;
import stirwright.workbench.internal.Messages;

/**
 * Curves that models are fitted to together.
 *
 * @param key what it is known by from one state of the study to the next
 * @param title as it stands in the list
 */
public record FitTarget(String key, String title, List<CurveData> curves) {
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
                : Messages.bind(FlowWords.Target_atTemperature, ramp, Figures.show(coldest(curve.temperature(), temperatures)));
    }

    /** Each curve once, with those whose temperature counts as that of the coldest among them; cold first, unknown last. */
    static List<List<CurveData>> byTemperature(List<CurveData> curves) {
        List<List<CurveData>> groups = new ArrayList<>();
        curves.stream().sorted(Comparator.comparingDouble(CurveData::temperature)).forEach(c -> {
            if (groups.isEmpty() || !Measurement.sameTemperature(groups.getLast().get(0).temperature(), c.temperature())) {
                groups.add(new ArrayList<>());
            }
            groups.getLast().add(c);
        });
        return groups;
    }

    /** The coldest of each group of temperatures that count as one, from cold to hot; NaN stands for those not known. */
    static List<Double> temperatures(List<CurveData> curves) {
        return byTemperature(curves).stream().map(here -> here.get(0).temperature()).toList();
    }

    /** Of the group that a temperature is in. */
    private static double coldest(double temperature, List<Double> temperatures) {
        return temperatures.stream().filter(t -> t <= temperature).reduce((colder, warmer) -> warmer).orElse(temperature);
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
