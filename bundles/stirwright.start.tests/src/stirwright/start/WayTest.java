package stirwright.start;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class WayTest {

    @ParameterizedTest
    @ValueSource(strings = {"", "open", "open|mud.study", "open|a study.study", "demo|--window"})
    void windowIsForWhatItCanOpen(String line) {
        assertEquals(Way.WINDOW, Way.of(split(line)));
    }

    @ParameterizedTest
    @ValueSource(strings = {"help", "--version", "--help", "demo", "demo|--window|more", "open|--help", "open|a|b",
        "crosscheck|open", "Open", "demo|window"})
    void everythingElseIsForTheCommandLine(String line) {
        assertEquals(Way.CONSOLE, Way.of(split(line)));
    }

    @Test
    void anEmptyArgumentIsNotTheSameAsNone() {
        assertEquals(Way.CONSOLE, Way.of(""));
    }

    @Test
    void windowNeedsADisplayOnLinuxAlone() {
        Optional<String> obstacle = Way.WINDOW.obstacle("Linux", Map.of("DISPLAY", ""));
        assertTrue(obstacle.orElseThrow().contains("'stirwright help'"), obstacle::toString);
        assertEquals(1, obstacle.orElseThrow().lines().count());
        assertEquals(Optional.empty(), Way.WINDOW.obstacle("Linux", Map.of("DISPLAY", ":0")));
        assertEquals(Optional.empty(), Way.WINDOW.obstacle("Linux", Map.of("WAYLAND_DISPLAY", "wayland-0")));
        assertEquals(Optional.empty(), Way.WINDOW.obstacle("Mac OS X", Map.of()));
        assertEquals(Optional.empty(), Way.WINDOW.obstacle("Windows 11", Map.of()));
        assertEquals(Optional.empty(), Way.CONSOLE.obstacle("Linux", Map.of()));
    }

    private static String[] split(String line) {
        return line.isEmpty() ? new String[0] : line.split("\\|");
    }
}
