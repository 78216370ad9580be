package stirwright.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.util.HexFormat;
import java.util.List;
import java.util.Locale;
import org.eclipse.swt.dnd.Clipboard;
import org.eclipse.swt.dnd.TextTransfer;
import org.eclipse.swt.dnd.Transfer;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Table;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import stirwright.study.Curve;
import stirwright.study.Curves;
import stirwright.study.StudyFiles;
import stirwright.workbench.internal.flow.FlowSheet;
import stirwright.workbench.internal.importing.CurveImports;
import stirwright.workbench.internal.session.Page;
import stirwright.workbench.internal.session.Pages;

/** Flow curves by dialog and by paste: seen first, overruled, taken in one step, undone; the source stays as it was. */
class ImportTest {
    private static final List<String> DEMO = List.of("demo", "--window");
    private static final int POINTS = 12;

    @TempDir
    Path folder;

    /** Invented: a pre-shear, an up ramp and a down ramp, decimal commas, viscosity in mPa s, one stress below 0. */
    static String rheometer() {
        StringBuilder text = new StringBuilder("Invented measurement;;;;\n\n");
        block(text, "1: pre-shear", i -> 50, 6);
        block(text, "2: ramp up", i -> 0.1 * Math.pow(10, i / 3.0), POINTS);
        block(text, "3: ramp down", i -> 0.1 * Math.pow(10, (POINTS - 1 - i) / 3.0), POINTS);
        return text.toString();
    }

    private static void block(StringBuilder text, String name, java.util.function.IntToDoubleFunction rate, int points) {
        text.append("Interval;").append(name).append(";;;\nPoint No.;Shear Rate;Shear Stress;Viscosity;Temperature\n;[1/s];[Pa];[mPa·s];[°C]\n");
        for (int i = 0; i < points; i++) {
            double g = rate.applyAsDouble(i);
            double stress = name.contains("up") && i == 0 ? -0.2 : 8 + 2.5 * Math.pow(g, 0.5);
            text.append(String.format(Locale.GERMAN, "%d;%.4f;%.4f;%.2f;%.2f\n", i + 1, g, stress, 1000 * stress / g, 25.0));
        }
        text.append("\n");
    }

    private Path file(String name) throws Exception {
        return Files.write(folder.resolve(name), rheometer().getBytes(StandardCharsets.ISO_8859_1));
    }

    static ImportWindow open(OpenWindow window, Path file) throws Exception {
        window.display().asyncExec(() -> FlowPageTest.of(window, CurveImports.class).files(window.shell(), List.of(file)));
        return ImportWindow.await(window);
    }

    @Test
    void nothingIsTakenBeforeItIsAskedFor() throws Exception {
        Path file = file("broth.csv");
        byte[] bytes = Files.readAllBytes(file);
        OpenWindow.use(DEMO, window -> {
            byte[] before = window.on(() -> StudyFiles.bytes(window.session().editor().study()));
            ImportWindow dialog = open(window, file);
            dialog.press("Cancel");
            dialog.awaitEnd();
            assertArrayEquals(before, window.on(() -> StudyFiles.bytes(window.session().editor().study())));
            assertFalse(window.on(() -> window.session().editor().canUndo()));
        });
        assertArrayEquals(bytes, Files.readAllBytes(file), "the source is only read");
    }

    @Test
    void takenCurvesAreOneStepWithAllThatSaysWhereTheyComeFrom() throws Exception {
        Path file = file("broth.csv");
        OpenWindow.use(DEMO, window -> {
            ImportWindow dialog = open(window, file);
            dialog.press("Take these curves");
            dialog.awaitEnd();
            assertEquals(Page.FLOW_CURVE, window.on(() -> FlowPageTest.of(window, Pages.class).current()));
            FlowSheet sheet = FlowPageTest.settle(window);
            assertEquals(2, sheet.curves().size(), "the pre-shear is no curve");
            Curve up = window.on(() -> FlowPageTest.fluid(window).getCurves().get(0));
            Curve down = window.on(() -> FlowPageTest.fluid(window).getCurves().get(1));
            assertEquals("up", up.getRamp());
            assertEquals("down", down.getRamp());
            assertEquals("broth.csv", up.getSource());
            String hash = HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(Files.readAllBytes(file)));
            assertEquals(hash, up.getSha256());
            assertEquals(25, Curves.temperature(up), 1e-9);
            assertEquals(POINTS - 1, up.getPoints().size(), "the point with a stress below 0 is not taken");
            assertEquals(1, up.getDropped().size());
            assertTrue(up.getDropped().get(0).contains("line 16"), up.getDropped().get(0));
            assertEquals(8 + 2.5 * Math.sqrt(0.1), Curves.stresses(down)[0], 1e-4);
            window.run(() -> window.session().undo());
            assertEquals(0, window.on(() -> FlowPageTest.fluid(window).getCurves().size()), "one step");
            window.run(() -> window.session().redo());
            assertEquals(2, window.on(() -> FlowPageTest.fluid(window).getCurves().size()));
        });
    }

    @Test
    void whatWasDetectedCanBeOverruledAndKept() throws Exception {
        Path file = file("broth.csv");
        OpenWindow.use(DEMO, window -> {
            ImportWindow dialog = open(window, file);
            double stress = dialog.number("points; a check mark takes one", 8, 3);
            dialog.choose("unit of Shear Stress", "kPa");
            assertEquals(1000 * stress, dialog.number("points; a check mark takes one", 8, 3), 1e-3 * stress);
            dialog.type("name of a template", "stress in kPa");
            dialog.press("Save");
            dialog.press("Detect anew");
            assertEquals(stress, dialog.number("points; a check mark takes one", 8, 3), 1e-9);
            dialog.press("Apply");
            assertEquals(1000 * stress, dialog.number("points; a check mark takes one", 8, 3), 1e-3 * stress);
            dialog.press("Cancel");
            dialog.awaitEnd();
            ImportWindow other = open(window, file("other.csv"));
            assertEquals(List.of("stress in kPa"), window.on(() -> List.of(other.find(Combo.class, "name of a template").getItems())));
            other.choose("name of a template", "stress in kPa");
            other.press("Remove");
            assertEquals(List.of(), window.on(() -> List.of(other.find(Combo.class, "name of a template").getItems())));
            other.press("Cancel");
            other.awaitEnd();
        });
    }

    @Test
    void blocksAndPointsAreTakenByTheirCheckMarks() throws Exception {
        Path file = file("broth.csv");
        OpenWindow.use(DEMO, window -> {
            ImportWindow dialog = open(window, file);
            dialog.check("blocks; a check mark takes one as a curve", 2, false);
            dialog.check("points; a check mark takes one", 8, false);
            dialog.check("points; a check mark takes one", 9, false);
            assertFalse(dialog.checked("points; a check mark takes one", 9));
            dialog.check("points; a check mark takes one", 9, true);
            assertTrue(dialog.checked("points; a check mark takes one", 9), "it is put back");
            dialog.check("points; a check mark takes one", 6, true);
            assertFalse(dialog.checked("points; a check mark takes one", 6), "a stress below 0 is no point");
            dialog.press("Take this curve");
            dialog.awaitEnd();
            FlowPageTest.settle(window);
            assertEquals(1, window.on(() -> FlowPageTest.fluid(window).getCurves().size()));
            Curve up = window.on(() -> FlowPageTest.fluid(window).getCurves().get(0));
            assertEquals(POINTS - 2, up.getPoints().size());
            assertEquals(2, up.getDropped().size());
        });
    }

    @Test
    void cellsArePasted() throws Exception {
        OpenWindow.use(DEMO, window -> {
            window.run(() -> {
                Clipboard clipboard = new Clipboard(window.display());
                clipboard.setContents(new Object[] {"shear rate (1/s)\tshear stress (Pa)\n0.1\t9\n1\t11\n10\t16\n100\t33\n"},
                        new Transfer[] {TextTransfer.getInstance()});
                clipboard.dispose();
            });
            window.display().asyncExec(() -> FlowPageTest.of(window, CurveImports.class).paste(window.shell()));
            ImportWindow dialog = ImportWindow.await(window);
            dialog.press("Take this curve");
            dialog.awaitEnd();
            FlowPageTest.settle(window);
            Curve curve = window.on(() -> FlowPageTest.fluid(window).getCurves().get(0));
            assertArrayEquals(new double[] {9, 11, 16, 33}, Curves.stresses(curve), 1e-12);
            assertEquals("clipboard", curve.getSource());
        });
    }

    @Test
    void aFileWithoutAnythingToShowIsTold() throws Exception {
        Path file = Files.createFile(folder.resolve("nothing.csv"));
        OpenWindow.use(DEMO, window -> {
            ImportWindow dialog = open(window, file);
            String words = dialog.words("what to look at before taking anything");
            assertTrue(words.contains("nothing.csv"), words);
            assertFalse(dialog.canPress("Take these curves"));
            dialog.press("Cancel");
            dialog.awaitEnd();
        });
    }

    @Test
    void everyColumnHasItsPlace() throws Exception {
        Path file = file("broth.csv");
        OpenWindow.use(DEMO, window -> {
            ImportWindow dialog = open(window, file);
            Table points = window.on(() -> dialog.find(Table.class, "points; a check mark takes one"));
            assertEquals(6 + 2 * POINTS, window.on(points::getItemCount));
            dialog.press("Cancel");
            dialog.awaitEnd();
        });
    }
}
