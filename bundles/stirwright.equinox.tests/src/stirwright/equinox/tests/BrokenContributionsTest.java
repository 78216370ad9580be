package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import stirwright.conformance.Check;
import stirwright.conformance.ConformanceSuite;
import stirwright.conformance.Finding;
import stirwright.conformance.Subject;

/** Every check can fail: what breaks one rule is found by the check for that rule and by no other. */
class BrokenContributionsTest {

    /**
     * @param check the one that must find it
     * @param words that the finding must say, so that a contributor can act on it
     */
    record Broken(String check, String what, Subject subject, String... words) {}

    private static List<Broken> all() {
        return Stream.of(BrokenWords.all(), BrokenRows.all(), BrokenNumbers.all()).flatMap(List::stream).toList();
    }

    @Test
    void theSpecimenIsSound() {
        Subject subject = Specimen.subject(Specimen.POWER_ROW + Specimen.KS_ROW + Specimen.FACTOR_ROW,
                Specimen.sound(Specimen.power().belongsWith(Specimen.KS).laminarLimit()), Specimen.ks().build(),
                Specimen.whenSeveral(Specimen.factor()).build());
        assertEquals(List.of(), ConformanceSuite.examine(subject));
        assertEquals(3, subject.rows());
        assertEquals(1, subject.recalledRows());
    }

    @Test
    void everyCheckIsProvenAbleToFail() {
        Set<String> proven = all().stream().map(Broken::check).collect(Collectors.toSet());
        assertEquals(ConformanceSuite.checks().stream().map(Check::name).collect(Collectors.toSet()), proven);
    }

    @TestFactory
    Stream<DynamicTest> isFoundByItsCheckAlone() {
        return all().stream().map(broken -> DynamicTest.dynamicTest(broken.check() + ": " + broken.what(), () -> {
            List<Finding> findings = ConformanceSuite.examine(broken.subject());
            assertFalse(findings.isEmpty(), "nothing was found");
            assertAll(findings.stream().map(f -> () -> assertEquals(broken.check(), f.check(), f.toString())));
            String said = findings.get(0).toString();
            assertAll(Stream.of(broken.words())
                    .map(w -> () -> assertTrue(said.contains(w), () -> "no '" + w + "' in: " + said)));
        }));
    }
}
