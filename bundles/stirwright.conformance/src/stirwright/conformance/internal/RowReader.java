package stirwright.conformance.internal;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import stirwright.core.CaseRefusedException;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;
import stirwright.correlation.FluidClass;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Variable;

/** Reads one reference row. */
final class RowReader {
    private final Workpiece workpiece;
    private final Columns columns;
    private final List<String> cells;

    RowReader(Workpiece workpiece, Columns columns, List<String> cells) {
        this.workpiece = workpiece;
        this.columns = columns;
        this.cells = cells;
    }

    /** @throws RowException naming the column and the value that cannot be used */
    ReferenceRow read(String place) {
        Correlation correlation = workpiece.own(text(Columns.CORRELATION)).orElseThrow(() ->
                unusable(Columns.CORRELATION, "is not a correlation of this bundle"));
        Family family = family(correlation);
        RowKind kind = RowKind.of(text(Columns.KIND)).orElseThrow(() ->
                unusable(Columns.KIND, "is none of " + Arrays.stream(RowKind.values()).map(RowKind::id).toList()));
        double expected = number(Columns.EXPECTED, text(Columns.EXPECTED));
        if (text(Columns.SOURCE).isEmpty()) {
            throw unusable(Columns.SOURCE, "is blank; every number has its source beside it");
        }
        Map<Variable, Double> variables = variables(correlation);
        Map<String, Double> given = given(family);
        Set<String> filledIn = new HashSet<>(StandardCase.given(family, StandardCase.BAFFLES).keySet());
        filledIn.removeAll(given.keySet());
        Situation situation = new Situation(dimensions(family, given), variables, fluid());
        demandWhatIsRead(correlation, situation, filledIn);
        return new ReferenceRow(place, correlation, kind, expected, situation);
    }

    private Family family(Correlation correlation) {
        String id = text(Columns.FAMILY);
        if (id.isEmpty() && correlation.families().isEmpty()) {
            return StandardCase.anyFamily();
        }
        if (id.isEmpty() && correlation.families().size() > 1) {
            throw unusable(Columns.FAMILY, "is blank; " + correlation.id() + " is made for " + correlation.families());
        }
        String wanted = id.isEmpty() ? correlation.families().iterator().next() : id;
        if (!correlation.holdsFor(wanted)) {
            throw unusable(Columns.FAMILY, "is not one that " + correlation.id() + " is made for: " + correlation.families());
        }
        return workpiece.family(wanted).orElseThrow(() ->
                new RowException("family '" + wanted + "' is not installed, so the row cannot be compared"));
    }

    private Map<Variable, Double> variables(Correlation correlation) {
        Map<Variable, Double> variables = new LinkedHashMap<>();
        columns.variables().forEach((at, variable) -> {
            if (!cell(at).isEmpty()) {
                variables.put(variable, number(variable.id(), cell(at)));
            }
        });
        correlation.reads().stream().filter(v -> !variables.containsKey(v)).forEach(v -> {
            throw new RowException("column '" + v.id() + "' is blank, but " + correlation.id() + " reads it");
        });
        return variables;
    }

    private Map<String, Double> given(Family family) {
        Map<String, Double> given = new HashMap<>();
        columns.dimensions().forEach((at, parameter) -> {
            if (!cell(at).isEmpty()) {
                if (family.parameter(parameter.id()).isEmpty()) {
                    throw new RowException("column '" + parameter.column() + "' has '" + cell(at) + "', but family "
                            + family.id() + " has no such dimension");
                }
                given.put(parameter.id(), parameter.fromColumn(number(parameter.column(), cell(at))));
            }
        });
        return given;
    }

    private static Map<GeometryParameter, Double> dimensions(Family family, Map<String, Double> given) {
        Map<String, Double> all = StandardCase.given(family, StandardCase.BAFFLES);
        all.putAll(given);
        try {
            return StandardCase.dimensions(family, all);
        } catch (CaseRefusedException refused) {
            throw new RowException(refused.getMessage());
        }
    }

    /** What has no default may stay blank only where the correlation does not look. */
    private static void demandWhatIsRead(Correlation correlation, Situation situation, Set<String> filledIn) {
        ReadLog log = new ReadLog(situation);
        Outcome.of(correlation, log, log);
        log.dimensions().stream().filter(p -> filledIn.contains(p.id())).findFirst().ifPresent(p -> {
            throw new RowException("column '" + p.column() + "' is blank and has no default, but "
                    + correlation.id() + " reads it");
        });
    }

    private FluidClass fluid() {
        String id = columns.texts().containsKey(Columns.FLUID) ? text(Columns.FLUID) : "";
        return id.isEmpty() ? StandardCase.FLUID : Arrays.stream(FluidClass.values())
                .filter(fluid -> fluid.id().equals(id)).findFirst().orElseThrow(() -> unusable(Columns.FLUID,
                        "is none of " + Arrays.stream(FluidClass.values()).map(FluidClass::id).toList()));
    }

    private double number(String column, String text) {
        try {
            return new BigDecimal(text).doubleValue();
        } catch (NumberFormatException notANumber) {
            throw new RowException("column '" + column + "' has '" + text + "', which is not a number");
        }
    }

    private String text(String column) {
        Integer at = columns.texts().get(column);
        return at == null ? "" : cell(at);
    }

    private String cell(int at) {
        return at < cells.size() ? cells.get(at).strip() : "";
    }

    private RowException unusable(String column, String reason) {
        return new RowException("column '" + column + "' has '" + text(column) + "', which " + reason);
    }
}
