package stirwright.workbench.internal.importing;

import jakarta.inject.Inject;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import org.eclipse.swt.SWT;
import org.eclipse.swt.dnd.Clipboard;
import org.eclipse.swt.dnd.TextTransfer;
import org.eclipse.swt.widgets.FileDialog;
import org.eclipse.swt.widgets.Shell;
import stirwright.exchange.CurveSource;
import stirwright.exchange.ImportTemplates;
import stirwright.study.Case;
import stirwright.study.Fluid;
import stirwright.trust.UserFolder;
import stirwright.workbench.internal.app.Notice;
import stirwright.workbench.internal.app.Notices;
import stirwright.workbench.internal.flow.FluidEdits;
import stirwright.workbench.internal.session.Page;
import stirwright.workbench.internal.session.Pages;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Looks;

/** Brings flow curves in, from files or the clipboard, for the fluid of the case at hand; each source is looked at first. */
public final class CurveImports {
    private static final String NOTICE = "import";

    @Inject
    private Session session;

    @Inject
    private Pages pages;

    @Inject
    private Looks looks;

    @Inject
    private Notices notices;

    /** The folder of the last file. */
    private String folder;

    /** Asks for a file. */
    public void choose(Shell shell) {
        if (fluid().isPresent()) {
            FileDialog dialog = new FileDialog(shell, SWT.OPEN | SWT.MULTI);
            dialog.setText(ImportWords.Choose_title);
            dialog.setFilterPath(folder);
            if (dialog.open() != null) {
                folder = dialog.getFilterPath();
                files(shell, List.of(dialog.getFileNames()).stream().map(name -> Path.of(folder, name)).toList());
            }
        }
    }

    /** Shows one file after the other. */
    public void files(Shell shell, List<Path> files) {
        for (Path file : files) {
            if (!shell.isDisposed()) {
                show(shell, String.valueOf(file.getFileName()), () -> CurveSource.file(file));
            }
        }
    }

    /** Shows what the clipboard holds as text. */
    public void paste(Shell shell) {
        Clipboard clipboard = new Clipboard(shell.getDisplay());
        Object text = clipboard.getContents(TextTransfer.getInstance());
        clipboard.dispose();
        if (text instanceof String words && !words.isBlank()) {
            show(shell, ImportWords.Clipboard, () -> CurveSource.clipboard(words));
        } else {
            notices.put(new Notice(NOTICE, ImportWords.Clipboard_empty, List.of()));
        }
    }

    private void show(Shell shell, String name, Supplier<CurveSource> open) {
        fluid().ifPresent(fluid -> {
            notices.remove(NOTICE);
            ImportTemplates templates = new ImportTemplates(UserFolder.path().resolve("import-templates"));
            new ImportDialog(shell, looks, name, open, templates).open(String.valueOf(fluid.getName())).ifPresent(curves -> {
                new FluidEdits(session).take(fluid, curves);
                pages.turnTo(Page.FLOW_CURVE);
            });
        });
    }

    private Optional<Fluid> fluid() {
        Optional<Fluid> fluid = session.current().map(Case::getFluid);
        if (fluid.isEmpty()) {
            notices.put(new Notice(NOTICE, ImportWords.No_fluid, List.of()));
        }
        return fluid;
    }
}
