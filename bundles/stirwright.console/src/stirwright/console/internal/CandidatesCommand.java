package stirwright.console.internal;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import stirwright.core.Catalogue;
import stirwright.exchange.Origin;
import stirwright.exchange.Outputs;

@Command(name = "candidates",
        description = "Lists the installed families and correlations with formula, source, range, standing and how"
                + " their digits were checked.")
final class CandidatesCommand implements Callable<Integer> {
    private final Desk desk;

    @Option(names = "--out", paramLabel = "FILE", description = "also write them; .csv or .json; may be repeated")
    private List<Path> outputs = new ArrayList<>();

    CandidatesCommand(Desk desk) {
        this.desk = desk;
    }

    @Override
    public Integer call() {
        Catalogue catalogue = desk.catalogue().get();
        desk.reportProblems(catalogue);
        Outputs files = new Outputs(new Origin(desk.version(), ""), List.of());
        outputs.forEach(f -> files.catalogue(f, catalogue));
        new CatalogueView(desk.out()).print(catalogue);
        return ExitCode.OK;
    }
}
