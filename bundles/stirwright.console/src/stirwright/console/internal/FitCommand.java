package stirwright.console.internal;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import stirwright.exchange.CurveFits;
import stirwright.exchange.DecimalSign;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.ImportTemplates;
import stirwright.exchange.Origin;
import stirwright.exchange.Output;
import stirwright.exchange.Outputs;
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

    @Option(names = "--decimal-sign", paramLabel = "SIGN",
            description = "point or comma, where the numbers do not tell (12.345 may be twelve thousand)")
    private String decimalSign;

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
        if (decimalSign != null) {
            choice = choice.withDecimalSign(Optional.of(sign()));
        }
        List<Path> inputs = new ArrayList<>(files);
        Optional.ofNullable(template).ifPresent(inputs::add);
        Outputs written = new Outputs(new Origin(desk.version(), ""), inputs);
        List<Output<CurveFits>> opened = new ArrayList<>();
        try {
            outputs.forEach(file -> opened.add(written.fits(file)));
            return new FitRun(desk, choice, new FitOptions(Objective.RELATIVE, robust),
                    staticYield == null ? OptionalDouble.empty() : OptionalDouble.of(staticYield)).run(files, opened);
        } finally {
            opened.forEach(Output::close);
        }
    }

    private DecimalSign sign() {
        return Arrays.stream(DecimalSign.values()).filter(s -> s.name().equalsIgnoreCase(decimalSign)).findFirst()
                .orElseThrow(() -> new UnusableFileException("--decimal-sign " + decimalSign, "must be point or comma"));
    }
}
