package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import stirwright.core.Arrival;
import stirwright.core.CaseResult;
import stirwright.core.Catalogue;
import stirwright.core.CrossCheck;
import stirwright.family.discturbine.DiscTurbine;
import stirwright.family.pitchedblade.PitchedBlade;
import stirwright.general.GeneralRelations;
import stirwright.study.Study;
import stirwright.study.StudyFiles;

/** The demo's study and its table are the same cases in two forms. */
class DemoTest {
    private static final Catalogue CATALOGUE = Catalogue.of(List.of(
            Arrival.of(new DiscTurbine(), "stirwright.family.discturbine 1"),
            Arrival.of(new PitchedBlade(), "stirwright.family.pitchedblade 1"),
            Arrival.of(new GeneralRelations(), "stirwright.general 1")));

    @TempDir
    Path folder;

    private static List<CaseResult> results(Path file) {
        CrossCheck crossCheck = new CrossCheck(CATALOGUE);
        return CaseTable.read(file, CATALOGUE).entries().stream().map(e -> e.check(crossCheck)).toList();
    }

    private static String written(Path file) {
        StringWriter text = new StringWriter();
        ResultTable.write(results(file), text);
        CandidateTable.write(results(file), text);
        return text.toString();
    }

    @Test
    void tableAndStudyGiveTheSameToTheLastBit() {
        Path study = Demo.copyTo(folder);
        String ofTable = written(folder.resolve(Demo.TABLE));
        assertTrue(ofTable.lines().filter(l -> l.startsWith("hold-pitched,")).count() > 10, ofTable);
        assertEquals(ofTable, written(study));
    }

    @Test
    void theStudyWithoutAFileIsTheOneInTheFile() throws IOException {
        assertEquals(Files.readString(Demo.copyTo(folder)), new String(StudyFiles.bytes(Demo.study()), "UTF-8"));
    }

    @Test
    void theStudySaysThatItIsInvented() {
        Study study = StudyFiles.read(Demo.copyTo(folder));
        assertTrue(study.getNotes().contains("every number invented"), study.getNotes());
    }

    @Test
    void theStudyIsAsTheProgramWritesIt() throws IOException {
        Path study = Demo.copyTo(folder);
        assertEquals(Files.readString(study), new String(StudyFiles.bytes(StudyFiles.read(study)), "UTF-8"));
    }

    @Test
    void whatSomebodyChangedIsSetAside() throws IOException {
        Path study = Demo.copyTo(folder.resolve("made").resolve("here"));
        Demo.copyTo(study.getParent());
        try (Stream<Path> files = Files.list(study.getParent())) {
            assertEquals(2, files.count(), "a copy of what is there changes nothing");
        }
        Files.writeString(study, "mine");
        Demo.copyTo(study.getParent());
        assertEquals("mine", Files.readString(study.resolveSibling("before-" + Demo.STUDY)));
        assertEquals("glaze slip", StudyFiles.read(study).getName());
        Path blocked = Files.writeString(folder.resolve("file"), "");
        assertTrue(assertThrows(UnusableFileException.class, () -> Demo.copyTo(blocked)).getMessage().contains("file"));
    }
}
