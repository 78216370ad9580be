package stirwright.console.internal;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Help.Ansi;
import picocli.CommandLine.IExecutionExceptionHandler;
import picocli.CommandLine.IParameterExceptionHandler;
import stirwright.exchange.UnusableFileException;

/** All commands, and what happens when one cannot go on: one line, an exit code, no stack trace. */
final class Commands {

    /** The root: without a command it says what there is, where no window opened before it was asked. */
    @Command(name = "stirwright", usageHelpWidth = 100, descriptionHeading = "%n", commandListHeading = "%nCommands:%n",
            description = "From a flow curve and a vessel to a defended choice of correlation: shear rate, power,"
                    + " torque and pumping by every correlation that is installed, side by side. Alone it opens the"
                    + " window; with a command it needs no display.",
            footerHeading = "%n",
            footer = {
                "Exit code: 0 all ok, 1 something flagged, 2 something refused, 3 the command line or a file could not"
                        + " be used. Results go to standard output, messages to standard error.",
                "'stirwright help tables' describes the case table and the result tables."
            })
    static final class Root {}

    private Commands() {}

    static int run(Desk desk, String... arguments) {
        CommandLine line = new CommandLine(new Root())
                .addSubcommand(new OpenCommand(desk))
                .addSubcommand(new CrosscheckCommand(desk))
                .addSubcommand(new CandidatesCommand(desk))
                .addSubcommand(new CardsCommand(desk))
                .addSubcommand(new FitCommand(desk))
                .addSubcommand(new DemoCommand(desk))
                .addSubcommand(new CheckCommand(desk))
                .addSubcommand(new TrustCommand(desk))
                .addSubcommand(new HelpCommand(desk));
        // Who decides on a jar need not be told that it asks.
        Door door = new Door(desk.dropIns());
        (arguments.length > 0 && arguments[0].equals(TrustCommand.NAME) ? door.problems() : door.news())
                .forEach(news -> desk.err().println(Plain.line(news)));
        line.setOut(desk.out()).setErr(desk.err())
                .setColorScheme(CommandLine.Help.defaultColorScheme(Ansi.OFF))
                .setExpandAtFiles(false)
                .setParameterExceptionHandler(wrongUse(desk))
                .setExecutionExceptionHandler(stopped(desk));
        int code = execute(line, desk, arguments);
        if (desk.out().checkError()) {
            desk.err().println("standard output cannot be written, so results are missing there; is the disk full?");
            return ExitCode.UNUSABLE;
        }
        return code;
    }

    private static int execute(CommandLine line, Desk desk, String... arguments) {
        if (arguments.length == 1 && arguments[0].equals("--version")) {
            desk.out().println("Stirwright " + desk.version());
            return ExitCode.OK;
        }
        boolean asksForHelp = arguments.length == 0
                || arguments.length == 1 && (arguments[0].equals("--help") || arguments[0].equals("-h"));
        return asksForHelp ? line.execute("help") : line.execute(arguments);
    }

    private static IParameterExceptionHandler wrongUse(Desk desk) {
        return (problem, arguments) -> {
            String command = problem.getCommandLine().getCommandName();
            desk.err().println(problem.getMessage() + "; see 'stirwright help"
                    + (command.equals("stirwright") ? "" : " " + command) + "'");
            return ExitCode.UNUSABLE;
        };
    }

    private static IExecutionExceptionHandler stopped(Desk desk) {
        return (problem, line, parsed) -> {
            if (problem instanceof UnusableFileException unusable) {
                desk.err().println(unusable.getMessage());
            } else {
                desk.err().println("Stirwright stopped on a defect of its own: " + problem
                        + ". Nothing was changed. Please report it" + kept(problem));
            }
            return ExitCode.UNUSABLE;
        };
    }

    /** Keeps the details of a defect in a file, since they mean nothing to the user. */
    private static String kept(Exception problem) {
        try {
            Path file = Files.createTempFile("stirwright-defect-", ".txt");
            try (PrintWriter details = new PrintWriter(Files.newBufferedWriter(file, StandardCharsets.UTF_8))) {
                problem.printStackTrace(details);
            }
            return " with " + file + ".";
        } catch (IOException unwritable) {
            return "; its details could not be kept (" + unwritable.getMessage() + ").";
        }
    }
}
