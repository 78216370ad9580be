package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.stream.Stream;
import org.junit.jupiter.api.function.Executable;
import stirwright.core.Refusal;

/** What every refusal has to be: the column, the value as typed, and words that help, on one line. */
final class Refusals {

    private Refusals() {}

    static void assertRefused(CaseEntry entry, String field, String value, String... words) {
        Refusal refusal = entry.refusal().orElseThrow(() -> new AssertionError(entry.name() + " is not refused"));
        assertAll(
                () -> assertEquals(field, refusal.field()),
                () -> assertEquals(value, refusal.value()),
                () -> assertHelps(refusal.reason(), words),
                () -> assertTrue(entry.spec().isEmpty()));
    }

    static void assertAccepted(CaseEntry entry) {
        assertEquals("", entry.refusal().map(Refusal::words).orElse(""));
        assertTrue(entry.spec().isPresent());
    }

    static void assertUnusable(Executable read, String... words) {
        assertHelps(assertThrows(UnusableFileException.class, read).getMessage(), words);
    }

    private static void assertHelps(String message, String... words) {
        assertFalse(message.contains("\n"), message);
        Stream.of(words).forEach(w -> assertTrue(message.contains(w), () -> "'" + w + "' is not in: " + message));
    }
}
