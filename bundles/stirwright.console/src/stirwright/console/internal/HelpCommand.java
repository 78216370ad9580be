package stirwright.console.internal;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

@Command(name = "help", description = "Says what the commands do; 'help tables' describes the tables and their columns.")
final class HelpCommand implements Callable<Integer> {
    private static final String TABLES = "tables";

    private final Desk desk;

    @Spec
    private CommandSpec spec;

    @Parameters(paramLabel = "TOPIC", arity = "0..1", description = "a command, or 'tables'")
    private String topic;

    HelpCommand(Desk desk) {
        this.desk = desk;
    }

    @Override
    public Integer call() {
        CommandLine root = spec.parent().commandLine();
        if (topic == null) {
            root.usage(desk.out());
        } else if (topic.equals(TABLES)) {
            desk.out().print(forTerminal(page("/help/tables.md")));
        } else if (root.getSubcommands().containsKey(topic)) {
            root.getSubcommands().get(topic).usage(desk.out());
        } else {
            throw new CommandLine.ParameterException(spec.commandLine(), "there is no help on '" + topic
                    + "', only on " + String.join(", ", root.getSubcommands().keySet()) + " and " + TABLES);
        }
        desk.out().flush();
        return ExitCode.OK;
    }

    /** The page as a terminal shows it: paragraphs broken to its width, rows of tables as entries. */
    private static String forTerminal(String page) {
        StringBuilder text = new StringBuilder();
        page.lines().filter(line -> !line.startsWith("|---")).forEach(line -> {
            boolean row = line.startsWith("|");
            Columns.appendWrapped(text, row ? "  " : "", row ? entry(line) : line, CaseView.WIDTH);
        });
        return text.toString();
    }

    /** "| name | unit | meaning |" as "name [unit] meaning". */
    private static String entry(String row) {
        String[] cells = row.substring(1, row.length() - 1).strip().split(" \\| ", 3);
        return cells.length < 3 ? String.join("  ", cells) : cells[0] + "  [" + cells[1].strip() + "]  " + cells[2].strip();
    }

    private static String page(String name) {
        try (InputStream in = HelpCommand.class.getResourceAsStream(name)) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }
}
