package stirwright.workbench.internal.parts;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import stirwright.core.FactorFinding;
import stirwright.correlation.Correlation;
import stirwright.correlation.Figures;
import stirwright.study.Case;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.session.CorrelationEdits;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Form;
import stirwright.workbench.internal.widgets.Looks;

/** The factors for effects of the vessel on the selected candidate, each with a check mark that applies its effect or not. */
final class FactorsPage extends CardPage {
    private final CorrelationEdits edits;
    private final Map<String, Button> checks = new LinkedHashMap<>();
    private final Map<String, Label> words = new LinkedHashMap<>();
    private List<FactorFinding> factors = List.of();

    FactorsPage(Composite parent, Looks looks, Session session) {
        super(parent, looks, session);
        this.edits = new CorrelationEdits(session);
    }

    /** Asks for the factors once each time; what follows it uses the answer. */
    @Override
    List<Object> shape() {
        factors = find();
        return List.of(session.current(), factors.stream().map(f -> f.factor().id()).toList(), withoutFactor());
    }

    /** In an order that stays when one is left out. */
    private List<FactorFinding> find() {
        List<FactorFinding> all = new ArrayList<>();
        row().filter(r -> r.correlation().isPresent()).ifPresent(row -> session.outcome().orElseThrow().sheets().stream()
                .filter(s -> s.familyId().equals(row.familyId()) && s.computed()).findFirst().flatMap(s -> s.open())
                .ifPresent(open -> all.addAll(open.factors(session.outcome().orElseThrow().view().quantity(), row.correlationId()))));
        all.sort(Comparator.comparing(f -> f.effect().id()));
        return all;
    }

    /** The effects that the case leaves out though the selected candidate has no factor for them. */
    private List<String> withoutFactor() {
        List<String> ids = new ArrayList<>(session.current().map(c -> List.copyOf(c.getLeftOut())).orElse(List.of()));
        factors.forEach(f -> ids.remove(f.effect().id()));
        return ids;
    }

    @Override
    void build(Form form) {
        checks.clear();
        words.clear();
        form.sentence(factors.isEmpty() ? Messages.Factors_none : Messages.Factors_words);
        factors.forEach(f -> line(form, f.effect().id()));
        withoutFactor().forEach(id -> line(form, id));
    }

    private void line(Form form, String effectId) {
        Case one = session.current().orElseThrow();
        checks.put(effectId, form.check(effectId, true, on -> edits.apply(one, effectId, on)));
        Label label = form.sentence("");
        label.setFont(form.looks().small());
        words.put(effectId, label);
    }

    @Override
    void refresh() {
        Optional<Case> one = session.current();
        Map<String, FactorFinding> found = new LinkedHashMap<>();
        factors.forEach(f -> found.put(f.effect().id(), f));
        checks.forEach((id, check) -> {
            FactorFinding factor = found.get(id);
            check.setSelection(one.map(c -> !c.getLeftOut().contains(id)).orElse(true));
            put(check, factor == null ? id
                    : Messages.bind(Messages.Factors_check, factor.effect().title(), Figures.show(factor.value())));
            put(words.get(id), factor == null ? Messages.Factors_notHere : inWords(factor.factor()));
        });
    }

    private static String inWords(Correlation c) {
        return Messages.bind(Messages.Factors_source, new Object[] {c.id(),
                String.join("; ", c.validity().stream().map(b -> b.words()).toList()), c.citation()});
    }

    private static void put(Button button, String text) {
        if (!button.getText().equals(Looks.literal(text))) {
            button.setText(Looks.literal(text));
        }
    }

    private static void put(Label label, String text) {
        if (!label.getText().equals(Looks.literal(text))) {
            label.setText(Looks.literal(text));
        }
    }
}
