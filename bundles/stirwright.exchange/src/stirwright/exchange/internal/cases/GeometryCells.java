package stirwright.exchange.internal.cases;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import stirwright.core.CaseRefusedException;
import stirwright.correlation.Family;
import stirwright.correlation.GeometryParameter;

/** The dimensions of a row, in SI units by parameter id. */
final class GeometryCells {
    private final List<String> present;
    private final Map<String, Map<String, GeometryParameter>> parametersByFamily = new LinkedHashMap<>();

    /** @param present the table's columns of dimensions */
    GeometryCells(List<String> present) {
        this.present = present;
    }

    /**
     * @param remarks receives what is given but is no dimension of the family
     * @throws CaseRefusedException when a dimension of the family is not a number
     */
    Map<String, Double> read(Cells cells, Family family, List<String> remarks) {
        Map<String, GeometryParameter> parameters = parametersByFamily.computeIfAbsent(family.id(),
                id -> family.parameters().stream().collect(Collectors.toMap(GeometryParameter::column, p -> p)));
        Map<String, Double> geometry = new LinkedHashMap<>();
        for (String column : present) {
            if (cells.given(column)) {
                GeometryParameter parameter = parameters.get(column);
                if (parameter == null) {
                    remarks.add(column + " " + cells.shown(column) + " is not a dimension of family " + family.id()
                            + "; ignored");
                } else {
                    geometry.put(parameter.id(), parameter.fromColumn(cells.number(column)));
                }
            }
        }
        return geometry;
    }
}
