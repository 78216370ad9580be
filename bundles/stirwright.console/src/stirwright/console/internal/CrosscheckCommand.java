package stirwright.console.internal;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

@Command(name = "crosscheck",
        description = "Computes every case of a case table or a study with every correlation of its family and compares"
                + " them.")
final class CrosscheckCommand implements Callable<Integer> {
    private final Desk desk;

    @Parameters(paramLabel = "FILE", description = "a case table or a study (see 'stirwright help tables')")
    private Path file;

    @Option(names = "--out", paramLabel = "FILE",
            description = "also write the results; the ending decides: .csv or .json; may be repeated")
    private List<Path> outputs = new ArrayList<>();

    @Option(names = "--candidates", paramLabel = "FILE",
            description = "also write one row per case, quantity and correlation; .csv or .json")
    private List<Path> candidates = new ArrayList<>();

    CrosscheckCommand(Desk desk) {
        this.desk = desk;
    }

    @Override
    public Integer call() {
        return ExitCode.of(new CrosscheckRun(desk).run(file, outputs, candidates));
    }
}
