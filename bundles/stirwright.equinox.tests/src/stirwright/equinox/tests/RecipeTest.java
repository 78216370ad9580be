package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import stirwright.conformance.ConformanceSuite;
import stirwright.conformance.Finding;
import stirwright.conformance.ReferenceFile;
import stirwright.conformance.Subject;
import stirwright.core.Arrival;
import stirwright.core.Catalogue;
import stirwright.correlation.Correlation;

/** The manual's recipe for a correlation of one's own, followed to the letter in the template. */
class RecipeTest {
    private static final String ORIGIN = "stirwright.family.inhouse";
    private static final String ADDED = "inhouse.np.trial-12";
    private static final int MOST_LINES = 12;

    @TempDir
    Path folder;

    @Test
    void takesFewLinesAndConforms() throws Exception {
        Recipe recipe = Recipe.ofTheManual();
        assertTrue(recipe.lines() <= MOST_LINES, () -> "the recipe takes " + recipe.lines() + " lines of Java");
        Subject subject = followed(recipe);
        assertEquals(List.of(), ConformanceSuite.examine(subject));
        assertTrue(subject.proofs().stream().anyMatch(p -> p.correlation().id().equals(ADDED) && p.hasRowFromOutside()),
                () -> ADDED + " is not among " + subject.correlations());
    }

    @Test
    void whatItAddsIsADraft() throws Exception {
        List<Correlation> added = followed(Recipe.ofTheManual()).correlations();
        assertEquals(2, added.size());
        assertTrue(added.stream().noneMatch(c -> c.standing().recommendable()), "an in-house draft would be recommended");
    }

    @Test
    void aBoundThatIsLeftOutIsMissed() throws Exception {
        Recipe recipe = Recipe.ofTheManual();
        assertEquals(Set.of("bounds"), found(recipe.withMethod(".baffled()", "")));
        assertEquals(Set.of("bounds"), found(recipe.withMethod(".newtonianData()", "")));
        assertEquals(Set.of("bounds"), found(recipe.withMethod(line(recipe, ".notStated("), "")));
    }

    @Test
    void aRowThatIsLeftOutOrNotMetIsFound() throws Exception {
        Recipe recipe = Recipe.ofTheManual();
        assertEquals(Set.of("rows met"), found(recipe.withFile("0.62", "0.65")));
        assertTrue(found(recipe.withMethod("2e5", "4e4")).contains("rows inside"), "nobody sees that the row lies beyond");
        assertFalse(found(recipe.withFile(line(recipe.file(), ADDED), "")).isEmpty(), "nobody misses the row");
    }

    @Test
    void aWordThatTheContractDoesNotHaveIsNotCompiled() throws Exception {
        Recipe recipe = Recipe.ofTheManual().withMethod(".baffled()", ".baffles()");
        assertTrue(assertThrows(AssertionError.class, () -> followed(recipe)).getMessage().contains("baffles"));
    }

    private static String line(Recipe recipe, String with) {
        return line(recipe.method(), with);
    }

    private static String line(String text, String with) {
        return text.lines().filter(l -> l.contains(with)).findFirst().orElseThrow();
    }

    private Set<String> found(Recipe recipe) throws Exception {
        return ConformanceSuite.examine(followed(recipe)).stream().map(Finding::check).collect(Collectors.toSet());
    }

    /** The template with the recipe's correlation and reference file, as the suite sees an installed bundle. */
    private Subject followed(Recipe recipe) throws Exception {
        Arrival arrival = Compiled.arrival("stirwright.family.inhouse.InHouse", recipe.java(), folder, ORIGIN);
        assertTrue(arrival.failure().isEmpty(), () -> "the template fails: " + arrival.failure());
        List<ReferenceFile> files = new ArrayList<>(referenceFiles());
        files.add(new ReferenceFile("recipe.csv", recipe.file()));
        return Subject.of(ORIGIN, List.of(arrival), files, Catalogue.of(List.of()));
    }

    private static List<ReferenceFile> referenceFiles() throws IOException {
        List<ReferenceFile> files = new ArrayList<>();
        try (Stream<Path> found = Files.list(SourceTree.root().resolve("bundles/stirwright.family.inhouse/reference"))) {
            for (Path file : found.sorted().toList()) {
                files.add(new ReferenceFile(file.getFileName().toString(), Files.readString(file)));
            }
        }
        return files;
    }
}
