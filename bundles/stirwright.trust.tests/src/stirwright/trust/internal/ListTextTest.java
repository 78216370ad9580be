package stirwright.trust.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.time.LocalDate;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import stirwright.trust.Approval;

/** What a list says, and what it does not say. */
class ListTextTest {
    private static final String HASH = "0123456789abcdef".repeat(4);
    private static final String OTHER = "fedcba9876543210".repeat(4);

    private static ListText parse(String text) {
        return ListText.parse(text.getBytes(StandardCharsets.UTF_8));
    }

    @Test
    void aLineIsHashBundleAndDate() {
        ListText text = parse("# a comment\r\n\n" + HASH + "  example.family 1.0.0  2030-01-31\r\n");
        assertEquals(List.of(new Approval(HASH, "example.family 1.0.0", LocalDate.of(2030, 1, 31))), text.entries());
        assertEquals(List.of(), text.damaged());
        assertTrue(text.holds(HASH));
        assertFalse(text.holds(OTHER));
    }

    @Test
    void capitalsAreTheSameHash() {
        assertTrue(parse(HASH.toUpperCase() + " a 2030-01-31").holds(HASH));
    }

    @ParameterizedTest
    @ValueSource(strings = {"@", "@ a", "@ 2030-01-31", "@  2030-02-30 2030-02-30", "@ a 2030-13-01", "@ a 2030-01-31 b",
            " @ a 2030-01-31", "@a 2030-01-31", "0@ a 2030-01-31", "x a 2030-01-31", "@ a\u0000b 2030-01-31",
            "@ a\uFFFD 2030-01-31", "\uFEFF@ a 2030-01-31", "@ a 2030-01-3", "sha256:@ a 2030-01-31", "yes"})
    void aDamagedLineApprovesNothing(String form) {
        ListText text = parse("# head\n" + form.replace("@", HASH) + "\n" + OTHER + " b 2030-01-31\n");
        assertFalse(text.holds(HASH), form);
        assertEquals(List.of(2), text.damaged(), form);
        assertTrue(text.holds(OTHER), "the lines around it count");
    }

    @Test
    void aHashThatWasCutOffApprovesNothing() {
        for (int length = 1; length < HASH.length(); length++) {
            ListText text = parse(HASH.substring(0, length) + " a 2030-01-31\n");
            assertEquals(List.of(), text.entries());
            assertEquals(List.of(1), text.damaged());
        }
    }

    @Test
    void bytesThatAreNoTextAreADamagedLine() {
        byte[] content = (HASH + " \u00E9 2030-01-31\n").getBytes(StandardCharsets.ISO_8859_1);
        assertEquals(List.of(1), ListText.parse(content).damaged());
    }

    @Test
    void addingAndTakingOffKeepsWhatPeopleWrote() {
        ListText held = parse("# mine\nnonsense\n" + HASH + " a 2030-01-31\n");
        Approval added = new Approval(OTHER, "b\n 2.0.0", LocalDate.of(2031, 2, 3));
        String with = held.with(added, List.of("# head"));
        assertEquals("# mine\nnonsense\n" + HASH + " a 2030-01-31\n" + OTHER + "  b 2.0.0  2031-02-03\n", with);
        assertEquals("# mine\nnonsense\n" + OTHER + "  b 2.0.0  2031-02-03\n", parse(with).without(HASH));
        assertEquals("# head\n" + OTHER + "  b 2.0.0  2031-02-03\n", ListText.EMPTY.with(added, List.of("# head")));
    }
}
