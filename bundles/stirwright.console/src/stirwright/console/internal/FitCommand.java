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
import stirwright.exchange.CurveImport;
import stirwright.exchange.CurveSource;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.MeasuredCurve;
import stirwright.exchange.Origin;
import stirwright.exchange.Output;
import stirwright.exchange.Outputs;
import stirwright.rheology.FitOptions;
import stirwright.rheology.Objective;

@Command(name = "fit",
        description = "Fits every fluid model to flow curves by least squares of the relative error, ranks them and prints"
                + " their parameters with 95 % intervals.")
final class FitCommand implements Callable<Integer> {
    private final Desk desk;

    @Parameters(paramLabel = "FILE", arity = "1..*", description = "a text or workbook with one flow curve or many")
    private List<Path> files = new ArrayList<>();

    @Option(names = "--out", paramLabel = "FILE", description = "also write the fit table; .csv or .json; may be repeated")
    private List<Path> outputs = new ArrayList<>();

    @Option(names = "--robust", description = "let points far off count less")
    private boolean robust;

    FitCommand(Desk desk) {
        this.desk = desk;
    }

    @Override
    public Integer call() {
        List<MeasuredCurve> curves = new ArrayList<>();
        for (Path file : files) {
            CurveImport read = CurveImport.of(CurveSource.file(file), ImportChoice.DETECT);
            read.report().forEach(desk.err()::println);
            curves.addAll(read.requireCurves());
        }
        FitOptions options = new FitOptions(Objective.RELATIVE, robust);
        Progress progress = new Progress(desk.err(), "curves", curves.size());
        List<CurveFits> fits = new ArrayList<>();
        for (MeasuredCurve curve : curves) {
            fits.add(CurveFits.of(curve, options));
            progress.reached(fits.size());
        }
        progress.done();
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
