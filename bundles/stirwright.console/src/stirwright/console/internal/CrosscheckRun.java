package stirwright.console.internal;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import stirwright.core.CaseResult;
import stirwright.core.Catalogue;
import stirwright.core.CrossCheck;
import stirwright.core.Status;
import stirwright.exchange.CaseEntry;
import stirwright.exchange.CaseTable;
import stirwright.exchange.Origin;
import stirwright.exchange.Output;
import stirwright.exchange.Outputs;

/** Reads a case table or a study, checks its cases on all cores in their order, prints and writes the results. */
final class CrosscheckRun {

    /** Cases that are computed before the next are printed: enough to keep the cores busy. */
    private static final int BLOCK = 250;

    private final Desk desk;

    CrosscheckRun(Desk desk) {
        this.desk = desk;
    }

    /** @return the worst status of any case */
    Status run(Path file, List<Path> resultFiles, List<Path> candidateFiles) {
        Catalogue catalogue = desk.catalogue().get();
        desk.reportProblems(catalogue);
        CaseTable table = CaseTable.read(file, catalogue);
        table.messages().forEach(desk.err()::println);
        Outputs files = new Outputs(new Origin(desk.version(), table.fileName()), List.of(file));
        List<Output<CaseResult>> outputs = new ArrayList<>();
        try {
            resultFiles.forEach(f -> outputs.add(files.results(f)));
            candidateFiles.forEach(f -> outputs.add(files.candidates(f)));
            CrossCheck full = new CrossCheck(catalogue);
            Status worst = check(table, files.showEveryQuantity() ? full : full.withoutQuantities(), outputs);
            outputs.forEach(Output::finish);
            return worst;
        } finally {
            outputs.forEach(Output::close);
        }
    }

    /** A case, what came out, and how it is laid out for reading. */
    private record Done(CaseEntry entry, CaseResult result, String text) {}

    /** Computes block after block while a thread of its own writes the block before. */
    private Status check(CaseTable table, CrossCheck crossCheck, List<Output<CaseResult>> outputs) {
        Summary summary = new Summary();
        Progress progress = new Progress(desk.err(), "cases", table.entries().size());
        List<CaseEntry> entries = table.entries();
        try (ExecutorService writer = Executors.newSingleThreadExecutor()) {
            Future<?> writing = CompletableFuture.completedFuture(null);
            for (int from = 0; from < entries.size(); from += BLOCK) {
                List<Done> block = entries.subList(from, Math.min(from + BLOCK, entries.size())).parallelStream()
                        .map(entry -> done(entry, crossCheck)).toList();
                await(writing);
                writing = writer.submit(() -> write(table.fileName(), block, outputs, summary));
                progress.reached(from + block.size());
            }
            await(writing);
        }
        progress.done();
        summary.print(desk.out());
        return summary.worst();
    }

    private static Done done(CaseEntry entry, CrossCheck crossCheck) {
        CaseResult result = entry.check(crossCheck);
        return new Done(entry, result, CaseView.text(entry, result));
    }

    private void write(String fileName, List<Done> block, List<Output<CaseResult>> outputs, Summary summary) {
        for (Done done : block) {
            desk.out().println(done.text());
            outputs.forEach(o -> o.add(done.result()));
            summary.add(done.entry(), done.result());
            done.result().refusal().ifPresent(r -> desk.err().println(fileName + " " + done.entry().place()
                    + " (case '" + CaseView.shortened(done.entry().name()) + "'): " + r.words()));
        }
    }

    private static void await(Future<?> writing) {
        try {
            writing.get();
        } catch (ExecutionException failure) {
            if (failure.getCause() instanceof RuntimeException cause) {
                throw cause;
            }
            throw new IllegalStateException(failure.getCause());
        } catch (InterruptedException stopped) {
            Thread.currentThread().interrupt();
            throw new CancellationException("stopped while results were written");
        }
    }
}
