package stirwright.console.internal;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.Stream;
import stirwright.core.Status;
import stirwright.exchange.CurveFits;
import stirwright.exchange.CurveImport;
import stirwright.exchange.CurveSource;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.MeasuredCurve;
import stirwright.exchange.Output;
import stirwright.exchange.SampleFits;
import stirwright.exchange.UnusableFileException;
import stirwright.rheology.FitOptions;

/** Reads files of flow curves, fits every model to each curve, prints and writes what comes out. */
final class FitRun {

    /** From so many points on one curve is work to be waited for. */
    private static final int MANY_POINTS = 2000;

    private final Desk desk;
    private final ImportChoice choice;
    private final FitOptions options;
    private final OptionalDouble staticYield;
    private boolean unusable;

    FitRun(Desk desk, ImportChoice choice, FitOptions options, OptionalDouble staticYield) {
        this.desk = desk;
        this.choice = choice;
        this.options = options;
        this.staticYield = staticYield;
    }

    /** @return the exit code: a file that cannot be used stops none of the others, and is told by the code */
    int run(List<Path> files, List<Output<CurveFits>> outputs) {
        List<MeasuredCurve> curves = new ArrayList<>();
        Set<String> labels = new HashSet<>();
        for (Path file : new LinkedHashSet<>(files)) {
            try {
                read(file).forEach(curve -> curves.add(unique(curve, file, labels)));
            } catch (UnusableFileException problem) {
                desk.err().println(problem.getMessage());
                unusable = true;
            }
        }
        if (curves.isEmpty()) {
            return ExitCode.UNUSABLE;
        }
        List<CurveFits> fits = fit(curves);
        List<SampleFits> samples = SampleFits.of(fits, options, staticYield);
        List<CurveFits> all = Stream.concat(fits.stream(), samples.stream().flatMap(s -> s.temperatures().stream())
                .flatMap(t -> t.pooled().stream())).toList();
        for (Output<CurveFits> output : outputs) {
            all.forEach(output::add);
            output.finish();
        }
        new FitView(desk.out()).print(all, samples);
        return unusable ? ExitCode.UNUSABLE : ExitCode.of(fits.stream().map(CurveFits::status).reduce(Status.OK, Status::worseOf));
    }

    private List<MeasuredCurve> read(Path file) {
        CurveImport read;
        try (Waiting reading = new Waiting(desk.err(), "reading " + file)) {
            read = CurveImport.of(CurveSource.file(file), choice);
        }
        read.report().forEach(desk.err()::println);
        return read.requireCurves();
    }

    /** Files of the same name in two folders call their curves alike; the result tells them apart by the files. */
    private static MeasuredCurve unique(MeasuredCurve curve, Path file, Set<String> labels) {
        String label = curve.label();
        if (labels.contains(label)) {
            label = label + " of " + file;
        }
        for (int i = 2; !labels.add(label); i++) {
            label = curve.label() + " of " + file + " (" + i + ")";
        }
        return new MeasuredCurve(label, curve.points(), curve.measurement());
    }

    private List<CurveFits> fit(List<MeasuredCurve> curves) {
        if (curves.stream().anyMatch(c -> c.points().size() > MANY_POINTS)) {
            int points = curves.stream().mapToInt(c -> c.points().size()).sum();
            try (Waiting fitting = new Waiting(desk.err(), "fitting " + points + " points")) {
                return curves.stream().map(curve -> CurveFits.of(curve, options)).toList();
            }
        }
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
