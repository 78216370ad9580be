package stirwright.workbench.internal.importing;

import java.util.List;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.ImportTemplates;
import stirwright.exchange.UnusableFileException;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;

/** Choices kept by name: one is applied by choosing it, kept under the name that is typed, or removed. */
final class TemplateBar extends Composite {
    private static final int NAME_WIDTH = 50 * Looks.STEP;

    private final ImportSession session;
    private final ImportTemplates templates;
    private final Combo name;
    private final Button apply;
    private final Button save;
    private final Button remove;
    private final Label said;

    TemplateBar(Composite parent, Looks looks, ImportSession session, ImportTemplates templates) {
        super(parent, SWT.NONE);
        this.session = session;
        this.templates = templates;
        looks.onPage(this);
        setBackgroundMode(SWT.INHERIT_FORCE);
        GridLayout layout = new GridLayout(7, false);
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        setLayout(layout);
        looks.quiet(this, SWT.NONE, ImportWords.Template);
        name = Names.name(new Combo(this, SWT.DROP_DOWN), ImportWords.Template_name);
        GridData data = new GridData(SWT.LEFT, SWT.CENTER, false, false);
        data.widthHint = NAME_WIDTH;
        name.setLayoutData(data);
        name.setToolTipText(ImportWords.Template_tip);
        name.addListener(SWT.Modify, e -> enable());
        apply = looks.button(this, ImportWords.Template_apply, this::apply);
        save = looks.button(this, ImportWords.Template_save, this::save);
        remove = looks.button(this, ImportWords.Template_remove, this::remove);
        said = looks.quiet(this, SWT.NONE, "");
        GridData rest = new GridData(SWT.FILL, SWT.CENTER, true, false);
        rest.widthHint = NAME_WIDTH;
        said.setLayoutData(rest);
        Button again = looks.button(this, ImportWords.Template_detect, () -> session.choose(ImportChoice.DETECT));
        again.setToolTipText(ImportWords.Template_detectTip);
        fill();
    }

    private void fill() {
        String now = name.getText();
        List<String> names = templates.list();
        name.setItems(names.toArray(String[]::new));
        name.setText(now);
        enable();
    }

    private void enable() {
        boolean known = List.of(name.getItems()).contains(name.getText());
        apply.setEnabled(known);
        remove.setEnabled(known);
        save.setEnabled(!name.getText().isBlank());
    }

    private void apply() {
        attempt(() -> {
            session.choose(templates.load(name.getText()));
            say(ImportWords.Template_applied);
        });
    }

    private void save() {
        attempt(() -> {
            String under = name.getText().strip();
            templates.save(under, session.choice().forOtherFiles());
            name.setText(under);
            say(ImportWords.Template_saved);
        });
    }

    private void remove() {
        attempt(() -> {
            String gone = name.getText();
            templates.remove(gone);
            name.setText("");
            said.setText(Looks.literal(Messages.bind(ImportWords.Template_removed, gone)));
        });
    }

    private void say(String sentence) {
        said.setText(Looks.literal(Messages.bind(sentence, name.getText())));
    }

    private void attempt(Runnable deed) {
        try {
            deed.run();
        } catch (UnusableFileException unusable) {
            said.setText(Looks.literal(unusable.getMessage()));
        }
        said.setToolTipText(said.getText());
        fill();
    }
}
