package stirwright.workbench.internal.widgets;

import java.util.function.DoubleConsumer;
import java.util.function.DoubleSupplier;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;
import stirwright.exchange.CaseField;
import stirwright.exchange.TypedNumber;

/**
 * A number of the case as people type it, with another unit if they like. What cannot be read stays in the field with the
 * reason below it, and the study goes back to what it had before the typing began, until the text can be read.
 */
public final class NumberField {
    private final CaseField field;
    private final DoubleSupplier stored;
    private final DoubleConsumer store;
    private final Runnable problemChanged;
    /** What a blank stands for. */
    private final double blankMeans;
    private final Text text;
    private final Label remark;
    private final Looks looks;
    private String problem = "";
    private boolean refreshing;
    /** What the study had when this field's text and the study agreed last and nobody was typing. */
    private double before;

    /**
     * @param stored what the study has, in the column's unit; NaN for nothing
     * @param store receives what was typed, NaN for a blank
     * @param left called when the focus leaves the field
     * @param problemChanged called when the text becomes readable or unreadable
     */
    public NumberField(
            Form form, String title, CaseField field, DoubleSupplier stored, DoubleConsumer store, Runnable left,
            Runnable problemChanged) {
        this(form, form.number(title, field.unit(), meaning(field)), field, Double.NaN, stored, store, left, problemChanged);
    }

    private NumberField(
            Form form, Text text, CaseField field, double blankMeans, DoubleSupplier stored, DoubleConsumer store, Runnable left,
            Runnable problemChanged) {
        this.field = field;
        this.blankMeans = blankMeans;
        this.stored = stored;
        this.store = store;
        this.problemChanged = problemChanged;
        this.looks = form.looks();
        this.text = text;
        this.remark = form.remark();
        before = stored.getAsDouble();
        text.setText(TypedNumber.show(before));
        // With the keyboard one goes from field to field to type anew; a click sets the caret afterwards.
        text.addListener(SWT.FocusIn, e -> {
            text.selectAll();
            if (problem.isEmpty()) {
                before = stored.getAsDouble();
            }
        });
        text.addListener(SWT.Modify, e -> typed());
        text.addListener(SWT.FocusOut, e -> {
            settle();
            left.run();
        });
        text.addListener(SWT.DefaultSelection, e -> settle());
    }

    /**
     * A field with words behind it that act on it, in place of a unit.
     *
     * @param name for those who hear the window
     * @param blankMeans what the study has while the field is blank
     */
    public static NumberField acting(
            Form form, CaseField field, String name, String act, Runnable action, double blankMeans, DoubleSupplier stored,
            DoubleConsumer store, Runnable left, Runnable problemChanged) {
        return new NumberField(
                form, form.number(field.symbol(), name, act, action), field, blankMeans, stored, store, left, problemChanged);
    }

    /** "C: impeller centre above the bottom". */
    private static String meaning(CaseField field) {
        return field.symbol() + ": " + (field.meaning().isEmpty() ? field.title() : field.meaning());
    }

    public String column() {
        return field.column();
    }

    /** Why the text cannot be read; empty when it can. */
    public String problem() {
        return problem;
    }

    /** Takes over a text that could not be read where it was typed. */
    public void retype(String words) {
        text.setText(words);
    }

    public Text control() {
        return text;
    }

    private void typed() {
        if (refreshing) {
            return;
        }
        switch (TypedNumber.read(text.getText(), field)) {
            case TypedNumber.Value value -> {
                setProblem("");
                store.accept(value.value());
            }
            case TypedNumber.Blank blank -> {
                setProblem("");
                store.accept(Double.NaN);
            }
            case TypedNumber.Problem unreadable -> {
                setProblem(unreadable.words());
                store.accept(before);
            }
        }
    }

    private void setProblem(String words) {
        boolean change = problem.isEmpty() != words.isEmpty();
        problem = words;
        showRemark(words);
        if (change) {
            problemChanged.run();
        }
    }

    /** Once it is left, the field shows the number in its own unit. */
    private void settle() {
        if (problem.isEmpty()) {
            before = stored.getAsDouble();
            put(TypedNumber.show(before));
        }
    }

    /** Takes over what the study has, unless the text says the same already or cannot be read yet. */
    public void refresh() {
        boolean same = switch (TypedNumber.read(text.getText(), field)) {
            case TypedNumber.Value value -> Double.compare(value.value(), stored.getAsDouble()) == 0;
            case TypedNumber.Blank blank -> Double.compare(stored.getAsDouble(), blankMeans) == 0;
            // The study is still where it was, so nothing speaks against the text.
            case TypedNumber.Problem unreadable -> Double.compare(before, stored.getAsDouble()) == 0;
        };
        if (!same) {
            before = stored.getAsDouble();
            put(TypedNumber.show(stored.getAsDouble()));
            setProblem("");
        }
    }

    /** Puts what the study has in place of whatever was typed. */
    public void reset() {
        setProblem("");
        settle();
    }

    private void put(String words) {
        if (!text.getText().equals(words)) {
            refreshing = true;
            text.setText(words);
            refreshing = false;
        }
    }

    /** What stands in while the field is blank, for instance "0.2 (T/3)". */
    public void showDefault(String words) {
        if (!text.getMessage().equals(words)) {
            text.setMessage(words);
            text.setToolTipText(words.isEmpty() ? null : words);
        }
    }

    /** What the calculation has against the value; the field's own problem goes before it. */
    public void showRefusal(String words) {
        if (problem.isEmpty()) {
            showRemark(words);
        }
    }

    private void showRemark(String words) {
        String literal = Looks.literal(words);
        if (remark.getText().equals(literal)) {
            return;
        }
        remark.setText(literal);
        remark.setForeground(looks.palette().outside());
        remark.setVisible(!words.isEmpty());
        ((GridData) remark.getLayoutData()).exclude = words.isEmpty();
        remark.requestLayout();
    }
}
