package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import stirwright.cards.CardShelf;
import stirwright.cards.Cards;
import stirwright.cards.FolderInUseException;
import stirwright.core.Arrival;
import stirwright.core.Catalogue;
import stirwright.correlation.BoundCorrelation;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** What a bundle or a folder of somebody else's may hold, and what the cards make of it. */
class StrangeCardsTest {

    @TempDir
    Path folder;

    private static CorrelationBuilder power(String id) {
        return Specimen.described(Correlation.of(id, Quantity.POWER_NUMBER, "invented"));
    }

    private static Catalogue catalogue(List<Family> families, Correlation... correlations) {
        return Catalogue.of(List.of(new Arrival("invented", families, List.of(correlations), Optional.empty())));
    }

    private CardPages write(Catalogue catalogue) throws Exception {
        Cards.write(catalogue, List.of(), folder);
        return CardPages.of(folder);
    }

    @Test
    void oneThatFailsCostsItsOwnCardAlone() throws Exception {
        Family family = Specimen.family("specimen").build();
        Correlation fine = power("specimen.np.fine").value("A", 2).build();
        Correlation endless = power("specimen.np.endless").constant("a", 2).formula("Np = {a}")
                .relation((vessel, k) -> endless(0)).build();
        CardPages pages = write(catalogue(List.of(family), fine, endless));
        String words = CardPages.words(pages.page(Cards.file(endless)));
        assertTrue(words.contains("cannot be made") && words.contains("specimen.np.endless"), words);
        assertTrue(CardPages.words(pages.page(Cards.file(fine))).contains("Where it holds"));
    }

    private static BoundCorrelation endless(int depth) {
        return endless(depth + 1);
    }

    @Test
    void aFamilyWhoseDefaultsFailLeavesTheCardsOfOthersWhole() throws Exception {
        Family broken = Specimen.family("broken").parameter(Dimensions.BLADE_WIDTH.usually("nothing", vessel -> {
            throw new IllegalStateException("not today");
        })).build();
        Family demanding = Specimen.family("demanding").parameter(Dimensions.BLADE_COUNT).build();
        Correlation any = Correlation.of("general.np.any", Quantity.POWER_NUMBER, "invented").anyFamily().cite(Specimen.SOURCE)
                .transcription(Transcription.FROM_MEMORY).value("A", 2).build();
        CardPages pages = write(catalogue(List.of(broken, demanding, Specimen.family("specimen").build()), any));
        assertFalse(CardPages.elements(pages.page(Cards.file(any)), "svg").isEmpty(), "the third family has a standard impeller");
    }

    @Test
    void longRemarksAndLongIdsAreWritten() throws Exception {
        String stem = "specimen.np.long" + "-and-longer".repeat(21);
        Correlation remarked = power("specimen.np.remarked").value("A", 2).remark("a" + ".a".repeat(20_000)).build();
        Correlation one = power(stem + "-a").value("A", 2).remark("see " + stem + "-b.").build();
        Correlation other = power(stem + "-b").value("A", 2).build();
        CardPages pages = write(catalogue(List.of(Specimen.family("specimen").build()), remarked, one, other));
        assertTrue(CardPages.words(pages.page(Cards.file(remarked))).contains(".a.a.a"));
        assertTrue(CardPages.words(pages.page(Cards.file(one))).contains(one.id()));
        assertTrue(CardPages.values(pages.page(Cards.file(one)), "href").contains(Cards.file(other)));
        assertTrue(CardPages.words(pages.page(Cards.file(other))).contains(other.id()));
    }

    @Test
    void noFileOfAStrangerIsOverwritten() throws Exception {
        Catalogue some = catalogue(List.of(), power("specimen.np.fine").value("A", 2).build());
        for (String name : List.of("cards.css", "filter.js", "card-specimen.np.fine.html")) {
            Path mine = Files.writeString(Files.createDirectories(folder.resolve(name + ".folder")).resolve(name), "mine");
            String message = assertThrows(FolderInUseException.class, () -> Cards.write(some, List.of(), mine.getParent())).getMessage();
            assertTrue(message.contains(name), message);
            assertEquals("mine", Files.readString(mine));
            assertFalse(Files.exists(mine.resolveSibling("index.html")), "something was written");
        }
        Path ours = folder.resolve("ours");
        Cards.write(some, List.of(), ours);
        Cards.write(some, List.of(), ours);
    }

    @Test
    void whatHinderedIsSaid() throws Exception {
        Path file = Files.writeString(folder.resolve("afile"), "");
        for (Path taken : List.of(file, file.resolve("sub"))) {
            IOException hindrance = assertThrows(IOException.class, () -> Cards.write(catalogue(List.of()), List.of(), taken));
            String words = Cards.words(hindrance);
            assertTrue(words.matches("(?s).*afile.*(not a folder|Not a directory|cannot find).*another folder"), words);
        }
    }

    @Test
    void aFolderThatWasTidiedAwayIsWrittenAgain() throws Exception {
        Path away = folder.resolve("shelf");
        CardShelf shelf = new CardShelf(Framework.library(), List::of, away);
        shelf.index();
        shelf.remove();
        assertFalse(Files.exists(away));
        CardShelf tidied = new CardShelf(Framework.library(), List::of, away);
        tidied.index();
        try (var files = Files.newDirectoryStream(away)) {
            for (Path each : files) {
                Files.delete(each);
            }
        }
        Files.delete(away);
        assertTrue(Files.exists(tidied.index()), "it says where it was");
    }
}
