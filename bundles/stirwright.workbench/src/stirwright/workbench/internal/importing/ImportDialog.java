package stirwright.workbench.internal.importing;

import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.SashForm;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Shell;
import stirwright.exchange.CurveImport;
import stirwright.exchange.CurveSource;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.ImportTemplates;
import stirwright.study.Curve;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.widgets.Looks;

/**
 * Shows what is in a source and what would come of it. Everything that was detected can be overruled, and nothing is taken
 * before somebody says so.
 */
final class ImportDialog {
    private static final int WIDTH = 1240;
    private static final int HEIGHT = 700;
    private static final int LEAST_WIDTH = 960;
    private static final int LEAST_HEIGHT = 520;
    private static final int[] SHARES = {34, 26, 40};

    private final Shell parent;
    private final Looks looks;
    private final ImportTemplates templates;
    private final ImportSession session;
    private Shell shell;
    private MessageLines messages;
    private FoundPane found;
    private BlockList blocks;
    private RawRows raw;
    private PointRows points;
    private TemplateBar bar;
    private Label counts;
    private Button take;
    private List<Curve> taken;

    /** @param name what the source is called until it is read */
    ImportDialog(Shell parent, Looks looks, String name, Supplier<CurveSource> open, ImportTemplates templates) {
        this.parent = parent;
        this.looks = looks;
        this.templates = templates;
        Display display = parent.getDisplay();
        this.session = new ImportSession(name, open, task -> {
            if (!display.isDisposed()) {
                display.asyncExec(task);
            }
        });
    }

    /**
     * Shows it until it is closed.
     *
     * @param fluid the name of the fluid that the curves would belong to
     * @return the curves; empty when nothing is to be taken
     */
    Optional<List<Curve>> open(String fluid) {
        shell = new Shell(parent, SWT.SHELL_TRIM | SWT.APPLICATION_MODAL);
        shell.setText(Messages.bind(ImportWords.Dialog_title, session.name(), fluid));
        looks.onPage(shell);
        shell.setBackgroundMode(SWT.INHERIT_FORCE);
        create();
        session.onReading(this::show);
        session.onRequest(this::enable);
        shell.addListener(SWT.Traverse, e -> {
            if (e.detail == SWT.TRAVERSE_ESCAPE) {
                e.doit = false;
                shell.close();
            }
        });
        place();
        shell.open();
        session.choose(ImportChoice.DETECT);
        try {
            Display display = shell.getDisplay();
            while (!shell.isDisposed()) {
                if (!display.readAndDispatch()) {
                    display.sleep();
                }
            }
        } finally {
            // Whatever a listener threw, the window behind it must be usable again.
            shell.dispose();
            session.close();
        }
        return Optional.ofNullable(taken);
    }

    private void place() {
        Rectangle screen = parent.getMonitor().getClientArea();
        Rectangle over = parent.getBounds();
        int width = Math.min(WIDTH, screen.width);
        int height = Math.min(HEIGHT, screen.height);
        int x = Math.clamp(over.x + (over.width - width) / 2, screen.x, Math.max(screen.x, screen.x + screen.width - width));
        int y = Math.clamp(over.y + (over.height - height) / 2, screen.y, Math.max(screen.y, screen.y + screen.height - height));
        shell.setMinimumSize(Math.min(LEAST_WIDTH, width), Math.min(LEAST_HEIGHT, height));
        shell.setBounds(x, y, width, height);
    }

    private void create() {
        GridLayout layout = new GridLayout(1, false);
        layout.marginWidth = 4 * Looks.STEP;
        layout.marginHeight = 3 * Looks.STEP;
        layout.verticalSpacing = 2 * Looks.STEP;
        shell.setLayout(layout);
        bar = new TemplateBar(shell, looks, session, templates);
        bar.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        messages = new MessageLines(shell, looks);
        messages.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        SashForm panes = looks.onPage(new SashForm(shell, SWT.HORIZONTAL | SWT.SMOOTH));
        panes.setSashWidth(2 * Looks.STEP);
        panes.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        SashForm left = looks.onPage(new SashForm(panes, SWT.VERTICAL | SWT.SMOOTH));
        left.setSashWidth(2 * Looks.STEP);
        found = new FoundPane(left, looks, session);
        blocks = new BlockList(left, looks, session);
        left.setWeights(66, 34);
        raw = new RawRows(panes, looks);
        points = new PointRows(panes, looks, session);
        raw.onSelected(points::reveal);
        points.onSelected(raw::reveal);
        panes.setWeights(SHARES);
        foot();
    }

    private void foot() {
        Composite foot = looks.area(shell);
        foot.setLayoutData(new GridData(SWT.FILL, SWT.BOTTOM, true, false));
        GridLayout layout = new GridLayout(4, false);
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        foot.setLayout(layout);
        counts = looks.quiet(foot, SWT.WRAP, "");
        GridData data = new GridData(SWT.FILL, SWT.CENTER, true, false);
        data.widthHint = LEAST_WIDTH / 2;
        counts.setLayoutData(data);
        Progress progress = new Progress(foot, looks, session);
        progress.setLayoutData(new GridData(SWT.RIGHT, SWT.CENTER, false, false));
        looks.button(foot, ImportWords.Dialog_cancel, () -> shell.close());
        take = looks.button(foot, ImportWords.Dialog_take, this::take);
        enable();
    }

    private void show() {
        if (shell.isDisposed()) {
            return;
        }
        boolean moved = messages.show(session);
        found.show();
        blocks.show();
        raw.show(session.found().map(CurveImport::rows).orElse(List.of()));
        points.show();
        counts.setText(session.found().map(f -> Looks.literal(f.counts().words())).orElse(""));
        counts.setToolTipText(session.found().map(f -> "SHA-256 " + f.source().sha256()).orElse(null));
        enable();
        shell.layout(true, moved);
    }

    private void enable() {
        if (!take.isDisposed()) {
            int count = session.found().map(f -> f.curves().size()).orElse(0);
            take.setEnabled(session.fresh() && count > 0);
            String words = count == 1 ? ImportWords.Dialog_takeOne : ImportWords.Dialog_take;
            if (!take.getText().equals(words)) {
                take.setText(words);
                take.requestLayout();
            }
        }
    }

    private void take() {
        taken = TakenCurves.of(session.found().orElseThrow());
        shell.close();
    }
}
