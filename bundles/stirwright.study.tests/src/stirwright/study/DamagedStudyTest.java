package stirwright.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A file that is no study, a damaged one, one from later, one that reaches out: one sentence each. */
class DamagedStudyTest {
    @TempDir
    Path folder;

    private static String good() {
        return new String(StudyFiles.bytes(Invented.study()), StandardCharsets.UTF_8);
    }

    /** The line on which a part of the good study stands. */
    private static String line(String part) {
        String before = good().substring(0, good().indexOf(part));
        return "line " + (1 + before.chars().filter(c -> c == '\n').count()) + " ";
    }

    private static String with(String old, String replacement) {
        assertTrue(good().contains(old), () -> old + " is not in\n" + good());
        return good().replace(old, replacement);
    }

    private String refused(String text, String... parts) throws IOException {
        Path file = Files.write(folder.resolve("a.stir"), text.getBytes(StandardCharsets.UTF_8));
        StudyFileException said = assertThrows(StudyFileException.class, () -> StudyFiles.read(file));
        assertTrue(said.getMessage().startsWith(file + ": "), said.getMessage());
        assertEquals(1, said.getMessage().lines().count(), said.getMessage());
        for (String part : parts) {
            assertTrue(said.getMessage().contains(part), () -> part + " is not in: " + said.getMessage());
        }
        return said.getMessage();
    }

    @Test
    void noStudyAtAll() throws IOException {
        refused("", "not a study");
        refused("case,family\na,b\n", "not a study");
        refused("PK\u0003\u0004", "not a study");
        refused("<?xml version=\"1.0\"?>\n<html><body/></html>", "not a study");
        refused("<ecore:EPackage xmlns:ecore=\"http://www.eclipse.org/emf/2002/Ecore\" name=\"x\"/>", "not a study");
    }

    @Test
    void damagedXml() throws IOException {
        refused(with("</fluids>", "</fluid>"), line("</fluids>"), "damaged", "copy");
        refused(good().substring(0, good().indexOf("<cases")), "damaged", "copy");
        refused(with("value=\"1035\"", "value=\"1035"), "damaged", "line ");
    }

    @Test
    void writtenByANewerVersion() throws IOException {
        refused(with(" format=\"1\"", " format=\"2\""), "format 2", "newer");
        refused(with(" format=\"1\"", " format=\"2\" shine=\"yes\""), "format 2", "newer");
        refused(with("model=\"power-law\"", "model=\"power-law\" shine=\"yes\""), line("model="), "'shine'", "newer");
        refused(with("<cases ", "<shelves name=\"x\"/>\n  <cases "), line("<cases "), "'shelves'", "newer");
        refused(with(" format=\"1\"", ""), "format");
    }

    @Test
    void wrongValues() throws IOException {
        for (String value : new String[] {"much", "NaN", "Infinity", "1d", "0x1p3", "1,5", "1e999", "1e-400", "-0.1e-400", ""}) {
            refused(with("value=\"1035\"", "value=\"" + value + "\""), line("value=\"1035\""), "'" + value + "' as value", "number");
        }
    }

    @Test
    void wrongPoints() throws IOException {
        for (String point : new String[] {"1", "1 2 3", "1 NaN", "1,5 2", "one two", ""}) {
            refused(with("<points>1 3<", "<points>" + point + "<"), line("<points>1 3<"), "'" + point + "' as points", "0.25 3.1");
        }
        refused(with("used=\"false\"", "used=\"no\""), line("used="), "'no' as used", "true or false");
        refused(with("replicate=\"1\"", "replicate=\"one\""), line("replicate="), "'one' as replicate", "number");
    }

    @Test
    void danglingReferences() throws IOException {
        refused(with("fluid=\"fluid-1\"", "fluid=\"fluid-7\""), "fluid-7", "not in the study", "line ");
        refused(with("fluid=\"fluid-1\"", "fluid=\"vessel-1\""), "vessel 'kettle' as fluid", "a fluid belongs");
        refused(with("impeller=\"impeller-1\"", "impeller=\"vessel-1\""), "an impeller belongs");
        refused(with("<vessels ", "<fluids xmi:id=\"fluid-1\" name=\"twin\"/>\n  <vessels "), "fluid 'twin'", "'fluid-1'", "another");
    }

    @Test
    void nothingIsDroppedWithoutAWord() throws IOException {
        refused(with("<demand", "<demand column=\"speed_rev_s\" value=\"2\"/>\n    <demand"), "second value for demand", "delete");
        refused(with("<notes>", "<notes>one</notes>\n  <notes>"), "second value for notes");
        refused(with("<notes>", "<name>twice</name>\n  <notes>"), "second value for name");
        refused(with("fluid=\"fluid-1\"", "fluid=\"fluid-1 fluid-1\""), line("fluid=\"fluid-1\""), "as fluid", "name one");
        refused(with("<cases ", "<xmi:Extension extender=\"x\"><a/></xmi:Extension>\n  <cases "), line("<cases "), "Extension", "lost");
        refused(with("<cases ", "hear, hear\n  <cases "), "'hear, hear'", "lost");
        refused(with("<demand", "two rev/s<demand"), "'two rev/s' in 'cases'");
    }

    @Test
    void commentsAndOtherFormsOfTheSameAreRead() throws IOException {
        String text = with("<notes>", "<!-- mine --><notes>").replaceFirst(" name=\"[^\"]*\"(?=[^>]*>\\s*<!-- mine)", "")
                .replace("<!-- mine -->", "<!-- mine --><name>as an element</name>");
        Study read = StudyFiles.read(text.getBytes(StandardCharsets.UTF_8), "a study");
        assertEquals("as an element", read.getName());
        assertEquals("a study: is not a study; name one, a file that Stirwright saved",
                assertThrows(StudyFileException.class, () -> StudyFiles.read(new byte[0], "a study")).getMessage());
    }

    @Test
    void unreadable() {
        Path missing = folder.resolve("missing.stir");
        assertTrue(assertThrows(StudyFileException.class, () -> StudyFiles.read(missing)).getMessage().contains("no such file"));
        assertTrue(assertThrows(StudyFileException.class, () -> StudyFiles.read(folder)).getMessage().contains("folder"));
    }

    @Test
    void noDocumentTypeIsRead() throws IOException {
        Path secret = Files.writeString(folder.resolve("secret.txt"), "hush");
        String entity = with("?>", "?>\n<!DOCTYPE x [<!ENTITY e SYSTEM \"" + secret.toUri() + "\">]>")
                .replace("Everything is invented.", "&e;");
        assertFalse(refused(entity, "line 2 ", "document type").contains("hush"));
        refused(with("?>", "?>\n<!DOCTYPE x SYSTEM \"" + folder.resolve("none.dtd").toUri() + "\">"), "document type");
        refused(with("?>", "?>\n<!DOCTYPE x [<!ENTITY a \"aaaa\"><!ENTITY b \"&a;&a;&a;\">]>"), "document type");
    }

    @Test
    void otherFilesAreNeitherReadNorMissed() throws IOException {
        Path other = folder.resolve("other.stir");
        StudyFiles.write(Invented.study(), other);
        refused(with(" fluid=\"fluid-1\"", "").replace("<demand", "<fluid href=\"" + other.toUri() + "#fluid-1\"/>\n    <demand"), "fluid");
        refused(with("<cases ", "<fluids href=\"" + other.toUri() + "#fluid-1\"/>\n  <cases "), "another file");
        Path schema = Files.writeString(folder.resolve("model.ecore"), "hush");
        refused(with(" format=\"1\"", " xmlns:odd=\"odd:odd\" xmlns:xsi=\"http://www.w3.org/2001/XMLSchema-instance\""
                + " xsi:schemaLocation=\"odd:odd " + schema.toUri() + "\" format=\"1\" odd:x=\"1\""), "line ");
    }

    @Test
    void anyDamageIsOneSentence() throws IOException {
        Random random = new Random(4711);
        byte[] bytes = StudyFiles.bytes(Invented.study());
        Path file = folder.resolve("b.stir");
        int refusals = 0;
        for (int i = 0; i < 600; i++) {
            byte[] bent = bytes.clone();
            for (int n = random.nextInt(3); n >= 0; n--) {
                int from = random.nextInt(bent.length);
                int to = random.nextInt(bent.length);
                System.arraycopy(bytes, from, bent, to, Math.min(random.nextInt(20), bent.length - Math.max(from, to)));
            }
            Files.write(file, bent);
            try {
                StudyFiles.bytes(StudyFiles.read(file));
            } catch (StudyFileException said) {
                assertEquals(1, said.getMessage().lines().count(), said.getMessage());
                refusals++;
            }
        }
        assertTrue(refusals > 50 && refusals < 600, "refused " + refusals);
    }
}
