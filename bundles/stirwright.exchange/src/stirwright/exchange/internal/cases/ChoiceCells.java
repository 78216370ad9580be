package stirwright.exchange.internal.cases;

import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import stirwright.core.CaseRefusedException;
import stirwright.core.Choices;
import stirwright.correlation.Quantity;

/** What a row settles by hand: a correlation or a value for a quantity, effects left out, constants of its own. */
final class ChoiceCells {

    private record Choice(Quantity quantity, String correlation, String value) {}

    private static final List<Choice> ALL = List.of(
            new Choice(Quantity.POWER_NUMBER, CaseColumns.CORRELATION, CaseColumns.POWER_NUMBER),
            new Choice(Quantity.SHEAR_RATE_CONSTANT, CaseColumns.SHEAR_RATE_CORRELATION, CaseColumns.SHEAR_RATE_CONSTANT),
            new Choice(Quantity.FLOW_NUMBER, CaseColumns.FLOW_NUMBER_CORRELATION, CaseColumns.FLOW_NUMBER));

    /** The columns of given values. */
    static final List<String> VALUES = ALL.stream().map(Choice::value).toList();

    private ChoiceCells() {}

    /** The quantities that have columns for being settled by hand. */
    static Stream<Quantity> quantities() {
        return ALL.stream().map(Choice::quantity);
    }

    /** The column of a quantity's given value; empty when there is none. */
    static Optional<String> valueColumn(Quantity quantity) {
        return ALL.stream().filter(c -> c.quantity().equals(quantity)).map(Choice::value).findFirst();
    }

    /** @throws CaseRefusedException when a value is not above 0 or stands beside a correlation, or constants are no such */
    static Choices read(Cells cells) {
        Map<Quantity, String> correlations = new HashMap<>();
        Map<Quantity, Double> givens = new HashMap<>();
        for (Choice choice : ALL) {
            boolean byValue = cells.given(choice.value());
            if (byValue && cells.given(choice.correlation())) {
                throw cells.refusal(choice.value(), "stands beside " + cells.inWords(List.of(choice.correlation()))
                        + "; give one of them");
            }
            if (byValue) {
                givens.put(choice.quantity(), cells.positive(choice.value()));
            } else if (cells.given(choice.correlation())) {
                correlations.put(choice.quantity(), cells.text(choice.correlation()));
            }
        }
        Set<String> effectsLeftOut = effectsLeftOut(cells);
        Map<String, Map<String, Double>> constants =
                cells.given(CaseColumns.CONSTANTS) ? ConstantsText.read(cells) : Map.of();
        boolean nothing = correlations.isEmpty() && givens.isEmpty() && effectsLeftOut.isEmpty() && constants.isEmpty();
        return nothing ? Choices.NONE : new Choices(correlations, givens, effectsLeftOut, constants);
    }

    private static Set<String> effectsLeftOut(Cells cells) {
        Set<String> effects = new LinkedHashSet<>(List.of(cells.text(CaseColumns.EFFECTS_LEFT_OUT).split("[\\s,;]+")));
        effects.remove("");
        return effects;
    }
}
