package stirwright.correlation;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import java.util.function.UnaryOperator;

/**
 * The named coefficients of a correlation, in the order in which it declares them, and the curves
 * that were read off a chart. The printed formula and the code take them from here. Immutable.
 */
public final class Constants {
    private final Map<String, Double> values;
    private final Map<String, ChartCurve> curves;

    Constants(Map<String, Double> values, Map<String, ChartCurve> curves) {
        this.values = Collections.unmodifiableMap(new LinkedHashMap<>(values));
        this.curves = Collections.unmodifiableMap(new LinkedHashMap<>(curves));
    }

    /**
     * The value of a constant.
     *
     * @throws ContractException when the correlation declares no constant of that name
     */
    public double get(String name) {
        Double value = values.get(name);
        if (value == null) {
            throw new ContractException("no constant '" + name + "'; there are " + values.keySet());
        }
        return value;
    }

    /**
     * A curve through points that were read off a chart or printed as a table.
     *
     * @throws ContractException when the correlation declares no curve of that name
     */
    public ChartCurve curve(String name) {
        ChartCurve curve = curves.get(name);
        if (curve == null) {
            throw new ContractException("no curve '" + name + "'; there are " + curves.keySet());
        }
        return curve;
    }

    public Set<String> names() {
        return values.keySet();
    }

    public Set<String> curveNames() {
        return curves.keySet();
    }

    /**
     * A copy in which one constant has another value, for {@link Correlation#variant}.
     *
     * @throws ContractException when there is no constant of that name
     */
    public Constants with(String name, double value) {
        get(name);
        Map<String, Double> changed = new LinkedHashMap<>(values);
        changed.put(name, value);
        return new Constants(changed, curves);
    }

    /**
     * A copy in which one curve is another, for {@link Correlation#variant}.
     *
     * @throws ContractException when there is no curve of that name
     */
    public Constants withCurve(String name, UnaryOperator<ChartCurve> change) {
        Map<String, ChartCurve> changed = new LinkedHashMap<>(curves);
        changed.put(name, change.apply(curve(name)));
        return new Constants(values, changed);
    }
}
