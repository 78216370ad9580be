package stirwright.console.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.io.Writer;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import stirwright.trust.Approval;
import stirwright.trust.DropIn.State;

/** The command that approves, and what other commands tell of the drop-in folder. */
class TrustCommandTest {
    private final FakeDoor door = new FakeDoor();
    private final StringWriter out = new StringWriter();
    private final StringWriter err = new StringWriter();

    private int run(String... arguments) {
        return Commands.run(new Desk(() -> CommandLineTest.CATALOGUE, jar -> {
            throw new AssertionError("nothing is checked");
        }, List::of, List::of, door, new PrintWriter(out), new PrintWriter(err, true), "0"), arguments);
    }

    @Test
    void showsWhatItApproves() {
        assertEquals(0, run("trust", "some.jar"));
        for (String part : List.of("invented.family 1.0.0", FakeDoor.HASH, "all rights")) {
            assertTrue(out.toString().contains(part), out.toString());
        }
        assertEquals(List.of(FakeDoor.HASH), door.approved.stream().map(Approval::sha256).toList());
        assertEquals("", err.toString());
    }

    @Test
    void aFileThatIsNoBundleIsRefused() {
        assertEquals(3, run("trust", "notes.txt"));
        assertEquals("notes.txt is not a jar", err.toString().strip());
        assertEquals(List.of(), door.approved);
    }

    @Test
    void forgetsByFileAndByHash() {
        for (String given : List.of("some.jar", FakeDoor.HASH)) {
            run("trust", "some.jar");
            assertEquals(0, run("trust", "--forget", given), err::toString);
            assertEquals(List.of(), door.approved);
        }
        assertEquals(3, run("trust", "--forget", "some.jar"));
        assertTrue(err.toString().contains("neither approved nor declined"), err.toString());
        assertEquals(3, run("trust", "--forget", "notes.txt"));
    }

    @Test
    void declinesByFile() {
        assertEquals(0, run("trust", "--decline", "some.jar"));
        assertEquals(List.of(FakeDoor.HASH), door.declined);
    }

    @Test
    void listShowsBothLists() {
        run("trust", "some.jar");
        door.list.add(FakeDoor.dropIn("families/a.jar", State.RUNNING, ""));
        door.list.add(FakeDoor.dropIn("families/b.jar", State.UNUSABLE, "is not a jar"));
        assertEquals(0, run("trust", "--list"));
        for (String part : List.of("2030-01-31  invented.family 1.0.0", "running   a.jar", "unusable  b.jar", "is not a jar")) {
            assertTrue(out.toString().contains(part), out.toString());
        }
    }

    @Test
    void everyRunTellsWhatAsksAndWhatIsUnusable() {
        door.list.add(FakeDoor.dropIn("families/a b.jar", State.ASKS, ""));
        door.list.add(FakeDoor.dropIn("families/c.jar", State.UNUSABLE, "is not a jar"));
        door.list.add(FakeDoor.dropIn("families/d.jar", State.DECLINED, ""));
        door.list.add(FakeDoor.dropIn("families/e.jar", State.RUNNING, ""));
        door.problems.add("approved.txt, line 2: is damaged");
        assertEquals(0, run("--version"));
        List<String> lines = err.toString().lines().toList();
        assertEquals(3, lines.size(), err.toString());
        assertTrue(lines.get(0).contains("line 2"), lines.get(0));
        assertTrue(lines.get(1).endsWith("stirwright trust 'families/a b.jar'"), lines.get(1));
        assertEquals("families/c.jar: is not a jar", lines.get(2));
        assertEquals("Stirwright 0", out.toString().strip(), "results alone go to standard output");
    }

    @Test
    void aFileToNameIsOneWordOfEachShell() {
        assertEquals("a.jar", Door.quoted("a.jar", false));
        assertEquals("'it'\\''s.jar'", Door.quoted("it's.jar", false));
        assertEquals("\"C:\\My jars\\it's.jar\"", Door.quoted("C:\\My jars\\it's.jar", true));
    }

    @Test
    void nothingOfAJarReachesTheTerminalRaw() {
        String odd = "families/a\u001b[2J\u009b.jar";
        door.list.add(FakeDoor.dropIn(odd, State.UNUSABLE, "is \u001b[31m no jar"));
        door.list.add(FakeDoor.dropIn(odd, State.ASKS, ""));
        run("--version");
        run("trust", "--list");
        run("trust", "notes\u001b.txt");
        for (String text : List.of(out.toString(), err.toString())) {
            assertTrue(text.contains("\uFFFD") && text.codePoints().noneMatch(c -> c != '\n' && Character.isISOControl(c)), text);
        }
    }

    @Test
    void resultsThatCannotBeWrittenAreTold() {
        PrintWriter full = new PrintWriter(new Writer() {
            @Override
            public void write(char[] text, int from, int length) throws IOException {
                throw new IOException("no space left");
            }

            @Override
            public void flush() {
                // Nothing was taken.
            }

            @Override
            public void close() {
                // Holds nothing.
            }
        });
        Desk desk = new Desk(() -> CommandLineTest.CATALOGUE, jar -> null, List::of, List::of, door, full, new PrintWriter(err, true), "0");
        for (String line : List.of("trust --list", "--version", "--help")) {
            assertEquals(3, Commands.run(desk, line.split(" ")), line);
            assertTrue(err.toString().contains("standard output"), err.toString());
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"trust", "trust a.jar b.jar", "trust a.jar --list", "trust --forget", "trust --nonsense"})
    void wrongUseExitsWithThree(String line) {
        assertEquals(3, run(line.split(" ")));
        assertEquals("", out.toString());
        assertEquals(1, err.toString().lines().count(), err.toString());
        assertEquals(List.of(), door.approved);
    }
}
