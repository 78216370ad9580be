package stirwright.console.internal;

import java.io.IOException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;
import stirwright.conformance.JarRefusedException;
import stirwright.conformance.JarReport;

@Command(name = "check",
        description = "Runs the conformance suite over a jar that contributes correlations. The jar's code runs with"
                + " the rights of this program: check only what you trust.")
final class CheckCommand implements Callable<Integer> {
    private final Desk desk;

    @Parameters(paramLabel = "JAR", description = "an OSGi bundle with a Contribution service")
    private Path jar;

    CheckCommand(Desk desk) {
        this.desk = desk;
    }

    @Override
    public Integer call() {
        JarReport report;
        try {
            report = desk.jarCheck().check(jar);
        } catch (JarRefusedException refused) {
            desk.err().println(refused.getMessage());
            return ExitCode.UNUSABLE;
        } catch (NoSuchFileException missing) {
            desk.err().println(jar + ": there is no such file");
            return ExitCode.UNUSABLE;
        } catch (IOException unreadable) {
            desk.err().println(jar + " cannot be read: " + unreadable.getMessage());
            return ExitCode.UNUSABLE;
        }
        StringBuilder text = new StringBuilder();
        report.findings().forEach(f -> Columns.appendWrapped(text, "", f.toString(), CaseView.WIDTH));
        Columns.appendWrapped(text, "", report.bundle() + ": " + count(report.families().size(), "family", "families") + ", "
                + count(report.correlations().size(), "correlation", "correlations") + ", "
                + count(report.rows(), "reference row", "reference rows") + " compared"
                + (report.recalledRows() > 0 ? ", " + report.recalledRows() + " of them recalled; " : "; ")
                + (report.passed() ? "it conforms." : count(report.findings().size(), "finding", "findings") + "."),
                CaseView.WIDTH);
        desk.out().print(text);
        desk.out().flush();
        return report.passed() ? ExitCode.OK : ExitCode.FLAGGED;
    }

    private static String count(int number, String one, String many) {
        return number + " " + (number == 1 ? one : many);
    }
}
