package stirwright.conformance.internal;

import java.util.AbstractMap;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import stirwright.correlation.Family;
import stirwright.correlation.FluidClass;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.OperatingPoint;
import stirwright.correlation.Variable;

/**
 * A vessel and a state of its product, both free of hard limits, so that a check can go where no
 * real case may.
 */
record Situation(Map<GeometryParameter, Double> dimensions, Map<Variable, Double> variables, FluidClass fluid)
        implements Geometry, OperatingPoint {

    @Override
    public double get(GeometryParameter parameter) {
        return dimensions.getOrDefault(parameter, Double.NaN);
    }

    @Override
    public double get(Variable variable) {
        return variables.getOrDefault(variable, Double.NaN);
    }

    Situation with(GeometryParameter parameter, double value) {
        return new Situation(changed(dimensions, parameter, value), variables, fluid);
    }

    Situation with(Variable variable, double value) {
        return new Situation(dimensions, changed(variables, variable, value), fluid);
    }

    Situation with(FluidClass other) {
        return new Situation(dimensions, variables, other);
    }

    /** Whether it keeps to the family's hard limits. */
    boolean existsIn(Family family) {
        return dimensions.entrySet().stream().allMatch(
                        each -> each.getValue() >= each.getKey().min() && each.getValue() <= each.getKey().max())
                && family.rules().stream().allMatch(rule -> rule.holds(this));
    }

    private static <K> Map<K, Double> changed(Map<K, Double> values, K key, double value) {
        return new Changed<>(values, key, value);
    }

    /** All values but one as in another map, without a copy of it: a suite makes some 100,000 of these. */
    private static final class Changed<K> extends AbstractMap<K, Double> {
        private final Map<K, Double> others;
        private final K key;
        private final Double value;

        Changed(Map<K, Double> others, K key, double value) {
            this.others = others;
            this.key = key;
            this.value = value;
        }

        @Override
        public Double get(Object wanted) {
            return key.equals(wanted) ? value : others.get(wanted);
        }

        @Override
        public Double getOrDefault(Object wanted, Double otherwise) {
            return key.equals(wanted) ? value : others.getOrDefault(wanted, otherwise);
        }

        @Override
        public Set<Entry<K, Double>> entrySet() {
            Map<K, Double> copy = new LinkedHashMap<>(others);
            copy.put(key, value);
            return copy.entrySet();
        }
    }
}
