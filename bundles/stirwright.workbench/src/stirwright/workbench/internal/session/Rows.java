package stirwright.workbench.internal.session;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import stirwright.core.CandidateResult;
import stirwright.core.Catalogue;
import stirwright.core.Choices;
import stirwright.core.Entry;
import stirwright.core.FluidState;
import stirwright.core.QuantityResult;
import stirwright.correlation.Correlation;
import stirwright.correlation.Figures;
import stirwright.correlation.Quantity;
import stirwright.workbench.internal.Messages;

/** The candidates of all families shown, for one quantity. */
final class Rows {
    private final Catalogue catalogue;
    private final Quantity quantity;
    private final Map<String, Integer> styles = new HashMap<>();
    private final List<Row> rows = new ArrayList<>();
    private Sheet main;

    private Rows(Catalogue catalogue, Quantity quantity) {
        this.catalogue = catalogue;
        this.quantity = quantity;
    }

    static List<Row> of(Catalogue catalogue, Quantity quantity, List<Sheet> sheets) {
        Rows rows = new Rows(catalogue, quantity);
        sheets.forEach(sheet -> rows.styleAll(sheet, catalogue));
        // Those that the case made last, so that no other curve changes its colour when they come.
        sheets.forEach(sheet -> rows.styleAll(sheet, sheet.catalogue(catalogue)));
        rows.main = sheets.get(0);
        sheets.stream().filter(Sheet::computed).forEach(rows::add);
        return List.copyOf(rows.rows);
    }

    /** By the order of the ids and not by that of the results, so that a curve keeps its colour while numbers change. */
    private void styleAll(Sheet sheet, Catalogue from) {
        from.correlations(quantity, sheet.familyId()).stream().map(Correlation::id).sorted()
                .forEach(id -> style(sheet, id));
    }

    private int style(Sheet sheet, String id) {
        return styles.computeIfAbsent(Row.key(sheet.familyId(), id), key -> styles.size());
    }

    private void add(Sheet sheet) {
        if (quantity.equals(Quantity.POWER_NUMBER)) {
            List<CandidateResult> results = sheet.result().candidates();
            results.forEach(r -> addPower(sheet, r));
        } else {
            List<QuantityResult> results = sheet.result().quantities().stream()
                    .filter(q -> q.quantity().equals(quantity)).toList();
            results.forEach(r -> addOther(sheet, r));
        }
    }

    private void addPower(Sheet sheet, CandidateResult r) {
        boolean pick = isPick(sheet);
        double reference = pick ? r.power() : reference(Row::power);
        rows.add(new Row(sheet.familyId(), sheet.familyTitle(), r.correlation(), title(sheet, r.correlation()),
                correlation(sheet, r.correlation()), style(sheet, r.correlation()), pick, r.role(),
                r.powerNumber(), r.state().map(FluidState::speed).orElse(Double.NaN), r.power(), r.torque(),
                r.power() / reference - 1, r.verdict(), r.failedBounds(), r.why()));
    }

    private void addOther(Sheet sheet, QuantityResult r) {
        boolean pick = isPick(sheet);
        double reference = pick ? r.value() : reference(Row::value);
        rows.add(new Row(sheet.familyId(), sheet.familyTitle(), r.id(), title(sheet, r.id()), r.correlation(), style(sheet, r.id()),
                pick, r.role(), r.value(), Double.NaN, Double.NaN, Double.NaN, r.value() / reference - 1, r.verdict(),
                r.failedBounds(), r.why()));
    }

    /** The first candidate of the case's own family; results have their pick first. */
    private boolean isPick(Sheet sheet) {
        return sheet == main && rows.isEmpty();
    }

    /** What deviations are taken from; unknown where the case's own family has no number. */
    private double reference(ToDoubleFunction<Row> number) {
        return rows.isEmpty() || !rows.get(0).pick() ? Double.NaN : number.applyAsDouble(rows.get(0));
    }

    private Optional<Correlation> correlation(Sheet sheet, String id) {
        return sheet.catalogue(catalogue).entry(id).map(Entry::correlation);
    }

    private String title(Sheet sheet, String id) {
        String title = correlation(sheet, id).map(Correlation::title).orElse(Messages.Row_given);
        return sheet.spec().map(spec -> spec.choices().constants()).orElse(Map.of()).entrySet().stream()
                .filter(own -> Choices.changed(own.getKey()).equals(id)).findFirst()
                .map(own -> Messages.bind(Messages.Row_changed, constants(own.getValue()), title)).orElse(title);
    }

    /** "k = 10", which tells it from the published one even where there is little room. */
    private static String constants(Map<String, Double> own) {
        return String.join(", ", own.entrySet().stream()
                .map(c -> Messages.bind(Messages.Row_constant, c.getKey(), Figures.exact(c.getValue()))).toList());
    }
}
