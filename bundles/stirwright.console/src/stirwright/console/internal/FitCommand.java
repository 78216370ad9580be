package stirwright.console.internal;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.Stream;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import stirwright.core.Status;
import stirwright.exchange.CurveFits;
import stirwright.exchange.CurveImport;
import stirwright.exchange.CurveSource;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.ImportTemplates;
import stirwright.exchange.MeasuredCurve;
import stirwright.exchange.Origin;
import stirwright.exchange.Output;
import stirwright.exchange.Outputs;
import stirwright.exchange.SampleFits;
import stirwright.exchange.UnusableFileException;
import stirwright.rheology.FitOptions;
import stirwright.rheology.Objective;

@Command(name = "fit",
        description = "Fits every fluid model to flow curves by least squares of the relative error, ranks them and prints"
                + " their parameters with 95 %% intervals.")
final class FitCommand implements Callable<Integer> {
    private final Desk desk;

    @Parameters(paramLabel = "FILE", arity = "1..*", description = "a text or workbook with one flow curve or many")
    private List<Path> files = new ArrayList<>();

    @Option(names = "--out", paramLabel = "FILE", description = "also write the fit table; .csv or .json; may be repeated")
    private List<Path> outputs = new ArrayList<>();

    @Option(names = "--robust", description = "let points far off count less (Huber's estimate)")
    private boolean robust;

    @Option(names = "--template", paramLabel = "FILE",
            description = "read the files as this import template says, as the window keeps it; without, all is detected")
    private Path template;

    @Option(names = "--static-yield", paramLabel = "PA",
            description = "static yield stress in Pa, from a vane or a stress ramp after rest; widens the range of the yield stress")
    private Double staticYield;

    FitCommand(Desk desk) {
        this.desk = desk;
    }

    @Override
    public Integer call() {
        if (staticYield != null && !(staticYield >= 0 && Double.isFinite(staticYield))) {
            throw new UnusableFileException("--static-yield " + staticYield, "must be a finite number, 0 or greater, in Pa");
        }
        ImportChoice choice = template == null ? ImportChoice.DETECT : ImportTemplates.read(template);
        List<MeasuredCurve> curves = new ArrayList<>();
        for (Path file : files) {
            CurveImport read = CurveImport.of(CurveSource.file(file), choice);
            read.report().forEach(desk.err()::println);
            curves.addAll(read.requireCurves());
        }
        FitOptions options = new FitOptions(Objective.RELATIVE, robust);
        List<CurveFits> fits = fit(curves, options);
        List<SampleFits> samples = SampleFits.of(fits, options,
                staticYield == null ? OptionalDouble.empty() : OptionalDouble.of(staticYield));
        List<CurveFits> all = Stream.concat(fits.stream(), samples.stream().flatMap(s -> s.temperatures().stream())
                .flatMap(t -> t.pooled().stream())).toList();
        List<Path> inputs = new ArrayList<>(files);
        Optional.ofNullable(template).ifPresent(inputs::add);
        Outputs written = new Outputs(new Origin(desk.version(), ""), inputs);
        for (Path file : outputs) {
            try (Output<CurveFits> output = written.fits(file)) {
                all.forEach(output::add);
                output.finish();
            }
        }
        new FitView(desk.out()).print(all, samples);
        return ExitCode.of(fits.stream().map(CurveFits::status).reduce(Status.OK, Status::worseOf));
    }

    private List<CurveFits> fit(List<MeasuredCurve> curves, FitOptions options) {
        Progress progress = new Progress(desk.err(), "curves", curves.size());
        AtomicInteger done = new AtomicInteger();
        List<CurveFits> fits = curves.parallelStream().map(curve -> {
            CurveFits one = CurveFits.of(curve, options);
            progress.reached(done.incrementAndGet());
            return one;
        }).toList();
        progress.done();
        return fits;
    }
}
