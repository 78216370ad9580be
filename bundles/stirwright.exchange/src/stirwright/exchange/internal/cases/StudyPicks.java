package stirwright.exchange.internal.cases;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import stirwright.core.CaseRefusedException;
import stirwright.core.Catalogue;
import stirwright.core.Choices;
import stirwright.correlation.Figures;
import stirwright.correlation.Quantity;
import stirwright.exchange.internal.table.Texts;
import stirwright.study.Pick;
import stirwright.study.Picks;

/** The picks of a case: cells where the case table has a column for them, choices of their own where it has none. */
final class StudyPicks {
    private final Catalogue catalogue;
    private final StudyRow row;
    private final Map<Quantity, String> correlations = new HashMap<>();
    private final Map<Quantity, Double> givens = new HashMap<>();

    StudyPicks(Catalogue catalogue, StudyRow row) {
        this.catalogue = catalogue;
        this.row = row;
    }

    void take(Pick pick) {
        Optional<Quantity> known = quantity(pick.getQuantity());
        if (known.isEmpty()) {
            row.obstruct(new CaseRefusedException("pick", Texts.show(text(pick.getQuantity())),
                    "is not a quantity of any installed correlation; remove the pick or install the correlations"));
            return;
        }
        Quantity quantity = known.get();
        if (Picks.isGiven(pick)) {
            give(quantity, pick);
        } else {
            choose(quantity, text(pick.getCorrelation()).strip());
        }
        if (!text(pick.getReason()).isBlank()) {
            row.remark(quantity.title() + " chosen by hand: " + Texts.trim(pick.getReason()));
        }
    }

    private void give(Quantity quantity, Pick pick) {
        String value = pick.isSetValue() ? Figures.exact(pick.getValue()) : "";
        Optional<String> column = ChoiceCells.valueColumn(quantity);
        if (value.isEmpty() || !(pick.getValue() > 0)) {
            row.obstruct(new CaseRefusedException(column.orElse(quantity.title()), value,
                    "is picked as given; give a value greater than 0"));
        } else if (column.isPresent()) {
            row.put(column.get(), value, "a pick");
        } else {
            refuseSecond(quantity, givens.put(quantity, pick.getValue()));
        }
    }

    private void choose(Quantity quantity, String id) {
        String field = Choices.field(quantity);
        if (id.isEmpty()) {
            row.obstruct(new CaseRefusedException(field, "", "is picked and names no correlation; name one or remove the pick"));
        } else if (row.isColumn(field)) {
            row.put(field, id, "a pick");
        } else {
            refuseSecond(quantity, correlations.put(quantity, id));
        }
    }

    private void refuseSecond(Quantity quantity, Object first) {
        if (first != null || correlations.containsKey(quantity) && givens.containsKey(quantity)) {
            row.obstruct(new CaseRefusedException("pick", quantity.id(), "is picked twice; keep one"));
        }
    }

    /** Only asked for when nothing was picked twice. */
    Choices addTo(Choices ofColumns) {
        if (correlations.isEmpty() && givens.isEmpty()) {
            return ofColumns;
        }
        correlations.putAll(ofColumns.correlations());
        givens.putAll(ofColumns.givens());
        return new Choices(correlations, givens, ofColumns.effectsLeftOut(), ofColumns.constants());
    }

    private Optional<Quantity> quantity(String id) {
        return Stream.concat(ChoiceCells.quantities(),
                        catalogue.entries().stream().map(e -> e.correlation().quantity()))
                .filter(q -> q.id().equals(id)).findFirst();
    }

    private static String text(String text) {
        return text == null ? "" : text;
    }
}
