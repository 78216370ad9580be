package stirwright.workbench.internal.parts;

import java.util.List;
import java.util.Optional;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.ScrolledComposite;
import org.eclipse.swt.widgets.Composite;
import stirwright.workbench.internal.session.Row;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Form;
import stirwright.workbench.internal.widgets.Looks;

/** A page of fields beside the card's words, made anew only when other fields are needed. */
abstract class CardPage extends ScrolledComposite {
    private static final int LABEL_WIDTH = 12 * Looks.STEP;

    final Session session;
    private final Looks looks;
    private Form form;
    private List<Object> shape = List.of();

    CardPage(Composite parent, Looks looks, Session session) {
        super(parent, SWT.V_SCROLL);
        this.looks = looks;
        this.session = session;
        looks.onPage(this);
        setExpandHorizontal(true);
        setExpandVertical(true);
        setShowFocusedControl(true);
        addListener(SWT.Resize, e -> fit());
    }

    /** Brings the page up to date with the study and the last numbers. */
    final void show() {
        List<Object> wanted = shape();
        if (form == null || !wanted.equals(shape)) {
            shape = wanted;
            if (form != null) {
                form.dispose();
            }
            form = new Form(this, looks, LABEL_WIDTH);
            form.addListener(SWT.Resize, e -> fit());
            build(form);
            setContent(form);
        }
        refresh();
        fit();
    }

    /** Drops fields that belong to something else than what is at hand now, together with what is typed in them. */
    final void dropStale() {
        if (form != null && !shape().equals(shape)) {
            form.dispose();
            form = null;
        }
    }

    /** What decides which fields there are. */
    abstract List<Object> shape();

    abstract void build(Form fields);

    /** Takes over what the study and the numbers have now. */
    abstract void refresh();

    Optional<Row> row() {
        return session.selected();
    }

    private void fit() {
        if (form != null && !form.isDisposed()) {
            setMinSize(form.computeSize(getClientArea().width, SWT.DEFAULT));
        }
    }
}
