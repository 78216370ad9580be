package stirwright.console.internal;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import stirwright.exchange.Demo;
import stirwright.exchange.UnusableFileException;

@Command(name = "demo", description = "Cross-checks an invented scenario and keeps its files, to start from.")
final class DemoCommand implements Callable<Integer> {
    private final Desk desk;

    @Option(names = "--window", description = "opens the demo study in the window; takes nothing beside it")
    private boolean window;

    DemoCommand(Desk desk) {
        this.desk = desk;
    }

    @Override
    public Integer call() {
        if (window) {
            return OpenCommand.notHere(desk, "demo --window");
        }
        Path temporary = Path.of(System.getProperty("java.io.tmpdir"));
        Path folder;
        try {
            folder = new DemoFolder(temporary, System.getProperty("user.name")).make();
        } catch (IOException unwritable) {
            throw new UnusableFileException(temporary, "cannot be written: " + unwritable.getMessage(), unwritable);
        }
        Demo.copyTo(folder);
        new CrosscheckRun(desk).run(folder.resolve(Demo.TABLE), List.of(folder.resolve("results.csv"), folder.resolve("results.json")),
                List.of(folder.resolve("candidates.csv")));
        desk.out().println("Everything in this demo is invented. Its files, to start from: " + folder);
        desk.out().flush();
        return ExitCode.OK;
    }
}
