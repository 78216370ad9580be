package stirwright.workbench.internal.parts;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Composite;
import stirwright.correlation.Correlation;
import stirwright.exchange.CaseField;
import stirwright.exchange.TypedNumber;
import stirwright.study.Case;
import stirwright.study.Constant;
import stirwright.study.OwnConstants;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.session.CorrelationEdits;
import stirwright.workbench.internal.session.Problems;
import stirwright.workbench.internal.session.Published;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Form;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.NumberField;

/** The constants of the selected correlation: the case's value in a field, the published one behind it to go back to. */
final class ConstantsPage extends CardPage {
    private final CorrelationEdits edits;
    private final Problems problems;
    private final Runnable toFront;
    private final List<NumberField> fields = new ArrayList<>();

    /** @param toFront turns to this page */
    ConstantsPage(Composite parent, Looks looks, Session session, Problems problems, Runnable toFront) {
        super(parent, looks, session);
        this.edits = new CorrelationEdits(session);
        this.problems = problems;
        this.toFront = toFront;
    }

    @Override
    List<Object> shape() {
        List<Object> all = new ArrayList<>();
        all.add(session.current());
        all.add(published().map(Correlation::id));
        all.add(published().isPresent() ? List.of() : List.copyOf(ofCase()));
        return all;
    }

    private Optional<Correlation> published() {
        return Published.ofSelected(session);
    }

    private List<Constant> ofCase() {
        return session.current().map(Case::getConstants).map(List::copyOf).orElse(List.of());
    }

    @Override
    void build(Form form) {
        fields.forEach(f -> problems.remove(f.column()));
        fields.clear();
        Optional<Correlation> published = published();
        published.ifPresent(c -> {
            form.sentence(c.constants().names().isEmpty() ? Messages.Constants_none : Messages.Constants_words);
            if (!c.constants().names().isEmpty()) {
                form.sentence(c.formulaByName());
            }
            c.constants().names().forEach(name -> field(form, c, name, c.constants().get(name)));
        });
        if (published.isEmpty()) {
            form.sentence(Messages.Constants_none);
            // A case that is refused for one of them has no row to select, so the way back is here.
            ofCase().forEach(constant -> form.looks().link(form, Messages.bind(Messages.Constants_forget,
                    constant.getCorrelation(), constant.getName()), () -> edits.forget(theCase(), constant))
                    .setLayoutData(Form.wholeLine()));
        }
    }

    private void field(Form form, Correlation c, String name, double published) {
        Case one = theCase();
        boolean[] typed = new boolean[1];
        CaseField field = new CaseField(c.id() + ' ' + name, Messages.bind(Messages.Constants_name, name), name, "-");
        NumberField[] made = new NumberField[1];
        made[0] = NumberField.acting(form, field, Messages.bind(Messages.Constants_nameOf, name, c.title()),
                Messages.bind(Messages.Constants_published, TypedNumber.show(published)),
                () -> {
                    edits.publish(one, c.id(), name);
                    made[0].reset();
                }, published,
                () -> OwnConstants.get(one, c.id(), name).orElse(published),
                value -> {
                    typed[0] = true;
                    edits.typed(one, c.id(), name, published, value);
                },
                () -> {
                    // Passing through a field changes nothing, nor does one that goes with its case.
                    if (typed[0] && session.current().filter(one::equals).isPresent()) {
                        edits.left(one, c.id(), name, published);
                    }
                    typed[0] = false;
                    session.editor().endMerge();
                }, () -> note(made[0]));
        fields.add(made[0]);
        made[0].control().addListener(SWT.Dispose, e -> problems.remove(field.column()));
    }

    private void note(NumberField field) {
        if (field.problem().isEmpty()) {
            problems.remove(field.column());
        } else {
            problems.add(field.column(), () -> {
                toFront.run();
                if (!field.control().isDisposed()) {
                    field.control().setFocus();
                }
            });
        }
    }

    private Case theCase() {
        return session.current().orElseThrow();
    }

    @Override
    void refresh() {
        fields.forEach(NumberField::refresh);
    }
}
