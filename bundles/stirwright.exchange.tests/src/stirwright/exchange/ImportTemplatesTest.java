package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static stirwright.exchange.Refusals.assertUnusable;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Choices kept by name come back as they were. */
class ImportTemplatesTest {
    private static final ImportChoice FULL = ImportChoice.DETECT
            .withEncoding(Optional.of("IBM850")).withSeparator(Optional.of(CurveSeparator.SPACES)).withDecimalSign(Optional.of(DecimalSign.COMMA))
            .withSheets(List.of("up | down", "= 2"))
            .with(new ColumnChoice("up | down", 3, Optional.of(CurveQuantity.SHEAR_STRESS), "dyn/cm2"))
            .with(new ColumnChoice("", 4, Optional.empty(), ""))
            .with(new BlockChoice(1, Optional.of(BlockUse.PRE_SHEAR), Optional.empty()))
            .with(new BlockChoice(2, Optional.empty(), Optional.of(true)));

    @TempDir
    Path folder;

    @Test
    void keptListedReadAndRemoved() {
        ImportTemplates templates = new ImportTemplates(folder.resolve("templates"));
        assertEquals(List.of(), templates.list());
        templates.save("Labor K\u00F6ln 2", FULL.leavingOut(new PointPlace("", 3, 1)));
        templates.save("a", ImportChoice.DETECT);
        assertEquals(List.of("Labor K\u00F6ln 2", "a"), templates.list());
        assertEquals(FULL, templates.load("Labor K\u00F6ln 2"));
        assertEquals(ImportChoice.DETECT, templates.load("a"));
        templates.save("a", FULL);
        assertEquals(FULL, templates.load("a"));
        templates.remove("a");
        templates.remove("a");
        assertEquals(List.of("Labor K\u00F6ln 2"), templates.list());
        assertUnusable(() -> templates.load("a"), "a", "no such template");
    }

    @ParameterizedTest
    @ValueSource(strings = {"", " ", "../up", "a/b", "a\\b", "con:", "trailing ", "a\nb"})
    void namesThatAreNoFileNames(String name) {
        assertUnusable(() -> new ImportTemplates(folder).save(name, FULL), "a name has letters");
    }

    @ParameterizedTest
    @ValueSource(strings = {"colour = red", "column = x|shear-rate||", "column = 1|shear-rat||", "column = 1", "block = 1|up|perhaps",
        "separator = dash", "block = 0|up|taken", "nothing"})
    void linesThatCannotBeRead(String line) throws IOException {
        Files.writeString(folder.resolve("t.import"), "# by hand\n\nencoding = UTF-8\n" + line + "\n");
        assertUnusable(() -> new ImportTemplates(folder).load("t"), "t.import", "line 4", line);
    }

    @Test
    void aTemplateReadsTheNextFile() {
        ImportTemplates templates = new ImportTemplates(folder);
        templates.save("swapped", ImportChoice.DETECT
                .with(new ColumnChoice("", 1, Optional.of(CurveQuantity.SHEAR_STRESS), "kPa"))
                .with(new ColumnChoice("", 2, Optional.of(CurveQuantity.SHEAR_RATE), "")));
        CurveImport read = CurveImport.of(CurveSource.clipboard("x;y\n0.5;1\n0.7;10\n0.9;100\n"), templates.load("swapped"));
        assertEquals(500, read.requireCurves().get(0).points().stress(0));
        assertEquals(100, read.curves().get(0).points().shearRate(2));
    }

    private static List<String> warnings(ImportChoice choice) {
        return CurveImport.of(CurveSource.clipboard("rate;stress;x\n1;2;5\n10;3;5\n20;4;5\n50;5;5\n80;6;5\n100;7;5\n"), choice)
                .requireCurves().get(0).measurement().warnings();
    }

    @Test
    void whatFindsNothingIsNamedInEachCurve() {
        assertEquals(List.of(), warnings(ImportChoice.DETECT));
        assertNamed(ImportChoice.DETECT.with(new ColumnChoice("", 9, Optional.of(CurveQuantity.TIME), "s")), "column 9", "time", "3 cells");
        assertNamed(ImportChoice.DETECT.with(new ColumnChoice("", 3, Optional.of(CurveQuantity.VISCOSITY), "furlong")), "column 3", "'furlong'");
        assertNamed(ImportChoice.DETECT.with(new ColumnChoice("up", 1, Optional.of(CurveQuantity.TIME), "s")), "column 1", "'up'", "no sheets");
        assertNamed(ImportChoice.DETECT.with(new BlockChoice(7, Optional.empty(), Optional.of(true))), "block 7", "1 block");
        assertNamed(ImportChoice.DETECT.withSheets(List.of("Blatt")), "'Blatt'", "no sheets");
        assertEquals(List.of(), warnings(ImportChoice.DETECT.with(new ColumnChoice("", 3, Optional.of(CurveQuantity.TORQUE), "%"))
                .with(new BlockChoice(1, Optional.empty(), Optional.of(true)))));
    }

    private static void assertNamed(ImportChoice choice, String... words) {
        List<String> warnings = warnings(choice);
        assertEquals(1, warnings.size(), warnings.toString());
        for (String word : words) {
            assertTrue(warnings.get(0).contains(word), warnings.toString());
        }
    }
}
