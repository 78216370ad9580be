package stirwright.cards.internal;

import java.util.Map;
import java.util.Optional;
import stirwright.correlation.Correlation;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Quantity;
import stirwright.correlation.Variable;

/** The symbols of a formula with their units: what it gives, the variables and the dimensions that it reads. */
final class SymbolTable {

    /** How the trade defines what several authors define otherwise. */
    private static final Map<String, String> DEFINITIONS = Map.of(
            Quantity.POWER_NUMBER.id(), "P/(rho N^3 D^5)",
            Quantity.FLOW_NUMBER.id(), "Q/(N D^3)",
            Quantity.SHEAR_RATE_CONSTANT.id(), "average shear rate over speed",
            Variable.FROUDE.id(), "N^2 D/g, g 9.80665 m/s2",
            Variable.FLOW_INDEX.id(), "d ln(stress)/d ln(shear rate) at the average shear rate",
            Variable.YIELD_NUMBER.id(), "yield stress over rho N^2 D^2");

    private SymbolTable() {}

    static void write(Html html, Correlation card, Optional<PlotData> plot) {
        html.leaf("h2", "Symbols").line().open("table").open("thead").open("tr").leaf("th", "Symbol", "scope", "col")
                .leaf("th", "Meaning", "scope", "col").leaf("th", "Unit", "scope", "col").close().close().line().open("tbody");
        Quantity quantity = card.quantity();
        row(html, quantity.symbol(), quantity.title() + definition(quantity.id()), quantity.unit());
        for (Variable variable : card.reads()) {
            row(html, variable.symbol(), variable.title() + (variable.equals(Variable.REYNOLDS)
                    ? ", " + card.reynoldsDefinition().title() : definition(variable.id().replace('_', '-'), variable.id())),
                    variable.unit());
        }
        plot.ifPresent(data -> data.read().forEach(read -> {
            // The family says how it measures it.
            GeometryParameter parameter = data.base().family().parameter(read.id()).orElse(read);
            row(html, parameter.symbol(), parameter.title() + ": " + parameter.meaning(), parameter.kind().unit());
        }));
        html.close().close().line();
    }

    private static String definition(String... ids) {
        for (String id : ids) {
            if (DEFINITIONS.containsKey(id)) {
                return ", " + DEFINITIONS.get(id);
            }
        }
        return "";
    }

    private static void row(Html html, String symbol, String meaning, String unit) {
        html.open("tr").leaf("th", symbol, "scope", "row").leaf("td", meaning).leaf("td", unit.equals("-") ? "pure number" : unit)
                .close().line();
    }
}
