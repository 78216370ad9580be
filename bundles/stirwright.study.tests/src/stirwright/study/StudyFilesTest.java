package stirwright.study;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What is written is read again, to the last bit, and nothing is lost when writing fails. */
class StudyFilesTest {
    @TempDir
    Path folder;

    private Study roundTrip(Study study) {
        Path file = folder.resolve("a.stir");
        StudyFiles.write(study, file);
        return StudyFiles.read(file);
    }

    @Test
    void everythingComesBack() {
        Study study = Invented.study();
        Study back = roundTrip(study);
        assertEquals(study.getNotes(), back.getNotes());
        assertEquals(StudyFiles.FORMAT, back.getFormat());
        back.eUnset(StudyPackage.eINSTANCE.getStudy_Format());
        assertTrue(EcoreUtil.equals(study, back));
        Case one = back.getCases().get(0);
        assertSame(back.getFluids().get(0), one.getFluid());
        assertSame(back.getVessels().get(0), one.getVessel());
        assertSame(back.getImpellers().get(0), one.getImpeller());
        assertEquals(0, Amounts.get(back.getVessels().get(0).getAmounts(), "baffle_count").orElseThrow());
    }

    @Test
    void readsWellAndIsTheSameEveryTime() {
        String text = new String(StudyFiles.bytes(Invented.study()), StandardCharsets.UTF_8);
        assertArrayEquals(StudyFiles.bytes(Invented.study()), StudyFiles.bytes(Invented.study()));
        assertArrayEquals(text.getBytes(StandardCharsets.UTF_8), StudyFiles.bytes(roundTrip(Invented.study())));
        for (String part : List.of("<?xml version=\"1.0\" encoding=\"UTF-8\"?>", " format=\"1\"", "<notes>Everything is invented.\n",
                "<amounts column=\"density_kg_m3\" value=\"1035\"/>", "value=\"0.30000000000000004\"",
                "<amounts column=\"baffle_count\" value=\"0\"/>", "fluid=\"fluid-1\"", "<compared>propeller</compared>",
                "<leftOut>clearance</leftOut>",
                "<points>0.1 0.30000000000000004</points>\n", "<points>1 3</points>\n", "<points>1e-7 0</points>\n", " used=\"false\"",
                " temperature=\"0\"",
                "<constants correlation=\"blades.np.narrow\" name=\"a\" value=\"0.30000000000000004\"/>")) {
            assertTrue(text.contains(part), () -> part + " is not in\n" + text);
        }
    }

    @Test
    void writingLeavesTheStudyAlone() {
        Study study = Invented.study();
        StudyFiles.bytes(study);
        assertTrue(EcoreUtil.equals(Invented.study(), study));
        assertEquals(null, study.eResource());
        assertEquals(0, study.getFormat());
    }

    @Test
    void anyDoubleAndAnyTextComeBack() {
        Random random = new Random(20260);
        for (int i = 0; i < 150; i++) {
            Study study = Invented.study();
            double value = Double.longBitsToDouble(random.nextLong());
            if (Double.isFinite(value)) {
                Amounts.set(study.getFluids().get(0).getAmounts(), "density_kg_m3", value);
            }
            String text = text(random);
            study.setNotes(text);
            study.getFluids().get(0).setName(text);
            study.getCases().get(0).getCompared().set(0, text);
            Study back = roundTrip(study);
            back.eUnset(StudyPackage.eINSTANCE.getStudy_Format());
            assertTrue(EcoreUtil.equals(study, back), () -> value + " " + text.codePoints().boxed().toList() + "\n"
                    + new String(StudyFiles.bytes(study), StandardCharsets.UTF_8));
        }
    }

    /** Letters, marks of XML, white space of every kind, and characters beyond the first plane. */
    private static String text(Random random) {
        List<String> signs = List.of("a", "ß", "<", ">", "&", "\"", "'", " ", "\n", "\r", "\t", "]]>", "\u0085", "\u2028", "😀", "&#10;");
        StringBuilder text = new StringBuilder();
        for (int i = random.nextInt(12); i > 0; i--) {
            text.append(signs.get(random.nextInt(signs.size())));
        }
        return text.toString();
    }

    @Test
    void whatNoFileCanHoldIsSaidAndTheOldFileStays() throws IOException {
        Path file = folder.resolve("kept.stir");
        Study study = Invented.study();
        StudyFiles.write(study, file);
        byte[] before = Files.readAllBytes(file);
        study.getFluids().get(0).setName("bro\u0001th");
        refused(study, file, "kept.stir", "name of fluid 'bro", "U+0001", "delete");
        study.getFluids().get(0).setName("half \uD83D");
        refused(study, file, "U+D83D");
        study.getFluids().get(0).setName("broth");
        study.getFluids().get(0).getAmounts().get(0).setValue(Double.NaN);
        refused(study, file, "amount 'density_kg_m3' of fluid 'broth'", "NaN");
        study.getFluids().get(0).getAmounts().get(0).setValue(1000);
        OwnConstants.set(study.getCases().get(0), "invented.np.a", "k", 2);
        study.getCases().get(0).getConstants().getLast().setValue(Double.POSITIVE_INFINITY);
        refused(study, file, "constant 'k' of 'invented.np.a' in case 'simmer'", "Infinity");
        study.getCases().get(0).getConstants().clear();
        study.getFluids().get(0).getCurves().get(0).getPoints().add(new MeasuredPoint(1, Double.NaN));
        refused(study, file, "curve 'first up' of fluid 'broth'", "1.0 1/s, NaN Pa");
        study.getFluids().get(0).getCurves().clear();
        study.getFluids().remove(0);
        refused(study, file, "case 'simmer'", "fluid 'broth'", "not in the study");
        assertArrayEquals(before, Files.readAllBytes(file));
        try (Stream<Path> files = Files.list(folder)) {
            assertEquals(List.of(file), files.toList(), "nothing is left beside it");
        }
    }

    @Test
    void placesWhereNothingCanBeWritten() throws IOException {
        refused(Invented.study(), folder, "folder");
        refused(Invented.study(), folder.resolve("none").resolve("a.stir"), "none", "does not exist");
        Path blocked = Files.createDirectory(folder.resolve("a.stir"));
        Files.createFile(blocked.resolve("inside"));
        refused(Invented.study(), blocked, "a.stir", "folder");
        assertTrue(Files.exists(blocked.resolve("inside")));
    }

    private static void refused(Study study, Path file, String... parts) {
        StudyFileException said = assertThrows(StudyFileException.class, () -> StudyFiles.write(study, file));
        for (String part : parts) {
            assertTrue(said.getMessage().contains(part), () -> part + " is not in: " + said.getMessage());
        }
        assertEquals(file + ": " + said.problem(), said.getMessage());
    }

    @Test
    void whoMayReadTheOldFileMayReadTheNewOne() throws IOException {
        Path file = folder.resolve("mine.stir");
        StudyFiles.write(Invented.study(), file);
        for (String rights : List.of("rw-------", "rw-rw-rw-")) {
            Files.setPosixFilePermissions(file, PosixFilePermissions.fromString(rights));
            StudyFiles.write(Invented.study(), file);
            assertEquals(rights, PosixFilePermissions.toString(Files.getPosixFilePermissions(file)));
        }
    }

    @Test
    void aLinkToWhatIsNotThereYetStaysALink() throws IOException {
        Files.createDirectory(folder.resolve("far"));
        Path link = Files.createSymbolicLink(folder.resolve("link.stir"), Path.of("far", "new.stir"));
        StudyFiles.write(Invented.study(), link);
        assertTrue(Files.isSymbolicLink(link));
        assertEquals(Invented.study().getName(), StudyFiles.read(folder.resolve("far/new.stir")).getName());
        Path circle = Files.createSymbolicLink(folder.resolve("circle.stir"), Path.of("circle.stir"));
        refused(Invented.study(), circle, "links lead nowhere");
    }

    @Test
    void aLinkStaysALink() throws IOException {
        Path real = folder.resolve("real.stir");
        StudyFiles.write(Invented.study(), real);
        Path link = Files.createSymbolicLink(folder.resolve("link.stir"), real);
        Study changed = Invented.study();
        changed.setName("changed");
        StudyFiles.write(changed, link);
        assertTrue(Files.isSymbolicLink(link));
        assertEquals("changed", StudyFiles.read(real).getName());
    }
}
