package stirwright.conformance.internal;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;
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

    private static final List<String> NEEDED = List.of(CORRELATION, FAMILY, KIND, EXPECTED, SOURCE);

    static Columns of(List<String> header, Workpiece workpiece) {
        Map<String, Variable> variables = variables(workpiece);
        Map<String, GeometryParameter> dimensions = dimensions(workpiece);
        Columns columns = new Columns(new HashMap<>(), new LinkedHashMap<>(), new LinkedHashMap<>(), new ArrayList<>());
        for (int i = 0; i < header.size(); i++) {
            String name = header.get(i).strip();
            if (header.indexOf(header.get(i)) < i) {
                columns.problems.add("has the column '" + name + "' twice");
            } else if (NEEDED.contains(name) || name.equals(FLUID)) {
                columns.texts.put(name, i);
            } else if (variables.containsKey(name)) {
                columns.variables.put(i, variables.get(name));
            } else if (dimensions.containsKey(name)) {
                columns.dimensions.put(i, dimensions.get(name));
            } else {
                columns.problems.add("has the unknown column '" + name + "'; known are " + String.join(", ", NEEDED)
                        + ", " + FLUID + ", the variables " + String.join(", ", variables.keySet())
                        + " and the dimensions " + String.join(", ", dimensions.keySet()));
            }
        }
        NEEDED.stream().filter(name -> !columns.texts.containsKey(name))
                .forEach(name -> columns.problems.add("lacks the column '" + name + "'"));
        return columns;
    }

    private static Map<String, Variable> variables(Workpiece workpiece) {
        Map<String, Variable> variables = new LinkedHashMap<>();
        StandardCase.variables(StandardCase.FLUID, Set.of()).keySet().forEach(v -> variables.put(v.id(), v));
        workpiece.offer().correlations().stream().map(Correlation::reads)
                .forEach(reads -> reads.forEach(v -> variables.putIfAbsent(v.id(), v)));
        return variables;
    }

    private static Map<String, GeometryParameter> dimensions(Workpiece workpiece) {
        Map<String, GeometryParameter> dimensions = new LinkedHashMap<>();
        Stream.concat(workpiece.families().stream(), Stream.of(StandardCase.anyFamily())).map(Family::parameters)
                .forEach(parameters -> parameters.forEach(p -> dimensions.putIfAbsent(p.column(), p)));
        return dimensions;
    }
}
