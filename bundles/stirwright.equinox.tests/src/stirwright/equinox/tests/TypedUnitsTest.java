package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import org.junit.jupiter.api.Test;
import org.osgi.framework.Bundle;
import stirwright.exchange.CaseFields;
import stirwright.exchange.TypedNumber;

/** The units library finds its own services where bundles are apart, whichever thread asks. */
class TypedUnitsTest {

    @Test
    void unitsAreReadInsideAFramework() {
        assertNotEquals(Bundle.INSTALLED, Framework.installed("tech.units.indriya").getState());
        assertEquals(new TypedNumber.Value(1350, "g/cm3"), TypedNumber.read("1.35 g/cm3", CaseFields.DENSITY));
        // 300/pi rev/min
        assertEquals(new TypedNumber.Value(95.492965855137201, "rad/s"),
                TypedNumber.read("10 rad/s", CaseFields.SPEED_RPM));
    }

    @Test
    void evenOnAThreadWithoutAClassLoader() {
        Thread thread = Thread.currentThread();
        ClassLoader before = thread.getContextClassLoader();
        thread.setContextClassLoader(null);
        try {
            assertEquals(new TypedNumber.Value(1.5, "rpm"), TypedNumber.read("90 rpm", CaseFields.SPEED_REV_S));
        } finally {
            thread.setContextClassLoader(before);
        }
    }
}
