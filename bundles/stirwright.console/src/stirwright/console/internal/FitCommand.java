package stirwright.console.internal;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import stirwright.core.Status;
import stirwright.exchange.CurveFits;
import stirwright.exchange.FlowCurveFile;
import stirwright.exchange.Origin;
import stirwright.exchange.Output;
import stirwright.exchange.Outputs;

@Command(name = "fit",
        description = "Fits a power law and a Herschel-Bulkley fluid to flow curves (columns shear rate and stress),"
                + " by least squares of the relative error.")
final class FitCommand implements Callable<Integer> {
    private final Desk desk;

    @Parameters(paramLabel = "FILE", arity = "1..*", description = "a table of shear rate in 1/s and shear stress in Pa")
    private List<Path> files = new ArrayList<>();

    @Option(names = "--out", paramLabel = "FILE", description = "also write the fit table; .csv or .json; may be repeated")
    private List<Path> outputs = new ArrayList<>();

    FitCommand(Desk desk) {
        this.desk = desk;
    }

    @Override
    public Integer call() {
        List<CurveFits> fits = new ArrayList<>();
        for (Path file : files) {
            FlowCurveFile read = FlowCurveFile.read(file);
            read.messages().forEach(desk.err()::println);
            read.curves().forEach(curve -> fits.add(CurveFits.of(curve)));
        }
        Outputs written = new Outputs(new Origin(desk.version(), ""), files);
        for (Path file : outputs) {
            try (Output<CurveFits> output = written.fits(file)) {
                fits.forEach(output::add);
                output.finish();
            }
        }
        new FitView(desk.out()).print(fits);
        return ExitCode.of(fits.stream().map(CurveFits::status).reduce(Status.OK, Status::worseOf));
    }
}
