package stirwright.workbench.internal.parts;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.DoubleConsumer;
import java.util.function.DoubleSupplier;
import java.util.function.Supplier;
import org.eclipse.emf.common.util.EList;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Text;
import org.eclipse.swt.SWT;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Family;
import stirwright.exchange.CaseField;
import stirwright.study.Amount;
import stirwright.study.Amounts;
import stirwright.study.Case;
import stirwright.study.Part;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.session.CaseEdits;
import stirwright.workbench.internal.session.Problems;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Form;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.NumberField;

/** The fields of the case at hand, as long as its family, its model and the parts to choose from stay what they are. */
final class CaseForm extends Composite {
    private final Session session;
    private final CaseEdits edits;
    private final Problems problems;
    private final List<NumberField> fields = new ArrayList<>();
    private final List<Runnable> refreshers = new ArrayList<>();
    private final List<Object> shape;
    private final Form form;

    CaseForm(Composite parent, Looks looks, Session session, Problems problems) {
        super(parent, SWT.NONE);
        this.session = session;
        this.problems = problems;
        this.edits = new CaseEdits(session);
        this.shape = shape();
        setLayout(new FillLayout());
        form = new Form(this, looks);
        session.current().ifPresentOrElse(this::build, () -> form.heading(Messages.Case_none));
    }

    /** What decides which fields there are. */
    private List<Object> shape() {
        List<Object> all = new ArrayList<>();
        all.add(session.current());
        session.current().ifPresent(c -> {
            all.add(Optional.ofNullable(c.getFluid()));
            all.add(c.getFluid() == null ? "" : String.valueOf(c.getFluid().getModel()));
            all.add(Optional.ofNullable(c.getVessel()));
            all.add(Optional.ofNullable(c.getImpeller()));
            all.add(session.familyId());
            all.add(List.copyOf(c.getCompared()));
            all.add(c.getDemand() == null ? "" : c.getDemand().getColumn());
            all.add(names(session.editor().study().getFluids()));
            all.add(names(session.editor().study().getVessels()));
            all.add(names(session.editor().study().getImpellers()));
            all.add(session.editor().study().getCases().stream().map(o -> String.valueOf(o.getName())).toList());
        });
        all.add(families().stream().map(Family::id).toList());
        return all;
    }

    private static List<String> names(List<? extends Part> parts) {
        return parts.stream().map(p -> String.valueOf(p.getName())).toList();
    }

    private List<Family> families() {
        return session.catalogue().families().stream().sorted(Comparator.comparing(Family::title)).toList();
    }

    private void build(Case c) {
        CaseGroups groups = new CaseGroups(this, form, session, edits);
        groups.theCase(c);
        groups.speed(c);
        groups.fluid(c);
        groups.vessel(c);
        groups.impeller(c, families());
        groups.compare(c, families());
        groups.given(c);
    }

    /** A field for an amount. */
    void number(CaseField field, EList<Amount> owner) {
        number(capital(field.title()), field, owner);
    }

    /** The same under a title of the window's own. */
    void number(String title, CaseField field, EList<Amount> owner) {
        number(title, field, () -> Amounts.get(owner, field.column()).orElse(Double.NaN),
                value -> edits.amount(Messages.bind(Messages.Edit_amount, field.title()), owner, field.column(), value));
    }

    void number(String title, CaseField field, DoubleSupplier stored, DoubleConsumer store) {
        NumberField[] made = new NumberField[1];
        made[0] = new NumberField(form, title, field, stored, store, () -> session.editor().endMerge(), () -> note(made[0]));
        fields.add(made[0]);
        refreshers.add(made[0]::refresh);
    }

    /** A line of text that follows the study. */
    void text(String title, Supplier<String> stored, Consumer<String> store) {
        Text text = form.text(title, Objects.requireNonNullElse(stored.get(), ""));
        text.addListener(SWT.FocusOut, e -> session.editor().endMerge());
        text.addListener(SWT.Modify, e -> store.accept(text.getText()));
        refreshers.add(() -> {
            String now = Objects.requireNonNullElse(stored.get(), "");
            if (!text.getText().equals(now)) {
                text.setText(now);
            }
        });
    }

    static String capital(String words) {
        return Character.toUpperCase(words.charAt(0)) + words.substring(1);
    }

    private void note(NumberField field) {
        if (field.problem().isEmpty()) {
            problems.remove(field.column());
        } else {
            problems.add(field.column(), () -> field.control().setFocus());
        }
    }

    /** Whether these are still the fields that the case needs. */
    boolean fits() {
        return shape.equals(shape());
    }

    void refresh() {
        refreshers.forEach(Runnable::run);
    }

    /** Shows what stands in for blanks, and what was refused, beside the fields. */
    void showOutcome() {
        session.outcome().ifPresent(outcome -> {
            Optional<VesselGeometry> vessel = outcome.main().open().flatMap(o -> o.vessel());
            Optional<Family> family = outcome.catalogue().family(session.familyId());
            for (NumberField field : fields) {
                field.showDefault(vessel.flatMap(v -> family.flatMap(f -> f.parameters().stream()
                        .filter(p -> p.column().equals(field.column()) && v.defaulted().contains(p)).findFirst()
                        .map(v::defaultValueInWords))).orElse(""));
                field.showRefusal(outcome.main().result().refusal().filter(r -> r.field().equals(field.column()))
                        .map(r -> outcome.words().of(r.words())).orElse(""));
            }
        });
    }

    /** The column of the field that has the focus; empty for none. */
    String focusedColumn() {
        return fields.stream().filter(f -> f.control().isFocusControl()).map(NumberField::column).findFirst().orElse("");
    }

    void focus(String column) {
        fields.stream().filter(f -> f.column().equals(column)).findFirst().ifPresent(f -> f.control().setFocus());
    }
}
