package stirwright.conformance.internal;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Variable;

/**
 * What the columns of a reference file hold.
 *
 * @param texts index of each of the fixed columns
 * @param variables by index
 * @param dimensions by index
 * @param problems with the header, a sentence each
 */
record Columns(
        Map<String, Integer> texts, Map<Integer, Variable> variables, Map<Integer, GeometryParameter> dimensions,
        List<String> problems) {

    static final String CORRELATION = "correlation";
    static final String FAMILY = "family";
    static final String KIND = "kind";
    static final String EXPECTED = "expected";
    static final String SOURCE = "source";
    static final String FLUID = "fluid";
    static final String OUTSIDE = "outside";
    /** Relative band of a row that compares with a second author or an independent relation. */
    static final String WITHIN = "within";

    private static final List<String> NEEDED = List.of(CORRELATION, FAMILY, KIND, EXPECTED, SOURCE);
    private static final List<String> OPTIONAL = List.of(FLUID, OUTSIDE, WITHIN);

    private static final List<Variable> VARIABLES = List.of(
            Variable.REYNOLDS, Variable.FROUDE, Variable.FLOW_INDEX, Variable.YIELD_NUMBER, Variable.SPEED,
            Variable.DENSITY, Variable.VISCOSITY, Variable.POWER_NUMBER, Variable.FLOW_NUMBER,
            Variable.SHEAR_RATE_CONSTANT);

    static Columns of(List<String> header, Workpiece workpiece) {
        Map<String, Variable> variables = byName(Stream.concat(VARIABLES.stream(),
                workpiece.correlations().stream().flatMap(c -> c.reads().stream())), Variable::id);
        Map<String, GeometryParameter> dimensions = byName(
                workpiece.families().stream().flatMap(f -> f.parameters().stream()), GeometryParameter::column);
        Columns columns = new Columns(new HashMap<>(), new LinkedHashMap<>(), new LinkedHashMap<>(), new ArrayList<>());
        for (int i = 0; i < header.size(); i++) {
            String name = header.get(i).strip();
            if (header.indexOf(header.get(i)) < i) {
                columns.problems.add("has the column '" + name + "' twice");
            } else if (NEEDED.contains(name) || OPTIONAL.contains(name)) {
                columns.texts.put(name, i);
            } else if (variables.containsKey(name)) {
                columns.variables.put(i, variables.get(name));
            } else if (dimensions.containsKey(name)) {
                columns.dimensions.put(i, dimensions.get(name));
            } else {
                columns.problems.add("has the unknown column '" + name + "'; known are " + String.join(", ", NEEDED) + ", "
                        + String.join(", ", OPTIONAL) + ", the variables " + String.join(", ", variables.keySet())
                        + " and the dimensions " + String.join(", ", dimensions.keySet()));
            }
        }
        NEEDED.stream().filter(name -> !columns.texts.containsKey(name))
                .forEach(name -> columns.problems.add("lacks the column '" + name + "'"));
        return columns;
    }

    private static <T> Map<String, T> byName(Stream<T> terms, Function<T, String> name) {
        return terms.collect(Collectors.toMap(name, term -> term, (first, again) -> first, LinkedHashMap::new));
    }
}
