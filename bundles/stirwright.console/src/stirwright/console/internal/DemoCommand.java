package stirwright.console.internal;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import stirwright.exchange.UnusableFileException;

@Command(name = "demo", description = "Cross-checks an invented scenario and keeps its files, to start from.")
final class DemoCommand implements Callable<Integer> {
    private static final String TABLE = "glaze-slip.csv";

    private final Desk desk;

    DemoCommand(Desk desk) {
        this.desk = desk;
    }

    @Override
    public Integer call() {
        Path folder = Path.of(System.getProperty("java.io.tmpdir"), "stirwright-demo-" + System.getProperty("user.name"));
        Path table = folder.resolve(TABLE);
        try (InputStream in = DemoCommand.class.getResourceAsStream("/demo/" + TABLE)) {
            Files.createDirectories(folder);
            Files.copy(in, table, StandardCopyOption.REPLACE_EXISTING);
        } catch (IOException unwritable) {
            throw new UnusableFileException(table, "cannot be written: " + unwritable.getMessage(), unwritable);
        }
        new CrosscheckRun(desk).run(table, List.of(folder.resolve("results.csv"), folder.resolve("results.json")),
                List.of(folder.resolve("candidates.csv")));
        desk.out().println("Everything in this demo is invented. Its files, to start from: " + folder);
        desk.out().flush();
        return ExitCode.OK;
    }
}
