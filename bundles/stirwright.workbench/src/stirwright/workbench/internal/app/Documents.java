package stirwright.workbench.internal.app;

import jakarta.inject.Inject;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.FileDialog;
import org.eclipse.swt.widgets.Shell;
import stirwright.correlation.Family;
import stirwright.study.Study;
import stirwright.study.StudyFileException;
import stirwright.study.StudyFiles;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.session.Session;

/** Opens and saves studies, and never drops one that was changed without asking. */
public final class Documents {
    private static final String[] FILTER = {"*" + StudyFiles.ENDING};
    private static final int SAVE = 0;
    private static final int DROP = 1;

    @Inject
    private Session session;

    @Inject
    private Notices notices;

    /** A new study with one blank case. */
    public void startNew(Shell shell) {
        if (mayDrop(shell)) {
            String family = session.catalogue().families().stream().map(Family::id).min(Comparator.naturalOrder()).orElse("");
            session.open(Blank.study(family), Optional.empty());
        }
    }

    public void startDemo(Shell shell) {
        if (mayDrop(shell)) {
            session.open(Opening.demo(notices).study(), Optional.empty());
        }
    }

    public void open(Shell shell) {
        FileDialog dialog = dialog(shell, SWT.OPEN);
        String chosen = dialog.open();
        if (chosen != null && mayDrop(shell)) {
            open(Path.of(chosen));
        }
    }

    /** Asks about unsaved changes first. */
    void openDropped(Shell shell, Path file) {
        if (mayDrop(shell)) {
            open(file);
        }
    }

    void open(Path file) {
        try {
            session.open(StudyFiles.read(file), Optional.of(file));
            notices.remove("file");
        } catch (StudyFileException unusable) {
            tell(unusable);
        }
    }

    /** @return whether the study is saved now */
    public boolean save(Shell shell) {
        return session.file().isPresent() ? saveTo(session.file().get()) : saveAs(shell);
    }

    /** @return whether the study is saved now */
    public boolean saveAs(Shell shell) {
        FileDialog dialog = dialog(shell, SWT.SAVE);
        dialog.setOverwrite(true);
        String chosen = dialog.open();
        if (chosen == null) {
            return false;
        }
        Path file = Path.of(chosen);
        return saveTo(StudyFiles.isNamedAsStudy(file) ? file : file.resolveSibling(file.getFileName() + StudyFiles.ENDING));
    }

    /** @return whether the study stands in the file now; else a notice says why not */
    public boolean saveTo(Path file) {
        try {
            StudyFiles.write(session.editor().study(), file);
            session.savedTo(file);
            notices.remove("file");
            return true;
        } catch (StudyFileException unwritable) {
            tell(unwritable);
            return false;
        }
    }

    private void tell(StudyFileException problem) {
        notices.put(new Notice("file", problem.getMessage(), List.of()));
    }

    private FileDialog dialog(Shell shell, int style) {
        FileDialog dialog = new FileDialog(shell, style);
        dialog.setFilterExtensions(FILTER);
        dialog.setFilterNames(new String[] {Messages.Documents_filter});
        session.file().ifPresent(f -> {
            dialog.setFilterPath(String.valueOf(f.getParent()));
            dialog.setFileName(f.getFileName().toString());
        });
        return dialog;
    }

    /** Asks about changes that are in no file yet. */
    boolean mayDrop(Shell shell) {
        if (!session.editor().isDirty()) {
            return true;
        }
        int answer = MessageDialog.open(MessageDialog.QUESTION, shell, Messages.Documents_unsaved,
                Messages.bind(Messages.Documents_unsavedQuestion, title(session.editor().study(), session.file())), SWT.SHEET,
                Messages.Documents_save, Messages.Documents_drop, Messages.Documents_back);
        return answer == SAVE ? save(shell) : answer == DROP;
    }

    /** How the study is called. */
    static String title(Study study, Optional<Path> file) {
        String name = study.getName() == null || study.getName().isBlank() ? Messages.Blank_study : study.getName();
        return file.map(f -> name + " (" + f.getFileName() + ")").orElse(name);
    }
}
