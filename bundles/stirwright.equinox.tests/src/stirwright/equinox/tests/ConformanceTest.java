package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicContainer;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import stirwright.conformance.ConformanceSuite;
import stirwright.conformance.InstalledBundles;
import stirwright.conformance.Proof;
import stirwright.conformance.Subject;

/** Every installed bundle that contributes passes every check. */
class ConformanceTest {

    /** Two families and the general relations. */
    private static final int LEAST_BUNDLES = 3;

    @Test
    void theBundlesAreThere() {
        List<Subject> subjects = InstalledBundles.subjects(Framework.context());
        assertTrue(subjects.size() >= LEAST_BUNDLES, () -> "only these contribute: " + subjects);
    }

    /** What holds no number from outside says so in its reference file. */
    @Test
    void everyNumberIsComparedWithOneFromOutsideOrSaysWhyNot() {
        List<String> silent = InstalledBundles.subjects(Framework.context()).stream().flatMap(s -> s.proofs().stream())
                .filter(proof -> proof.hasRowFromOutside() == proof.lack().isPresent())
                .map(proof -> proof.correlation().id() + (proof.hasRowFromOutside()
                        ? " has a number from outside, and a row that says it has none" : " has neither")).toList();
        assertEquals(List.of(), silent);
    }

    /** A row may name its source by a letter; who reads the row on a card has not the file's top before him. */
    @Test
    void everyLetterOfARowIsExplained() {
        List<String> sources = InstalledBundles.subjects(Framework.context()).stream().flatMap(s -> s.proofs().stream())
                .flatMap(proof -> proof.rows().stream()).map(Proof.Row::source).toList();
        assertTrue(sources.contains("Geankoplis, Transport Processes and Unit Operations, 3rd ed., Example 3.4-1, p. 145; part b"),
                "the disc turbine's row of [c], part b");
        Pattern letter = Pattern.compile("\\[(\\w+)]");
        assertEquals(List.of(), sources.stream().filter(source -> letter.matcher(source).results()
                .anyMatch(found -> !source.contains("; " + found.group() + " "))).toList());
    }

    @TestFactory
    Stream<DynamicContainer> conforms() {
        return InstalledBundles.subjects(Framework.context()).stream().map(subject -> DynamicContainer.dynamicContainer(
                subject.origin(), ConformanceSuite.checks().stream().map(check -> DynamicTest.dynamicTest(
                        check.name() + ": " + check.proves(),
                        () -> assertEquals(List.of(), check.examine(subject), subject + ": " + check.proves())))));
    }
}
