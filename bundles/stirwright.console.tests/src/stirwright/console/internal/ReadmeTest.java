package stirwright.console.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The README's worked example shows what the program really prints. */
class ReadmeTest {

    @TempDir
    private Path folder;

    @Test
    void exampleIsTrue() throws IOException {
        String readme = Files.readString(readme());
        Path table = folder.resolve("mud.csv");
        Files.writeString(table, block(readme, "csv"));
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        int code = Commands.run(new Desk(() -> CommandLineTest.CATALOGUE, jar -> {
            throw new AssertionError("no jar here");
        }, List::of, List::of, new FakeDoor(), new PrintWriter(out), new PrintWriter(err), "0"), "crosscheck", table.toString());
        assertEquals(block(readme, "text").strip(), out.toString().strip());
        assertTrue(readme.contains("exit code " + code), "exit code " + code);
    }

    private static Path readme() {
        Path folder = Path.of("").toAbsolutePath();
        while (!Files.exists(folder.resolve("README.md"))) {
            folder = folder.getParent();
        }
        return folder.resolve("README.md");
    }

    private static String block(String text, String language) {
        Matcher fence = Pattern.compile("(?s)```" + language + "\n(.*?)```").matcher(text);
        assertTrue(fence.find(), "a block of " + language);
        return fence.group(1);
    }
}
