package stirwright.conformance.internal;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import stirwright.core.CaseRefusedException;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;
import stirwright.correlation.FluidClass;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Variable;

/** Reads one reference row. */
final class RowReader {
    private static final String YES = "yes";

    private final Workpiece workpiece;
    private final Columns columns;
    private final Legend legend;
    private final List<String> cells;

    RowReader(Workpiece workpiece, Columns columns, Legend legend, List<String> cells) {
        this.workpiece = workpiece;
        this.columns = columns;
        this.legend = legend;
        this.cells = cells;
    }

    /**
     * Why a correlation has no number from outside, if that is what the row says.
     *
     * @throws RowException naming the column and the value that cannot be used
     */
    Optional<ReferenceRows.Lack> lack() {
        return text(Columns.KIND).equals(ReferenceRows.Lack.KIND)
                ? Optional.of(new ReferenceRows.Lack(correlation().id(), source())) : Optional.empty();
    }

    /** @throws RowException naming the column and the value that cannot be used */
    ReferenceRow read(String place) {
        Correlation correlation = correlation();
        Family family = family(correlation);
        RowKind kind = RowKind.of(text(Columns.KIND)).orElseThrow(() ->
                unusable(Columns.KIND, "is none of " + Arrays.stream(RowKind.values()).map(RowKind::id).toList()));
        double expected = number(Columns.EXPECTED, text(Columns.EXPECTED));
        if (!List.of("", YES).contains(text(Columns.OUTSIDE))) {
            throw unusable(Columns.OUTSIDE, "is neither blank nor " + YES);
        }
        Situation situation = new Situation(dimensions(family), variables(correlation), fluid());
        return new ReferenceRow(place, correlation, family, kind, expected, source(), tolerance(kind), situation,
                text(Columns.OUTSIDE).equals(YES));
    }

    private Correlation correlation() {
        return workpiece.own(text(Columns.CORRELATION)).orElseThrow(() ->
                unusable(Columns.CORRELATION, "is not a correlation of this bundle"));
    }

    private String source() {
        if (text(Columns.SOURCE).isEmpty()) {
            throw unusable(Columns.SOURCE, "is blank; every number has its source beside it, and every lack its reason");
        }
        return legend.resolve(text(Columns.SOURCE));
    }

    private double tolerance(RowKind kind) {
        if (kind.isBanded() == text(Columns.WITHIN).isEmpty()) {
            throw unusable(Columns.WITHIN, kind.isBanded()
                    ? "is blank; a row of the kind " + kind.id() + " says how near the two are agreed to be, for instance 0.1"
                    : "is for rows that compare with somebody else; one of the kind " + kind.id() + " is met within "
                            + kind.tolerance());
        }
        if (!kind.isBanded()) {
            return kind.tolerance();
        }
        double within = number(Columns.WITHIN, text(Columns.WITHIN));
        if (!(within > 0 && within < 1)) {
            throw unusable(Columns.WITHIN, "is not above 0 and below 1");
        }
        return within;
    }

    private Family family(Correlation correlation) {
        String id = text(Columns.FAMILY);
        if (id.isEmpty() && correlation.families().size() != 1) {
            throw unusable(Columns.FAMILY, "is blank; " + correlation.id() + " is made for "
                    + (correlation.families().isEmpty() ? "any" : correlation.families()));
        }
        String wanted = id.isEmpty() ? correlation.families().iterator().next() : id;
        if (!correlation.holdsFor(wanted)) {
            throw unusable(Columns.FAMILY, "is not one that " + correlation.id() + " is made for: "
                    + correlation.families());
        }
        return workpiece.family(wanted).orElseThrow(() ->
                new RowException("family '" + wanted + "' is not installed, so the row cannot be compared"));
    }

    private Map<Variable, Double> variables(Correlation correlation) {
        Map<Variable, Double> variables = given(columns.variables(), Variable::id);
        correlation.reads().stream().filter(v -> !variables.containsKey(v)).forEach(v -> {
            throw new RowException("column '" + v.id() + "' is blank, but " + correlation.id() + " reads it");
        });
        return variables;
    }

    private Map<GeometryParameter, Double> dimensions(Family family) {
        Map<String, Double> byId = new HashMap<>();
        given(columns.dimensions(), GeometryParameter::column).forEach((parameter, value) -> {
            if (family.parameter(parameter.id()).isEmpty()) {
                throw new RowException("column '" + parameter.column() + "' has a value, but family " + family.id()
                        + " has no such dimension");
            }
            byId.put(parameter.id(), parameter.fromColumn(value));
        });
        try {
            VesselGeometry geometry = VesselGeometry.resolve(family, byId);
            Map<GeometryParameter, Double> dimensions = new LinkedHashMap<>();
            family.parameters().forEach(parameter -> dimensions.put(parameter, geometry.get(parameter)));
            return dimensions;
        } catch (CaseRefusedException refused) {
            throw new RowException(refused.getMessage());
        }
    }

    /** The cells that are not blank. */
    private <T> Map<T, Double> given(Map<Integer, T> terms, Function<T, String> column) {
        Map<T, Double> given = new LinkedHashMap<>();
        terms.forEach((at, term) -> {
            if (!cell(at).isEmpty()) {
                given.put(term, number(column.apply(term), cell(at)));
            }
        });
        return given;
    }

    private FluidClass fluid() {
        String id = text(Columns.FLUID);
        return id.isEmpty() ? FluidClass.SHEAR_THINNING : Arrays.stream(FluidClass.values())
                .filter(fluid -> fluid.id().equals(id)).findFirst().orElseThrow(() -> unusable(Columns.FLUID,
                        "is none of " + Arrays.stream(FluidClass.values()).map(FluidClass::id).toList()));
    }

    private static double number(String column, String text) {
        try {
            return new BigDecimal(text).doubleValue();
        } catch (NumberFormatException notANumber) {
            throw new RowException("column '" + column + "' has '" + text + "', which is not a number");
        }
    }

    /** Blank where there is no such column. */
    private String text(String column) {
        return Optional.ofNullable(columns.texts().get(column)).map(this::cell).orElse("");
    }

    private String cell(int at) {
        return at < cells.size() ? cells.get(at).strip() : "";
    }

    private RowException unusable(String column, String reason) {
        return new RowException("column '" + column + "' has '" + text(column) + "', which " + reason);
    }
}
