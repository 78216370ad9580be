package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.osgi.framework.Bundle;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import stirwright.cards.CardShelf;
import stirwright.cards.Cards;
import stirwright.cards.FolderInUseException;
import stirwright.conformance.InstalledBundles;
import stirwright.conformance.Proof;
import stirwright.core.Arrival;
import stirwright.core.Catalogue;
import stirwright.core.Entry;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;
import stirwright.correlation.Figures;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;

/** A card for everything that is installed, complete, and no link into the void. */
class CardsTest {
    private static final Pattern NUMBER = Pattern.compile("-?\\d+(\\.\\d+)?");

    @TempDir
    private static Path folder;

    private static Catalogue catalogue;
    private static List<Proof> proofs;
    private static CardPages cards;

    @BeforeAll
    static void write() throws Exception {
        catalogue = Framework.catalogue();
        proofs = InstalledBundles.proofs(Framework.context());
        Cards.write(catalogue, proofs, folder);
        cards = CardPages.of(folder);
    }

    @Test
    void everyCorrelationHasACardAndEveryFamilyAPage() {
        assertTrue(catalogue.entries().size() > 30, "only " + catalogue.entries().size() + " correlations are installed");
        Set<String> expected = new TreeSet<>(Set.of("index.html"));
        catalogue.entries().forEach(entry -> expected.add("card-" + entry.correlation().id() + ".html"));
        catalogue.families().forEach(family -> expected.add("family-" + family.id() + ".html"));
        assertEquals(expected, new TreeSet<>(cards.pages().keySet()));
    }

    @Test
    void theIndexListsEachCardByFamilyAndByQuantity() {
        Document index = cards.page("index.html");
        Map<String, Long> times = CardPages.values(index, "data-card").stream()
                .collect(Collectors.groupingBy(id -> id, Collectors.counting()));
        for (Entry entry : catalogue.entries()) {
            String id = entry.correlation().id();
            assertTrue(times.getOrDefault(id, 0L) >= 2, () -> id + " is listed " + times.get(id) + " times");
        }
        assertEquals(catalogue.entries().size(), times.size());
    }

    @Test
    void everyLinkAndAnchorResolves() {
        List<String> broken = new ArrayList<>();
        int links = 0;
        for (Map.Entry<String, Document> page : cards.pages().entrySet()) {
            List<String> ids = CardPages.values(page.getValue(), "id");
            assertEquals(new TreeSet<>(ids).size(), ids.size(), () -> page.getKey() + " has an id twice: " + ids);
            for (String attribute : List.of("href", "src")) {
                for (String link : CardPages.values(page.getValue(), attribute)) {
                    links++;
                    if (!resolves(page.getKey(), link)) {
                        broken.add(page.getKey() + " -> " + link);
                    }
                }
            }
        }
        assertEquals(List.of(), broken);
        assertTrue(links > 5 * cards.pages().size(), "only " + links + " links were found");
    }

    private static boolean resolves(String page, String link) {
        String[] parts = link.split("#", 2);
        String file = parts[0].isEmpty() ? page : parts[0];
        boolean there = Files.isRegularFile(folder.resolve(file)) && !file.contains("/");
        return there && (parts.length == 1 || CardPages.values(cards.page(file), "id").contains(parts[1]));
    }

    @Test
    void everyPageIsReachedFromTheIndex() {
        Set<String> reached = new TreeSet<>(Set.of("index.html"));
        List<String> toVisit = new ArrayList<>(reached);
        while (!toVisit.isEmpty()) {
            for (String link : CardPages.values(cards.page(toVisit.remove(0)), "href")) {
                String file = link.split("#", 2)[0];
                if (file.endsWith(".html") && reached.add(file)) {
                    toVisit.add(file);
                }
            }
        }
        assertEquals(cards.pages().keySet(), reached);
    }

    @Test
    void aCardTellsAllThatItsCorrelationDoes() {
        for (Entry entry : catalogue.entries()) {
            Correlation c = entry.correlation();
            List<String> parts = new ArrayList<>(List.of(c.id(), c.formula(), c.citation().toString(), c.transcription().words(),
                    c.quantity().title(), entry.origin()));
            c.validity().forEach(bound -> parts.add(bound.subject().title()));
            c.validity().stream().filter(bound -> bound.stated()).forEach(bound -> parts.add(bound.allowance()));
            c.contains().stream().filter(effect -> c.modifierFor().isEmpty()).forEach(effect -> parts.add(effect.title()));
            c.reads().forEach(variable -> parts.add(variable.title()));
            c.families().forEach(id -> catalogue.family(id).map(Family::description).ifPresent(parts::add));
            c.constants().names().forEach(name -> parts.add(name + " = " + Figures.show(c.constants().get(name))));
            c.remarks().forEach(remark -> parts.add(remark.replaceFirst("^Conflict:\\s*\\w", "")));
            c.modifierFor().ifPresent(effect -> parts.add(c.appliesWhen()));
            proofs.stream().filter(proof -> proof.correlation().id().equals(c.id())).forEach(proof -> {
                proof.rows().forEach(row -> parts.add(row.source()));
                proof.lack().ifPresent(parts::add);
            });
            String words = CardPages.words(cards.page(Cards.file(c)));
            parts.forEach(part -> assertTrue(words.contains(part), () -> "the card of " + c.id() + " lacks '" + part + "'"));
        }
    }

    @Test
    void aFamilyPageTellsHowEachDimensionIsMeasured() {
        for (Family family : catalogue.families()) {
            String words = CardPages.words(cards.page("family-" + family.id() + ".html"));
            assertTrue(words.contains(family.description()) && words.contains(family.regimes().citation().toString()), words);
            for (GeometryParameter parameter : family.parameters()) {
                assertTrue(words.contains(parameter.meaning()) && words.contains(parameter.column()), parameter::id);
            }
        }
    }

    @Test
    void regimesThatAreOthersForShearThinningFluidsAreTold() {
        List<Family> apart = catalogue.families().stream().filter(family -> family.regimes().shearThinning().isPresent()).toList();
        assertFalse(apart.isEmpty());
        for (Family family : apart) {
            RegimeLimits thinning = family.regimes().shearThinning().orElseThrow();
            List<String> pages = new ArrayList<>(List.of("family-" + family.id() + ".html"));
            catalogue.entries().stream().map(Entry::correlation).filter(c -> c.families().contains(family.id()))
                    .forEach(c -> pages.add(Cards.file(c)));
            for (String page : pages) {
                String words = CardPages.words(cards.page(page));
                assertTrue(words.contains("thin with shear") && words.contains(thinning.remark())
                        && words.contains("laminar up to Reynolds number " + Figures.show(thinning.laminarUpTo())), () -> page + ": " + words);
            }
        }
    }

    @Test
    void aConflictIsARemarkOfItsOwn() {
        for (Entry entry : catalogue.entries()) {
            for (String remark : entry.correlation().remarks()) {
                assertTrue(remark.toLowerCase(Locale.ROOT).lastIndexOf("conflict:") <= 0 && !remark.startsWith("conflict"),
                        () -> entry.correlation().id() + ": " + remark);
            }
        }
    }

    @Test
    void everyCardHasAPlotWithinItsFrame() {
        for (Entry entry : catalogue.entries()) {
            Document card = cards.page(Cards.file(entry.correlation()));
            List<Element> curves = CardPages.elements(card, "*").stream()
                    .filter(e -> e.getAttribute("class").matches("(curve|dot)( beyond)?")).toList();
            assertFalse(curves.isEmpty(), () -> entry.correlation().id() + " has no curve");
            assertTrue(curves.stream().anyMatch(e -> !e.getAttribute("class").contains("beyond")),
                    () -> entry.correlation().id() + " is drawn nowhere within its stated range");
            for (Element curve : curves) {
                List<Double> numbers = NUMBER.matcher(curve.getAttribute("d") + " " + curve.getAttribute("cx") + " "
                        + curve.getAttribute("cy")).results().map(MatchResult::group).map(Double::valueOf).toList();
                assertTrue(numbers.size() >= 2, () -> entry.correlation().id() + " has an empty curve");
                assertFalse((curve.getAttribute("d") + curve.getAttribute("cy")).matches(".*(NaN|Inf|null).*"),
                        () -> entry.correlation().id() + ": " + curve.getAttribute("d"));
                for (int i = 0; i < numbers.size(); i += 2) {
                    double x = numbers.get(i);
                    assertTrue(x >= 67.9 && x <= 624.1, () -> entry.correlation().id() + " is drawn at x " + x);
                    double y = numbers.get(i + 1);
                    // What lies beyond the stated range may leave the frame and is clipped there.
                    assertTrue(y >= 25.9 && y <= 262.1 || curve.getAttribute("class").contains("beyond"),
                            () -> entry.correlation().id() + " is drawn at y " + y);
                }
            }
            assertFalse(CardPages.elements(card, "title").get(1).getTextContent().isBlank(), "the picture has no name");
            assertTrue(CardPages.elements(card, "desc").get(0).getTextContent().matches(".*\\d.*"), "the picture has no words");
        }
    }

    @Test
    void wordsOfABundleStayWords(@TempDir Path other) throws Exception {
        Correlation hostile = Correlation.of("specimen.np.hostile", Quantity.POWER_NUMBER, "<script>alert('a & \"b\"')</script>\u0007")
                .families("specimen").cite(Specimen.SOURCE).transcription(Transcription.FROM_MEMORY).value("A", 2).build();
        Catalogue strange = Catalogue.of(List.of(new Arrival("a <b> & c", List.of(Specimen.family("specimen").build()),
                List.of(hostile), Optional.empty())));
        Cards.write(strange, List.of(), other);
        CardPages pages = CardPages.of(other);
        Document card = pages.page(Cards.file(hostile));
        assertEquals(List.of(), CardPages.elements(card, "script"));
        assertTrue(CardPages.words(card).contains("<script>alert('a & \"b\"')</script>\uFFFD"), () -> CardPages.words(card));
        assertTrue(CardPages.words(card).contains("a <b> & c"), () -> CardPages.words(card));
        assertTrue(CardPages.words(card).contains("brings no reference row"), () -> CardPages.words(card));
    }

    @Test
    void whatComesAndGoesIsWrittenAnew(@TempDir Path shelfFolder) throws Exception {
        CardShelf shelf = new CardShelf(Framework.library(), () -> InstalledBundles.proofs(Framework.context()), shelfFolder);
        Path index = shelf.index();
        var written = Files.getLastModifiedTime(index);
        assertEquals(index, shelf.index());
        assertEquals(written, Files.getLastModifiedTime(index), "written again, and nothing had changed");
        Path card = index.resolveSibling("card-wanderer.np.invented.html");
        Bundle bundle = Framework.install("cards", TinyBundle.named("wanderer.cards").component(Wanderer.class).jar());
        try {
            Catalogue before = catalogue;
            assertTrue(Framework.becomes(() -> Framework.catalogue().family("wanderer").isPresent()));
            assertNotSame(before, Framework.catalogue());
            assertTrue(Files.readString(shelf.index()).contains("wanderer.np.invented"), "it has no entry in the index");
            assertTrue(Files.readString(card).contains("wanderer.cards 1.0.0"));
        } finally {
            bundle.uninstall();
        }
        assertTrue(Framework.becomes(() -> Framework.catalogue().family("wanderer").isEmpty()));
        assertFalse(Files.readString(shelf.index()).contains("wanderer"), "it stays in the index");
        assertFalse(Files.exists(card), "its card stays");
    }

    @Test
    void aStrangersFolderIsLeftAlone(@TempDir Path strange) throws Exception {
        Path index = Files.writeString(strange.resolve("index.html"), "<html>mine</html>");
        String message = assertThrows(FolderInUseException.class, () -> Cards.write(catalogue, proofs, strange)).getMessage();
        assertTrue(message.contains(strange.toString()), message);
        assertEquals("<html>mine</html>", Files.readString(index));
        try (var files = Files.list(strange)) {
            assertEquals(1, files.count());
        }
        Files.delete(index);
        Path letter = Files.writeString(strange.resolve("card-to-aunt.html"), "Dear aunt");
        Cards.write(catalogue, proofs, strange);
        assertTrue(Files.exists(letter), "somebody's own file was taken for a card");
    }
}
