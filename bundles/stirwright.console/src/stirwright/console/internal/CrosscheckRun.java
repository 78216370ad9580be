package stirwright.console.internal;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import stirwright.core.CaseResult;
import stirwright.core.Catalogue;
import stirwright.core.CrossCheck;
import stirwright.core.Status;
import stirwright.exchange.CaseEntry;
import stirwright.exchange.CaseTable;
import stirwright.exchange.Origin;
import stirwright.exchange.Output;
import stirwright.exchange.Outputs;

/** Reads a case table, checks its cases on all cores in their order, prints and writes the results. */
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
            Status worst = check(table, new CrossCheck(catalogue), outputs);
            outputs.forEach(Output::finish);
            return worst;
        } finally {
            outputs.forEach(Output::close);
        }
    }

    private Status check(CaseTable table, CrossCheck crossCheck, List<Output<CaseResult>> outputs) {
        CaseView view = new CaseView(desk.out());
        Summary summary = new Summary();
        Progress progress = new Progress(desk.err(), "cases", table.entries().size());
        Status worst = Status.OK;
        List<CaseEntry> entries = table.entries();
        for (int from = 0; from < entries.size(); from += BLOCK) {
            List<CaseEntry> block = entries.subList(from, Math.min(from + BLOCK, entries.size()));
            List<CaseResult> results = block.parallelStream().map(e -> e.check(crossCheck)).toList();
            for (int i = 0; i < block.size(); i++) {
                CaseResult result = results.get(i);
                view.print(block.get(i), result);
                outputs.forEach(o -> o.add(result));
                summary.add(block.get(i), result);
                worst = worst.worseOf(result.status());
            }
            reportRefusals(table.fileName(), block, results);
            progress.reached(from + block.size());
        }
        progress.done();
        summary.print(desk.out());
        return worst;
    }

    private void reportRefusals(String fileName, List<CaseEntry> block, List<CaseResult> results) {
        for (int i = 0; i < block.size(); i++) {
            CaseEntry entry = block.get(i);
            results.get(i).refusal().ifPresent(r ->
                    desk.err().println(fileName + " line " + entry.line() + " (case '" + entry.name() + "'): " + r.words()));
        }
    }
}
