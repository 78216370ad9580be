package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import java.util.Arrays;
import java.util.List;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.osgi.framework.Bundle;
import org.osgi.framework.InvalidSyntaxException;

/** The engine and the command line need no window. */
class NoWindowTest {
    private static final Pattern WINDOW = Pattern.compile("org\\.eclipse\\.(swt|jface|e4|ui|swtchart|nebula)(\\..*)?");
    private static final String APPLICATION = "(service.pid=stirwright.console.application)";

    @Test
    void nothingOfAWindowIsInstalled() {
        List<String> bundles = Arrays.stream(Framework.context().getBundles()).map(Bundle::getSymbolicName)
                .filter(name -> WINDOW.matcher(name).matches()).toList();
        assertEquals(List.of(), bundles);
    }

    @Test
    void theLibraryHoldsFamilies() {
        assertFalse(Framework.catalogue().families().isEmpty());
        assertEquals(List.of(), Framework.catalogue().problems());
    }

    @Test
    void theCommandLineIsReadyToRun() throws InvalidSyntaxException {
        Bundle console = Framework.installed("stirwright.console");
        assertNotEquals(Bundle.INSTALLED, console.getState(), "stirwright.console is not resolved");
        assertEquals(1, Framework.context()
                .getAllServiceReferences("org.osgi.service.application.ApplicationDescriptor", APPLICATION).length);
    }
}
