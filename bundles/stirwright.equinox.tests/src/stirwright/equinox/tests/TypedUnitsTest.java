package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.osgi.framework.Bundle;
import stirwright.exchange.CaseFields;
import stirwright.exchange.TypedNumber;

/** The units library finds what it needs where bundles are apart, even for a thread that has no class loader. */
class TypedUnitsTest {
    private final ClassLoader before = Thread.currentThread().getContextClassLoader();

    @BeforeEach
    void takeTheClassLoader() {
        Thread.currentThread().setContextClassLoader(null);
    }

    @AfterEach
    void giveItBack() {
        Thread.currentThread().setContextClassLoader(before);
    }

    @Test
    void theLibraryIsResolved() {
        for (String name : new String[] {"tech.units.indriya", "javax.measure.unit-api", "uom-lib-common"}) {
            assertNotEquals(Bundle.INSTALLED, Framework.installed(name).getState(), name + " is not resolved");
        }
    }

    @Test
    void unitsAreReadInsideAFramework() {
        assertEquals(new TypedNumber.Value(1350, "g/cm3"), TypedNumber.read("1.35 g/cm3", CaseFields.DENSITY));
        assertEquals(new TypedNumber.Value(1.5, "rpm"), TypedNumber.read("90 rpm", CaseFields.SPEED_REV_S));
        // 300/pi rev/min
        assertEquals(new TypedNumber.Value(95.492965855137201, "rad/s"), TypedNumber.read("10 rad/s", CaseFields.SPEED_RPM));
    }

    @Test
    void wrongUnitsAreNamedInsideAFramework() {
        assertEquals(new TypedNumber.Problem("density: '5 kg' is a mass; a density is expected: kg/m3, g/cm3, g/L, lb/ft3"),
                TypedNumber.read("5 kg", CaseFields.DENSITY));
    }
}
