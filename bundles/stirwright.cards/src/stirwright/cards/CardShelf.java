package stirwright.cards;

import java.io.IOException;
import java.nio.file.DirectoryIteratorException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Supplier;
import stirwright.conformance.Proof;
import stirwright.core.Catalogue;
import stirwright.core.Library;

/**
 * The cards of what is installed at the moment, written when somebody asks and again only after a bundle came or went. May be
 * used by several threads at once.
 */
public final class CardShelf {
    private final Library library;
    private final Supplier<List<Proof>> proofs;
    private final Path folder;
    /** What the folder was written from; null before. */
    private Catalogue written;
    private Path index;

    /**
     * @param proofs what the installed correlations were checked against, asked anew for each catalogue
     * @param folder of the cards alone
     */
    public CardShelf(Library library, Supplier<List<Proof>> proofs, Path folder) {
        this.library = library;
        this.proofs = proofs;
        this.folder = folder;
    }

    /**
     * Writes what is missing or out of date. Takes a second or less; not for the thread of a window.
     *
     * @return the index; its neighbours are named by {@link Cards#file}
     * @throws IOException when a file cannot be written
     */
    public synchronized Path index() throws IOException {
        Catalogue now = library.catalogue();
        // Whoever tidies up temporary files may have taken the folder.
        if (now != written || !Files.isRegularFile(index)) {
            index = Cards.write(now, proofs.get(), folder);
            written = now;
        }
        return index;
    }

    /** Deletes the folder with what was written; for a temporary one. What cannot be deleted is left to the system. */
    public synchronized void remove() {
        written = null;
        try (var files = Files.newDirectoryStream(folder)) {
            for (Path file : files) {
                Files.deleteIfExists(file);
            }
            Files.deleteIfExists(folder);
        } catch (IOException | DirectoryIteratorException left) {
            // A temporary folder that stays for a while harms nobody.
        }
    }
}
