package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import stirwright.core.Catalogue;
import stirwright.core.Entry;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;

/** What was found in the literature, relation by relation, against what is installed. */
class RelationsTest {
    private static final String FILE = "bundles/stirwright.equinox.tests/reference/relations.csv";

    /** The ids that the case table's contract names. */
    private static final Set<String> FAMILIES = Set.of("discturbine", "concavedisc", "pitchedblade", "flatblade", "propeller",
            "hydrofoil", "anchor", "gate", "helicalribbon", "helicalscrew", "retreatcurve", "tootheddisc", "inhouse");

    /** A relation; it ships as some correlations, or not for a reason. */
    private record Relation(String name, String quantity, List<String> families, List<String> correlations, String reason) {
        static Relation of(NamedCsvRecord row) {
            return new Relation(row.getField("relation"), row.getField("quantity"), words(row.getField("family")),
                    words(row.getField("correlations")), row.getField("reason"));
        }

        private static List<String> words(String cell) {
            return Arrays.stream(cell.split(" ")).filter(word -> !word.isEmpty()).toList();
        }
    }

    private final Catalogue installed = Framework.catalogue();

    @Test
    void everyFamilyOfTheContractIsInstalled() {
        assertEquals(new TreeSet<>(FAMILIES), shipped().map(Family::id).collect(Collectors.toCollection(TreeSet::new)));
    }

    @Test
    void everyInstalledCorrelationStandsForARelation() throws IOException {
        Set<String> listed = relations().stream().flatMap(r -> r.correlations().stream()).collect(Collectors.toSet());
        assertEquals(List.of(), own().map(Correlation::id).filter(id -> !listed.contains(id)).toList());
    }

    @Test
    void everyRelationShipsOrSaysWhyNot() throws IOException {
        List<String> wrong = relations().stream().flatMap(this::problem).toList();
        assertEquals(List.of(), wrong);
        assertTrue(relations().size() >= 60, () -> "the list is too short to be the literature's");
    }

    private Stream<String> problem(Relation relation) {
        if (relation.correlations().isEmpty()) {
            return relation.reason().isBlank() ? Stream.of(relation.name() + ": neither shipped nor a reason") : Stream.empty();
        }
        return relation.correlations().stream().flatMap(id -> problem(relation, id).stream());
    }

    private Optional<String> problem(Relation relation, String id) {
        Optional<Correlation> found = installed.entry(id).map(Entry::correlation);
        if (found.isEmpty()) {
            return Optional.of(relation.name() + ": " + id + " is not installed");
        }
        Correlation correlation = found.get();
        if (!correlation.quantity().id().equals(relation.quantity())) {
            return Optional.of(relation.name() + ": " + id + " gives the " + correlation.quantity().id());
        }
        return relation.families().stream().anyMatch(correlation::holdsFor) || relation.families().equals(List.of("any"))
                ? Optional.empty() : Optional.of(relation.name() + ": " + id + " is not made for " + relation.families());
    }

    private static List<Relation> relations() throws IOException {
        try (var rows = CsvReader.builder().commentStrategy(CommentStrategy.SKIP)
                .ofNamedCsvRecord(SourceTree.root().resolve(FILE))) {
            return rows.stream().map(Relation::of).toList();
        }
    }

    /** Other tests install families and correlations of their own for a while. */
    private Stream<Family> shipped() {
        return installed.families().stream().filter(f -> isOwn(installed.originOf(f)));
    }

    private Stream<Correlation> own() {
        return installed.entries().stream().filter(e -> isOwn(e.origin())).map(Entry::correlation);
    }

    private static boolean isOwn(String origin) {
        return origin.startsWith("stirwright.");
    }
}
