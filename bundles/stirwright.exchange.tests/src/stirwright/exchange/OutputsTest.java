package stirwright.exchange;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static stirwright.exchange.Refusals.assertUnusable;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import stirwright.core.Arrival;
import stirwright.core.CaseResult;
import stirwright.core.Catalogue;
import stirwright.core.Refusal;
import stirwright.correlation.Citation;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

class OutputsTest {
    private static final CaseResult RESULT = CaseResult.refused("A", "x", new Refusal("family", "x", "is not installed"));

    @TempDir
    Path folder;

    private Path input;
    private Outputs outputs;

    @BeforeEach
    void input() throws IOException {
        input = Files.writeString(folder.resolve("in.csv"), "input");
        outputs = new Outputs(new Origin("1", "in.csv"), List.of(input));
    }

    private List<String> files() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(f -> f.getFileName().toString()).sorted().toList();
        }
    }

    private void write(Path file) {
        try (Output<CaseResult> out = outputs.results(file)) {
            out.add(RESULT);
            out.finish();
        }
    }

    @Test
    void endingSettlesTheFormat() throws IOException {
        write(folder.resolve("r.csv"));
        write(folder.resolve("r.JSON"));
        byte[] csv = Files.readAllBytes(folder.resolve("r.csv"));
        assertEquals('c', csv[0]);
        assertTrue(new String(csv, UTF_8).contains("family x is not installed"));
        assertEquals("1", Json.object(Files.readString(folder.resolve("r.JSON"))).get("stirwright"));
        assertEquals(List.of("in.csv", "r.JSON", "r.csv"), files());
    }

    @Test
    void otherEndingsNameThoseThatWork() {
        for (String name : List.of("r.xlsx", "r", "csv", "r.csv.gz")) {
            assertUnusable(() -> outputs.results(folder.resolve(name)), name, ".csv", ".json");
        }
        assertUnusable(() -> outputs.fits(folder.resolve("r.txt")), "r.txt", ".csv");
        assertUnusable(() -> outputs.candidates(folder.resolve("r.txt")), "r.txt", ".csv");
        assertUnusable(() -> outputs.catalogue(folder.resolve("r.txt"), Invented.CATALOGUE), "r.txt", ".csv");
    }

    @Test
    void everyKind() throws IOException {
        try (Output<CaseResult> candidates = outputs.candidates(folder.resolve("c.json"))) {
            candidates.finish();
        }
        outputs.catalogue(folder.resolve("k.csv"), Invented.CATALOGUE);
        try (Output<CurveFits> fits = outputs.fits(folder.resolve("f.json"))) {
            fits.finish();
        }
        assertEquals(List.of(), Json.object(Files.readString(folder.resolve("c.json"))).get("candidates"));
        assertEquals(List.of(), Json.object(Files.readString(folder.resolve("f.json"))).get("fits"));
        assertEquals(6, Files.readAllLines(folder.resolve("k.csv")).size());
    }

    @Test
    void constantsOfTheListFitIntoACaseTable() throws IOException {
        Correlation two = Correlation.of("blades.np.two", Quantity.POWER_NUMBER, "two constants").families("blades")
                .cite(Citation.of("nowhere", "p. 1")).transcription(Transcription.FROM_MEMORY).constant("c", 1.5).constant("d", 2)
                .formula("{c} + {d}").relation((geometry, constants) -> point -> 3.5).build();
        Contribution only = new Contribution() {
            @Override
            public List<Correlation> correlations() {
                return List.of(two);
            }
        };
        outputs.catalogue(folder.resolve("k.csv"), Catalogue.of(List.of(Arrival.of(only, "invented 1.0.0"))));
        String row = Files.readAllLines(folder.resolve("k.csv")).get(1);
        String cell = row.substring(row.lastIndexOf(',') + 1);
        assertEquals(Map.of(two.id(), Map.of("c", 1.5, "d", 2.0)), Sheet.good().with("constants", two.id() + " " + cell)
                .entry(folder).spec().orElseThrow().choices().constants(), cell);
    }

    @Test
    void nothingIsLeftOfWhatWasNotFinished() throws IOException {
        Path old = Files.writeString(folder.resolve("r.csv"), "old");
        assertThrows(IllegalStateException.class, () -> {
            try (Output<CaseResult> out = outputs.results(old)) {
                out.add(RESULT);
                throw new IllegalStateException("in the middle");
            }
        });
        assertEquals("old", Files.readString(old));
        assertEquals(List.of("in.csv", "r.csv"), files());
    }

    @Test
    void anExistingFileIsReplacedAndALinkFollowed() throws IOException {
        Path old = Files.writeString(folder.resolve("r.csv"), "old");
        Path link = Files.createSymbolicLink(folder.resolve("link.csv"), old);
        write(link);
        assertTrue(Files.isSymbolicLink(link));
        assertTrue(Files.readString(old).startsWith("case,family"));
    }

    @Test
    void folderThatDoesNotExistOrIsNamedInsteadOfAFile() throws IOException {
        assertUnusable(() -> outputs.results(folder.resolve("none").resolve("r.csv")), "r.csv", "does not exist");
        Files.createDirectory(folder.resolve("d.csv"));
        assertUnusable(() -> outputs.results(folder.resolve("d.csv")), "d.csv", "folder");
    }

    @Test
    void theInputStaysAsItIs() throws IOException {
        byte[] before = Files.readAllBytes(input);
        Path link = Files.createSymbolicLink(folder.resolve("also.csv"), input);
        assertUnusable(() -> outputs.results(input), "in.csv", "input");
        assertUnusable(() -> outputs.candidates(link), "also.csv", "input");
        assertUnusable(() -> outputs.results(folder.resolve(".").resolve("in.csv")), "input");
        assertArrayEquals(before, Files.readAllBytes(input));
    }

    @Test
    void twoOutputsOfOneName() throws IOException {
        try (Output<CaseResult> first = outputs.results(folder.resolve("r.csv"))) {
            assertUnusable(() -> outputs.candidates(folder.resolve("r.csv")), "r.csv", "two outputs");
            first.finish();
        }
        assertFalse(Files.readString(folder.resolve("r.csv")).isEmpty());
    }
}
