package stirwright.cards;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.DirectoryIteratorException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import stirwright.cards.internal.CardPage;
import stirwright.cards.internal.FamilyPage;
import stirwright.cards.internal.Holdings;
import stirwright.cards.internal.IndexPage;
import stirwright.cards.internal.Page;
import stirwright.conformance.Proof;
import stirwright.core.Catalogue;
import stirwright.core.Entry;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;

/** Writes all cards into a folder. */
public final class Cards {
    /** The name of the index in the folder. */
    public static final String INDEX = Page.INDEX;

    private static final String PAGES = "{card,family}-*.html";

    private Cards() {}

    /** The name of a correlation's page in the folder; it stays as long as the id does. */
    public static String file(Correlation correlation) {
        return Holdings.file(correlation);
    }

    /**
     * Writes a page for each correlation and each family, an index and their style, and removes pages of an earlier run
     * that are not wanted any more.
     *
     * @param proofs what the correlations were checked against; one that has none says so on its card
     * @param folder is made when it is not there
     * @return the index
     * @throws FolderInUseException when the folder has a file that is not ours under a name to be written; then nothing was
     *     written
     * @throws IOException when a file cannot be written
     */
    public static Path write(Catalogue catalogue, List<Proof> proofs, Path folder) throws IOException {
        Holdings holdings = new Holdings(catalogue, proofs);
        Map<String, String> pages = new LinkedHashMap<>();
        for (Entry entry : holdings.entries()) {
            pages.put(Holdings.file(entry.correlation()), CardPage.of(holdings, entry));
        }
        for (Family family : holdings.families()) {
            pages.put(Holdings.file(family), FamilyPage.of(holdings, family));
        }
        pages.put(Page.STYLE, resource(Page.STYLE));
        pages.put(Page.SCRIPT, resource(Page.SCRIPT));
        // Last, so that whoever sees the index finds what it leads to.
        pages.put(INDEX, IndexPage.of(holdings));
        for (String name : pages.keySet()) {
            Path file = folder.resolve(name);
            if (Files.exists(file) && !isOurs(file)) {
                throw new FolderInUseException(folder, file);
            }
        }
        Files.createDirectories(folder);
        for (Map.Entry<String, String> page : pages.entrySet()) {
            Files.writeString(folder.resolve(page.getKey()), page.getValue());
        }
        removeOthers(folder, pages);
        return folder.resolve(INDEX);
    }

    /** What hindered the writing and what to do, in words that follow a colon. */
    public static String words(IOException hindrance) {
        return switch (hindrance) {
            case FolderInUseException inUse -> inUse.getMessage();
            case AccessDeniedException denied -> "you have no permission to write " + denied.getFile() + "; name another folder";
            case FileAlreadyExistsException taken -> taken.getFile() + " is a file and not a folder; name another folder";
            case FileSystemException other when other.getReason() != null ->
                    other.getFile() + " cannot be written (" + other.getReason() + "); name another folder";
            default -> "the cards cannot be written (" + hindrance.getMessage() + "); name another folder";
        };
    }

    private static void removeOthers(Path folder, Map<String, String> wanted) throws IOException {
        List<Path> others = new ArrayList<>();
        try (var pages = Files.newDirectoryStream(folder, PAGES)) {
            pages.forEach(page -> {
                if (!wanted.containsKey(page.getFileName().toString())) {
                    others.add(page);
                }
            });
        } catch (DirectoryIteratorException unreadable) {
            throw unreadable.getCause();
        }
        for (Path page : others) {
            if (isOurs(page)) {
                Files.delete(page);
            }
        }
    }

    /** Compared as bytes, since a stranger's file may be in any encoding. */
    private static boolean isOurs(Path page) throws IOException {
        return Files.isRegularFile(page)
                && new String(Files.readAllBytes(page), StandardCharsets.ISO_8859_1)
                        .contains(page.toString().endsWith(".html") ? Page.GENERATOR : Page.MARK);
    }

    private static String resource(String name) throws IOException {
        try (InputStream in = Cards.class.getResourceAsStream("/web/" + name)) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        }
    }
}
