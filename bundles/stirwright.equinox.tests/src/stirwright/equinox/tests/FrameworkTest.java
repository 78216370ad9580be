package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;

import org.junit.jupiter.api.Test;
import org.osgi.framework.Bundle;

/** The framework that the other tests rely on. */
class FrameworkTest {

    @Test
    void declarativeServicesAreLive() {
        assertEquals(Bundle.ACTIVE, Framework.installed("org.apache.felix.scr").getState());
        assertNotNull(Framework.context().getServiceReference("org.osgi.service.component.runtime.ServiceComponentRuntime"));
    }

    @Test
    void theCoreResolves() {
        assertNotEquals(Bundle.INSTALLED, Framework.installed("stirwright.core").getState(), "stirwright.core is not resolved");
    }
}
