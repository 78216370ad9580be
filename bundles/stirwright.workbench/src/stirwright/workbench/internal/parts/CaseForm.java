package stirwright.workbench.internal.parts;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.DoubleConsumer;
import java.util.function.DoubleSupplier;
import java.util.function.Function;
import java.util.function.Supplier;
import org.eclipse.emf.common.util.EList;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Text;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Family;
import stirwright.exchange.CaseField;
import stirwright.study.Amount;
import stirwright.study.Amounts;
import stirwright.study.Case;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.session.CaseEdits;
import stirwright.workbench.internal.session.Page;
import stirwright.workbench.internal.session.Pages;
import stirwright.workbench.internal.session.Problems;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Form;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;
import stirwright.workbench.internal.widgets.NumberField;

/** The fields of the case at hand, as long as its family, its model and the parts to choose from stay what they are. */
final class CaseForm extends Composite {
    private final Session session;
    private final CaseEdits edits;
    private final Problems problems;
    private final Pages pages;
    private final List<NumberField> fields = new ArrayList<>();
    private final List<Runnable> refreshers = new ArrayList<>();
    private final List<Object> shape;
    private final Form form;

    CaseForm(Composite parent, Looks looks, Session session, Problems problems, Pages pages) {
        super(parent, SWT.NONE);
        this.session = session;
        this.problems = problems;
        this.pages = pages;
        this.edits = new CaseEdits(session);
        this.shape = shape();
        setLayout(new FillLayout());
        form = new Form(this, looks);
        session.current().ifPresentOrElse(this::build, () -> form.sentence(Messages.Case_none));
    }

    /** What decides which fields there are. */
    private List<Object> shape() {
        List<Object> all = new ArrayList<>();
        all.add(session.current());
        all.add(pages.current());
        session.current().ifPresent(c -> {
            all.add(Optional.ofNullable(c.getFluid()));
            all.add(c.getFluid() == null ? "" : String.valueOf(c.getFluid().getModel()));
            all.add(Optional.ofNullable(c.getVessel()));
            all.add(Optional.ofNullable(c.getImpeller()));
            all.add(session.familyId());
            all.add(List.copyOf(c.getCompared()));
            all.add(pages.current() == Page.FLOW_CURVE && c.getFluid() != null ? List.copyOf(c.getFluid().getCurves()) : List.of());
            all.add(c.getDemand() == null ? "" : c.getDemand().getColumn());
            all.add(List.copyOf(session.editor().study().getCases()));
            all.add(List.copyOf(session.editor().study().getFluids()));
            all.add(List.copyOf(session.editor().study().getVessels()));
            all.add(List.copyOf(session.editor().study().getImpellers()));
        });
        all.add(families().stream().map(Family::id).toList());
        return all;
    }

    private List<Family> families() {
        return session.catalogue().families().stream().sorted(Comparator.comparing(Family::title)).toList();
    }

    private void build(Case c) {
        CaseGroups groups = new CaseGroups(this, form, session, edits);
        if (pages.current() == Page.FLOW_CURVE) {
            groups.caseOfFluid(c);
            groups.fluid(c, true);
            groups.curves(c);
            return;
        }
        groups.theCase(c);
        groups.speed(c);
        groups.fluid(c, false);
        groups.vessel(c);
        groups.impeller(c, families());
        groups.compare(c, families());
        groups.given(c);
    }

    /** Something else that shows the study as it is. */
    void refreshed(Runnable refresher) {
        refreshers.add(refresher);
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

    /** A choice among things of the study, whose names may change while it stands. */
    <T> void choice(String title, List<T> all, T current, Function<T, String> name, Consumer<T> use) {
        Combo combo = form.choice(title, names(all, name), all.indexOf(current), i -> use.accept(all.get(i)));
        refreshers.add(() -> {
            List<String> now = names(all, name);
            if (!List.of(combo.getItems()).equals(now)) {
                int selected = combo.getSelectionIndex();
                combo.setItems(now.toArray(String[]::new));
                combo.select(selected);
            }
        });
    }

    private static <T> List<String> names(List<T> all, Function<T, String> name) {
        return all.stream().map(name).map(String::valueOf).toList();
    }

    /** The name of a thing of the study. */
    void text(String name, Supplier<String> stored, Consumer<String> store) {
        Text text = form.text(Messages.Case_name, name, Objects.requireNonNullElse(stored.get(), ""));
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

    /** Leaves out of the count what cannot be read in these fields, since they go. */
    void dropProblems() {
        fields.forEach(field -> problems.remove(field.column()));
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
                        .map(r -> outcome.words().of(r)).orElse(""));
            }
        });
    }

    /** The texts that cannot be read, by their columns. */
    Map<String, String> unreadable() {
        Map<String, String> texts = new LinkedHashMap<>();
        fields.stream().filter(f -> !f.problem().isEmpty()).forEach(f -> texts.put(f.column(), f.control().getText()));
        return texts;
    }

    /** Puts such texts back into fields that were made anew for the same case. */
    void retype(Map<String, String> texts) {
        fields.stream().filter(f -> texts.containsKey(f.column())).forEach(f -> f.retype(texts.get(f.column())));
    }

    /** Whether these are the fields of the case at hand. */
    boolean ofTheCaseAtHand() {
        return shape.get(0).equals(session.current());
    }

    /** What has the focus, by its name; empty for nothing in here. */
    String focused() {
        Control focus = getDisplay().getFocusControl();
        for (Control parent = focus; parent != null; parent = parent.getParent()) {
            if (parent == this) {
                return Objects.requireNonNullElse(Names.of(focus), "");
            }
        }
        return "";
    }

    /** Gives the focus to the control of that name, where there is one. */
    void focus(String name) {
        if (!name.isEmpty()) {
            Arrays.stream(form.getChildren()).filter(c -> name.equals(Names.of(c))).findFirst().ifPresent(Control::setFocus);
        }
    }
}
