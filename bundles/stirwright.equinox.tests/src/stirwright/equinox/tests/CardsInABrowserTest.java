package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.File;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import stirwright.cards.Cards;
import stirwright.conformance.InstalledBundles;
import stirwright.core.Catalogue;
import stirwright.core.Entry;

/** The index as a browser without a window reads it. */
class CardsInABrowserTest {
    private static final List<String> NAMES = List.of("chromium", "chromium-browser", "google-chrome");
    private static final Pattern CARD = Pattern.compile("<tr data-card=\"([^\"]+)\"");
    private static final int PATIENCE_S = 90;

    @TempDir
    private Path folder;

    @Test
    void showsACardForEachCorrelation() throws Exception {
        Path trial = Files.writeString(folder.resolve("trial.html"), "<title>trial</title>");
        Optional<Path> browser = browser(trial);
        assumeTrue(browser.isPresent(), "there is no Chromium on this machine that shows a page (on Debian the package chromium)");
        Catalogue catalogue = Framework.catalogue();
        Path index = Cards.write(catalogue, InstalledBundles.proofs(Framework.context()), folder.resolve("cards"));
        String page = dump(browser.get(), index);
        assertTrue(page.contains("<title>Correlation cards</title>"), page);
        assertEquals(catalogue.entries().stream().map(Entry::correlation).map(c -> c.id()).collect(Collectors.toSet()),
                CARD.matcher(page).results().map(found -> found.group(1)).collect(Collectors.toSet()));
        assertFalse(page.contains("id=\"filter\" hidden"), "the filter's script did not run");
    }

    /** Anything may be called so, for instance a script that only says how to install it. */
    private Optional<Path> browser(Path trial) {
        return Stream.of(System.getenv("PATH").split(File.pathSeparator)).flatMap(at -> NAMES.stream().map(name -> Path.of(at, name)))
                .filter(Files::isExecutable).filter(path -> shows(path, trial)).findFirst();
    }

    private boolean shows(Path browser, Path trial) {
        try {
            return dump(browser, trial).contains("<title>trial</title>");
        } catch (Exception | AssertionError e) {
            // Whatever stands in the way, it is no browser to test with.
            return false;
        }
    }

    private String dump(Path browser, Path page) throws Exception {
        Path out = folder.resolve("dump.html");
        Process process = new ProcessBuilder(browser.toString(), "--headless", "--no-sandbox", "--disable-gpu",
                "--disable-dev-shm-usage", "--no-first-run", "--user-data-dir=" + folder.resolve("profile"), "--dump-dom", page.toUri().toString())
                .redirectOutput(out.toFile()).redirectError(ProcessBuilder.Redirect.DISCARD).start();
        try {
            assertTrue(process.waitFor(PATIENCE_S, TimeUnit.SECONDS), "the browser does not come to an end");
        } finally {
            process.destroyForcibly().waitFor();
        }
        return Files.readString(out, StandardCharsets.UTF_8);
    }
}
