package stirwright.console.internal;

import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/**
 * Stands here for the help and for wrong use: {@code stirwright open STUDY} goes to the window before the command line
 * hears of it.
 */
@Command(name = "open", description = "Opens the window, with a study if you name one.")
final class OpenCommand implements Callable<Integer> {
    private final Desk desk;

    @Parameters(paramLabel = "STUDY", arity = "0..1", description = "the study's file")
    private String study;

    OpenCommand(Desk desk) {
        this.desk = desk;
    }

    @Override
    public Integer call() {
        return notHere(desk, study == null ? "open" : "open " + study);
    }

    /** Says how the window is opened, where {@code use} came with something that kept it from opening. */
    static int notHere(Desk desk, String use) {
        desk.err().println("The window opens with 'stirwright " + use + "' and nothing else on the line.");
        return ExitCode.UNUSABLE;
    }
}
