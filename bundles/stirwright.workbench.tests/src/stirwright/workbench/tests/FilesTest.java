package stirwright.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.eclipse.e4.ui.internal.workbench.swt.AbstractPartRenderer;
import org.eclipse.e4.ui.model.application.ui.basic.MWindow;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Shell;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import stirwright.study.StudyFiles;
import stirwright.workbench.internal.app.Documents;

/** Studies in files: saved, opened again, damaged, and never dropped without a question. */
class FilesTest {
    private static final List<String> DEMO = List.of("demo", "--window");

    @TempDir
    Path folder;

    @Test
    void whatIsSavedComesBackAsItWas() throws Exception {
        Path file = folder.resolve("tank.stir");
        byte[][] saved = new byte[1][];
        double[] power = new double[1];
        OpenWindow.use(DEMO, window -> {
            window.type("Speed, rev/min", "222");
            window.press("pitched-blade turbine");
            OpenWindow.await("the mark of a change", () -> title(window).startsWith("*"));
            assertTrue(window.on(() -> documents(window).saveTo(file)));
            OpenWindow.await("the title with the file", () -> title(window).equals("glaze slip (tank.stir) - Stirwright"));
            saved[0] = window.on(() -> StudyFiles.bytes(window.session().editor().study()));
            power[0] = window.outcome().rows().get(0).power();
        });
        assertArrayEquals(saved[0], Files.readAllBytes(file));
        OpenWindow.use(List.of("open", file.toString()), window -> {
            assertArrayEquals(saved[0], window.on(() -> StudyFiles.bytes(window.session().editor().study())));
            assertEquals(power[0], window.outcome().rows().get(0).power(), 0.0);
            assertEquals(2, window.outcome().sheets().size(), "the compared family is kept");
        });
        OpenWindow.use(List.of(), window -> assertEquals(file, window.session().file().orElseThrow(), "the study of last time"));
    }

    @Test
    void aDamagedFileIsToldAndTheDemoOpens() throws Exception {
        Path file = Files.writeString(folder.resolve("torn.stir"), "<?xml version=\"1.0\"?><study");
        OpenWindow.use(List.of("open", file.toString()), window -> {
            assertTrue(window.on(() -> !window.all(Label.class, l -> l.getText().contains("torn.stir")).isEmpty()));
            assertEquals("glaze slip", window.on(() -> window.session().editor().study().getName()));
            assertTrue(window.session().file().isEmpty(), "the damaged file would be written over");
        });
    }

    @Test
    void aFolderThatCannotBeWrittenToIsTold() throws Exception {
        OpenWindow.use(DEMO, window -> {
            Path nowhere = folder.resolve("no-such-folder").resolve("a.stir");
            assertFalse(window.on(() -> documents(window).saveTo(nowhere)));
            assertTrue(window.on(() -> !window.all(Label.class, l -> l.getText().contains("a.stir")).isEmpty()));
            assertTrue(window.session().file().isEmpty());
        });
    }

    @Test
    void closingAsksAboutChanges() throws Exception {
        OpenWindow.use(DEMO, window -> {
            window.type("Speed, rev/min", "200");
            window.display().asyncExec(window.shell()::close);
            OpenWindow.await("the question", () -> dialog(window) != null);
            window.run(() -> answer(window, "Go back"));
            OpenWindow.await("the window again", () -> dialog(window) == null);
            assertFalse(window.on(() -> window.shell().isDisposed()));
            assertEquals("200", window.on(() -> window.find(org.eclipse.swt.widgets.Text.class, "Speed, rev/min").getText()));
        });
    }

    private static Shell dialog(OpenWindow window) {
        Shell[] found = new Shell[1];
        window.display().syncExec(() -> List.of(window.display().getShells()).stream()
                .filter(s -> s.isVisible() && s.getText().equals("Unsaved changes")).findFirst().ifPresent(s -> found[0] = s));
        return found[0];
    }

    private static void answer(OpenWindow window, String verb) {
        press(dialog(window), verb);
    }

    private static void press(org.eclipse.swt.widgets.Composite composite, String verb) {
        for (var child : composite.getChildren()) {
            if (child instanceof Button button && button.getText().equals(verb)) {
                button.notifyListeners(SWT.Selection, new Event());
                return;
            }
            if (child instanceof org.eclipse.swt.widgets.Composite inner && !inner.isDisposed()) {
                press(inner, verb);
            }
            if (composite.isDisposed()) {
                return;
            }
        }
    }

    private static String title(OpenWindow window) {
        String[] title = new String[1];
        window.display().syncExec(() -> title[0] = window.shell().getText());
        return title[0];
    }

    private static Documents documents(OpenWindow window) {
        return ((MWindow) window.shell().getData(AbstractPartRenderer.OWNING_ME)).getContext().get(Documents.class);
    }
}
