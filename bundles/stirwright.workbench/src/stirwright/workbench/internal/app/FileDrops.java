package stirwright.workbench.internal.app;

import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import org.eclipse.swt.dnd.DND;
import org.eclipse.swt.dnd.DropTarget;
import org.eclipse.swt.dnd.DropTargetAdapter;
import org.eclipse.swt.dnd.DropTargetEvent;
import org.eclipse.swt.dnd.FileTransfer;
import org.eclipse.swt.widgets.Shell;
import stirwright.study.StudyFiles;
import stirwright.workbench.internal.importing.CurveImports;

/** Files that are dropped on the window: a study is opened, everything else is looked at for flow curves. */
final class FileDrops {
    private final Shell shell;
    private final Documents documents;
    private final CurveImports imports;

    FileDrops(Shell shell, Documents documents, CurveImports imports) {
        this.shell = shell;
        this.documents = documents;
        this.imports = imports;
        DropTarget target = new DropTarget(shell, DND.DROP_COPY | DND.DROP_DEFAULT);
        target.setTransfer(FileTransfer.getInstance());
        target.addDropListener(new DropTargetAdapter() {
            @Override
            public void dragEnter(DropTargetEvent event) {
                // The file stays where it is.
                event.detail = DND.DROP_COPY;
            }

            @Override
            public void drop(DropTargetEvent event) {
                if (event.data instanceof String[] names) {
                    // The drop must end before a dialog opens.
                    shell.getDisplay().asyncExec(() -> take(Arrays.stream(names).map(Path::of).toList()));
                }
            }
        });
    }

    private void take(List<Path> files) {
        if (shell.isDisposed()) {
            return;
        }
        if (files.size() == 1 && StudyFiles.isNamedAsStudy(files.get(0))) {
            documents.openDropped(shell, files.get(0));
        } else {
            imports.files(shell, files);
        }
    }
}
