package stirwright.study;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Measured flow curves in a study: the same points come back, an edit is one step, and long curves do not slow it down. */
class CurvesTest {
    private static final int MANY = 100_000;
    /** Our choice; measured on two shared cores: 1.5 s in a fresh process, 0.4 s in a warm one. */
    private static final Duration REASONABLE = Duration.ofSeconds(10);

    @TempDir
    Path folder;

    private final Study study = Invented.study();
    private final Fluid broth = study.getFluids().get(0);

    @Test
    void aCurveIsUsedUnlessSomebodySetsItAside() {
        Curve curve = Curves.of("a", new double[] {1, 10}, new double[] {2, 5});
        assertTrue(curve.isUsed());
        broth.getCurves().add(curve);
        assertFalse(new String(StudyFiles.bytes(study), StandardCharsets.UTF_8).contains("used=\"true\""));
        assertTrue(StudyFiles.read(StudyFiles.bytes(study), "again").getFluids().get(0).getCurves().get(1).isUsed());
    }

    @Test
    void whatIsNotKnownStaysUnknown() {
        broth.getCurves().add(Curves.of("b", new double[] {1}, new double[] {2}));
        Fluid back = StudyFiles.read(StudyFiles.bytes(study), "again").getFluids().get(0);
        assertEquals(0, Curves.temperature(back.getCurves().get(0)), 0.0);
        assertTrue(Double.isNaN(Curves.temperature(back.getCurves().get(1))));
        assertEquals("fits best & \"looks\" right", back.getModelReason());
    }

    @Test
    void labelsAreOnesOfTheirOwn() {
        assertEquals("second", Curves.freeLabel(broth, "second"));
        assertEquals("first up 2", Curves.freeLabel(broth, "first up"));
        broth.getCurves().add(Curves.of("first up 2", new double[0], new double[0]));
        assertEquals("first up 3", Curves.freeLabel(broth, "first up"));
    }

    @Test
    void whatNoFileCouldHoldIsRefused() {
        assertThrows(IllegalArgumentException.class, () -> Curves.of("c", new double[] {1, 2}, new double[] {3}));
        IllegalArgumentException said = assertThrows(IllegalArgumentException.class,
                () -> Curves.of("c", new double[] {1, 2}, new double[] {3, Double.NaN}));
        assertTrue(said.getMessage().contains("curve c, point 2: 2.0 1/s and NaN Pa"), said.getMessage());
    }

    @Test
    void oneChangedPointIsOneChangedLine() {
        String before = new String(StudyFiles.bytes(study), StandardCharsets.UTF_8);
        broth.getCurves().get(0).getPoints().set(1, new MeasuredPoint(1, 3.5));
        String[] was = before.split("\n");
        String[] is = new String(StudyFiles.bytes(study), StandardCharsets.UTF_8).split("\n");
        assertEquals(was.length, is.length);
        int changed = 0;
        for (int i = 0; i < was.length; i++) {
            changed += was[i].equals(is[i]) ? 0 : 1;
        }
        assertEquals(1, changed);
    }

    @Test
    void aHundredThousandPointsAreSavedLoadedAndUndoneInReasonableTime() {
        Random random = new Random(1202);
        double[] rates = random.doubles(MANY, 1e-3, 1e3).toArray();
        double[] stresses = random.doubles(MANY, 1e-3, 1e3).toArray();
        StudyEditor editor = new StudyEditor(study);
        byte[] before = StudyFiles.bytes(study);
        long start = System.nanoTime();
        editor.edit("import", () -> broth.getCurves().add(Curves.of("long", rates, stresses)));
        editor.edit("rename", () -> broth.setName("long broth"));
        Path file = folder.resolve("long.stir");
        StudyFiles.write(study, file);
        Study back = StudyFiles.read(file);
        editor.undo();
        editor.undo();
        Duration taken = Duration.ofNanos(System.nanoTime() - start);
        Curve curve = back.getFluids().get(0).getCurves().get(1);
        assertArrayEquals(rates, Curves.rates(curve));
        assertArrayEquals(stresses, Curves.stresses(curve));
        assertArrayEquals(before, StudyFiles.bytes(study));
        assertTrue(taken.compareTo(REASONABLE) < 0, () -> "it took " + taken);
        System.out.println("100,000 points edited, saved, loaded, undone in " + taken.toMillis() + " ms, "
                + file.toFile().length() / 1024 + " KiB");
    }

    @Test
    void aStudyOfBeforeLoads() throws Exception {
        Path old = Files.writeString(folder.resolve("old.stir"), """
                <?xml version="1.0" encoding="UTF-8"?>
                <study:Study xmi:version="2.0" xmlns:xmi="http://www.omg.org/XMI" xmlns:study="stirwright:study" format="1" name="old">
                  <fluids xmi:id="fluid-1" name="syrup" model="newtonian">
                    <amounts column="viscosity_Pa_s" value="1.2"/>
                  </fluids>
                </study:Study>
                """);
        Study study = StudyFiles.read(old);
        assertEquals(0, study.getFluids().get(0).getCurves().size());
        assertArrayEquals(Files.readAllBytes(old), StudyFiles.bytes(study), "it is written as it was");
    }
}
