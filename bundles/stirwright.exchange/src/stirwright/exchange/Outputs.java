package stirwright.exchange;

import java.io.IOException;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.function.Function;
import stirwright.core.CaseResult;
import stirwright.core.Catalogue;
import stirwright.exchange.internal.write.FileOutput;
import stirwright.exchange.internal.write.FitColumns;
import stirwright.exchange.internal.write.JsonOutput;
import stirwright.exchange.internal.write.JsonRecords;
import stirwright.exchange.internal.write.QuantityColumns;

/**
 * The files that one run writes, their format told by their ending. No file is written twice, and
 * none over the run's input. Not thread-safe.
 */
public final class Outputs {
    private final Origin origin;
    private final List<Path> inputs;
    private boolean everyQuantity;
    private final Set<Path> taken = new HashSet<>();

    /** @param inputs files that must stay as they are */
    public Outputs(Origin origin, List<Path> inputs) {
        this.origin = origin;
        this.inputs = List.copyOf(inputs);
    }

    /** @throws UnusableFileException when the name or the place does not do */
    public Output<CaseResult> results(Path file) {
        return open(file, ResultTable::to, w -> {
            everyQuantity = true;
            return ResultJson.to(w, origin);
        });
    }

    /** Whether a file opened so far shows the candidates for every quantity. */
    public boolean showEveryQuantity() {
        return everyQuantity;
    }

    /** @throws UnusableFileException when the name or the place does not do */
    public Output<CaseResult> candidates(Path file) {
        everyQuantity = true;
        return open(file, CandidateTable::to, w -> new JsonOutput<>(w, origin, "candidates",
                JsonRecords.each(QuantityColumns.ALL, QuantityColumns::rows)));
    }

    /** @throws UnusableFileException when the name or the place does not do */
    public Output<CurveFits> fits(Path file) {
        return open(file, FitTable::to, w -> new JsonOutput<>(w, origin, "fits",
                JsonRecords.each(FitColumns.ALL, FitColumns::rows)));
    }

    /** @throws UnusableFileException when the file cannot be written */
    public void catalogue(Path file, Catalogue catalogue) {
        CatalogueTable.complete(open(file, CatalogueTable::csv, w -> CatalogueTable.json(w, origin)), catalogue);
    }

    private <T> Output<T> open(Path file, Function<Writer, Output<T>> csv, Function<Writer, Output<T>> json) {
        Function<Writer, Output<T>> content = byEnding(file, csv, json);
        requireFree(file);
        return new FileOutput<>(file, content);
    }

    private static <F> F byEnding(Path file, F csv, F json) {
        String name = String.valueOf(file.getFileName()).toLowerCase(Locale.ROOT);
        if (name.endsWith(".csv")) {
            return csv;
        }
        if (name.endsWith(".json")) {
            return json;
        }
        throw new UnusableFileException(file, "this ending names no format; use .csv or .json");
    }

    private void requireFree(Path file) {
        for (Path input : inputs) {
            if (sameFile(file, input)) {
                throw new UnusableFileException(file, "is the input; give the output another name");
            }
        }
        if (!taken.add(file.toAbsolutePath().normalize())) {
            throw new UnusableFileException(file, "is named for two outputs; give each a name of its own");
        }
    }

    private static boolean sameFile(Path file, Path input) {
        try {
            return Files.exists(file) && Files.exists(input) && Files.isSameFile(file, input);
        } catch (IOException failure) {
            throw new UnusableFileException(file, "cannot be looked up: " + failure.getMessage(), failure);
        }
    }
}
