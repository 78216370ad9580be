package stirwright.trust;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class UserFolderTest {

    private static Path folder(String system, Map<String, String> variables) {
        Map<String, String> properties = Map.of("os.name", system, "user.home", "/home/ada");
        return UserFolder.of(properties::get, variables::get);
    }

    @ParameterizedTest
    @CsvSource({"Linux, /home/ada/.config/stirwright", "FreeBSD, /home/ada/.config/stirwright",
            "Mac OS X, /home/ada/Library/Application Support/Stirwright",
            "Windows 11, /home/ada/AppData/Roaming/Stirwright"})
    void eachSystemHasItsPlace(String system, String expected) {
        assertEquals(Path.of(expected), folder(system, Map.of()));
    }

    @Test
    void theEnvironmentMovesIt() {
        assertEquals(Path.of("/settings/stirwright"), folder("Linux", Map.of("XDG_CONFIG_HOME", "/settings")));
        assertEquals(Path.of("/roaming/Stirwright"), folder("Windows 11", Map.of("APPDATA", "/roaming")));
    }

    @Test
    void aFolderThatIsNotAbsoluteIsIgnored() {
        assertEquals(Path.of("/home/ada/.config/stirwright"), folder("Linux", Map.of("XDG_CONFIG_HOME", "settings")));
        assertEquals(Path.of("/home/ada/.config/stirwright"), folder("Linux", Map.of("XDG_CONFIG_HOME", "")));
    }

    @Test
    void thePropertyGoesFirst() {
        Map<String, String> properties = Map.of("stirwright.settings", "/elsewhere", "os.name", "Linux", "user.home", "/h");
        assertEquals(Path.of("/elsewhere"), UserFolder.of(properties::get, Map.of("XDG_CONFIG_HOME", "/settings")::get));
    }
}
