package stirwright.exchange.internal.cases;

import static stirwright.exchange.internal.cases.CaseColumns.DENSITY;
import static stirwright.exchange.internal.cases.CaseColumns.MODEL;
import static stirwright.exchange.internal.cases.CaseColumns.SHEAR_RATE_MAX;
import static stirwright.exchange.internal.cases.CaseColumns.SHEAR_RATE_MIN;
import static stirwright.exchange.internal.cases.CaseColumns.STATIC_YIELD_STRESS;
import static stirwright.exchange.internal.cases.CaseColumns.YIELD_STRESS_HIGH;
import static stirwright.exchange.internal.cases.CaseColumns.YIELD_STRESS_LOW;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import stirwright.core.CaseRefusedException;
import stirwright.rheology.Fluid;
import stirwright.rheology.FluidModel;
import stirwright.rheology.MeasuredWindow;
import stirwright.rheology.ModelKind;
import stirwright.rheology.Parameter;
import stirwright.rheology.ParameterException;
import stirwright.rheology.YieldBounds;

/** The fluid of a row. */
final class FluidCells {
    private static final List<String> PARAMETERS = CaseColumns.modelParameters();

    private FluidCells() {}

    /**
     * @param remarks receives what is given but not used
     * @throws CaseRefusedException when something is missing or out of its limits
     */
    static Fluid read(Cells cells, List<String> remarks) {
        ModelKind kind = kind(cells);
        double[] values = new double[kind.parameters().size()];
        for (int i = 0; i < values.length; i++) {
            values[i] = needed(cells, kind.parameters().get(i).column(), "; model " + kind.id() + " needs it");
        }
        double density = needed(cells, DENSITY, "; it is needed");
        double least = cells.positive(SHEAR_RATE_MIN);
        double most = cells.positive(SHEAR_RATE_MAX);
        double low = cells.number(YIELD_STRESS_LOW);
        double high = cells.number(YIELD_STRESS_HIGH);
        double atRest = cells.number(STATIC_YIELD_STRESS);
        List<String> used = kind.parameters().stream().map(Parameter::column).toList();
        cells.given(PARAMETERS).stream().filter(c -> !used.contains(c)).forEach(c -> remarks.add(
                c + " " + cells.shown(c) + " is not a parameter of model " + kind.id() + "; ignored"));
        try {
            FluidModel model = kind.create(values);
            return new Fluid(model, density, new MeasuredWindow(least, most), new YieldBounds(low, high, atRest));
        } catch (ParameterException beyond) {
            throw cells.refusal(column(kind, beyond.parameter()), beyond.allowed());
        }
    }

    private static ModelKind kind(Cells cells) {
        String known = String.join(", ", Arrays.stream(ModelKind.values()).map(ModelKind::id).toList());
        if (!cells.given(MODEL)) {
            throw cells.refusal(MODEL, "is blank; give one of " + known);
        }
        return ModelKind.byId(cells.text(MODEL).toLowerCase(Locale.ROOT))
                .orElseThrow(() -> cells.refusal(MODEL, "is not a fluid model; give one of " + known));
    }

    private static double needed(Cells cells, String column, String why) {
        if (!cells.given(column)) {
            throw cells.refusal(column, "is blank" + why);
        }
        return cells.number(column);
    }

    private static String column(ModelKind kind, String parameter) {
        Stream<String> others = Stream.of(
                DENSITY, SHEAR_RATE_MIN, SHEAR_RATE_MAX, YIELD_STRESS_LOW, YIELD_STRESS_HIGH, STATIC_YIELD_STRESS);
        return Stream.concat(
                        kind.parameters().stream().filter(p -> p.name().equals(parameter)).map(Parameter::column),
                        others.filter(c -> c.startsWith(parameter)))
                .findFirst()
                .orElse(parameter);
    }
}
