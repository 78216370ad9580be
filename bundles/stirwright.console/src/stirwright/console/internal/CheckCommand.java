package stirwright.console.internal;

import java.io.IOException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;
import stirwright.conformance.BundleReport;
import stirwright.conformance.JarRefusedException;

@Command(name = "check",
        description = "Runs the conformance suite over a jar that contributes correlations, or over all that is installed,"
                + " and prints for each correlation what its numbers were compared with. A jar's code runs with the"
                + " rights of this program: check only what you trust.")
final class CheckCommand implements Callable<Integer> {
    private final Desk desk;

    @Parameters(paramLabel = "JAR", arity = "0..1",
            description = "an OSGi bundle with a Contribution service; without it everything installed")
    private Path jar;

    CheckCommand(Desk desk) {
        this.desk = desk;
    }

    @Override
    public Integer call() {
        List<BundleReport> reports;
        try {
            reports = jar == null ? desk.installedCheck().get() : List.of(desk.jarCheck().check(jar));
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
        reports.forEach(report -> ProofView.append(text, report));
        desk.out().print(text);
        desk.out().flush();
        return reports.stream().allMatch(BundleReport::passed) ? ExitCode.OK : ExitCode.FLAGGED;
    }
}
