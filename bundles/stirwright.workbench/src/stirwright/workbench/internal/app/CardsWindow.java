package stirwright.workbench.internal.app;

import jakarta.annotation.PostConstruct;
import jakarta.inject.Inject;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;
import java.util.function.Consumer;
import org.eclipse.swt.program.Program;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Shell;
import org.osgi.framework.BundleContext;
import org.osgi.framework.FrameworkUtil;
import stirwright.cards.CardShelf;
import stirwright.cards.Cards;
import stirwright.conformance.InstalledBundles;
import stirwright.core.Library;
import stirwright.correlation.Correlation;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.widgets.Looks;

/**
 * Shows the cards of what is installed, in a shell of their own beside the study. They are written when first asked for, on
 * another thread, and again after a family came or went.
 */
public final class CardsWindow {
    private static final String KEY = "cards";
    private static final String FOLDER = "stirwright-cards-";

    @Inject
    private Library library;

    @Inject
    private Looks looks;

    @Inject
    private Notices notices;

    private CompletableFuture<CardShelf> shelf;
    private CardsBrowser browser;

    @PostConstruct
    void watch() {
        Display display = Display.getCurrent();
        Library.Listening changes = library.listen(() -> later(display, this::refresh));
        display.disposeExec(() -> {
            changes.close();
            if (shelf != null) {
                shelf.thenAccept(CardShelf::remove);
            }
        });
    }

    /** Shows the index of all cards. */
    public void openIndex(Shell parent) {
        open(parent, Cards.INDEX);
    }

    /** Shows the card of a correlation. */
    public void open(Shell parent, Correlation correlation) {
        open(parent, Cards.file(correlation));
    }

    private void open(Shell parent, String page) {
        if (shelf == null || shelf.isCompletedExceptionally()) {
            shelf = CompletableFuture.supplyAsync(this::newShelf);
        }
        Display display = parent.getDisplay();
        written(display, index -> show(parent, index, page));
    }

    /** Writes the cards on another thread; then hands over the index. */
    private void written(Display display, Consumer<Path> use) {
        // Handed over and not chained, so that a defect in what shows them reaches the event loop.
        shelf.thenApplyAsync(CardsWindow::index).whenComplete((index, failure) -> later(display, () -> {
            if (failure == null) {
                notices.remove(KEY);
                use.accept(index);
            } else {
                say(Messages.bind(Messages.Cards_failed, words(failure)));
            }
        }));
    }

    private static String words(Throwable failure) {
        Throwable cause = failure instanceof CompletionException wrapped ? wrapped.getCause() : failure;
        return cause instanceof UncheckedIOException unwritable ? Cards.words(unwritable.getCause()) : String.valueOf(cause);
    }

    private void say(String words) {
        notices.put(new Notice(KEY, words, List.of()));
    }

    /** The families go on arriving while the window closes. */
    private static void later(Display display, Runnable task) {
        if (!display.isDisposed()) {
            display.asyncExec(task);
        }
    }

    private CardShelf newShelf() {
        BundleContext bundles = FrameworkUtil.getBundle(CardsWindow.class).getBundleContext();
        try {
            return new CardShelf(library, () -> InstalledBundles.proofs(bundles), Files.createTempDirectory(FOLDER));
        } catch (IOException unwritable) {
            throw new UncheckedIOException(unwritable);
        }
    }

    private static Path index(CardShelf shelf) {
        try {
            return shelf.index();
        } catch (IOException unwritable) {
            throw new UncheckedIOException(unwritable);
        }
    }

    private void refresh() {
        if (browser != null && browser.isOpen()) {
            written(browser.parent().getDisplay(), index -> {
                if (browser.isOpen()) {
                    browser.reload(index);
                }
            });
        }
    }

    private void show(Shell parent, Path index, String page) {
        if (parent.isDisposed()) {
            return;
        }
        // The card of a correlation that has just left is not there.
        Path file = Files.exists(index.resolveSibling(page)) ? index.resolveSibling(page) : index;
        if (browser == null || !browser.isOpen()) {
            browser = CardsBrowser.open(parent, looks, address -> say(Messages.bind(Messages.Cards_notOutside, address))).orElse(null);
        }
        if (browser != null) {
            browser.show(file);
        } else {
            String words = Program.launch(file.toUri().toString()) ? Messages.Cards_systemBrowser : Messages.Cards_noBrowserAtAll;
            say(Messages.bind(words, file));
        }
    }
}
