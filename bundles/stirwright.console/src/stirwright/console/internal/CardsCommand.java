package stirwright.console.internal;

import java.io.IOException;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import stirwright.cards.Cards;
import stirwright.cards.FolderInUseException;
import stirwright.core.Catalogue;
import stirwright.exchange.UnusableFileException;

@Command(name = "cards",
        description = "Writes a page for every installed correlation and family, with formula, plot, range, source and what it"
                + " was checked against, and an index to open in a browser.")
final class CardsCommand implements Callable<Integer> {
    private final Desk desk;

    @Option(names = "--out", paramLabel = "DIR", defaultValue = "stirwright-cards",
            description = "the folder for the pages, made when it is not there; without it stirwright-cards, where you are")
    private Path folder;

    CardsCommand(Desk desk) {
        this.desk = desk;
    }

    @Override
    public Integer call() {
        Catalogue catalogue = desk.catalogue().get();
        desk.reportProblems(catalogue);
        Path index;
        try {
            index = Cards.write(catalogue, desk.proofs().get(), folder);
        } catch (FolderInUseException strange) {
            desk.err().println(strange.getMessage());
            return ExitCode.UNUSABLE;
        } catch (IOException unwritable) {
            throw new UnusableFileException(folder, Cards.words(unwritable), unwritable);
        }
        desk.out().println(catalogue.entries().size() + " correlations and " + catalogue.families().size()
                + " families have cards; open " + index.toAbsolutePath().normalize() + " in a browser.");
        desk.out().flush();
        return ExitCode.OK;
    }
}
