package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.io.InputStream;
import java.lang.reflect.InvocationTargetException;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The units library is touched only by who types a unit other than a field's own: here it is not even there. */
class UnitsWhenAskedTest {
    private static final String OURS = "stirwright.exchange.";
    private static final Set<String> LIBRARY = Set.of("javax.measure", "tech.units", "tech.uom");

    /** Loads this bundle's classes afresh, and finds no units library. */
    private static final class WithoutLibrary extends ClassLoader {
        WithoutLibrary() {
            super(UnitsWhenAskedTest.class.getClassLoader());
        }

        @Override
        protected Class<?> loadClass(String name, boolean resolve) throws ClassNotFoundException {
            if (LIBRARY.stream().anyMatch(name::startsWith)) {
                throw new ClassNotFoundException(name);
            }
            Class<?> loaded = findLoadedClass(name);
            return loaded != null ? loaded : name.startsWith(OURS) ? afresh(name) : super.loadClass(name, resolve);
        }

        private Class<?> afresh(String name) throws ClassNotFoundException {
            try (InputStream in = getParent().getResourceAsStream(name.replace('.', '/') + ".class")) {
                byte[] bytes = in.readAllBytes();
                return defineClass(name, bytes, 0, bytes.length);
            } catch (IOException unreadable) {
                throw new ClassNotFoundException(name, unreadable);
            }
        }
    }

    private static Object read(String typed) throws ReflectiveOperationException {
        ClassLoader loader = new WithoutLibrary();
        Object density = loader.loadClass(OURS + "CaseFields").getField("DENSITY").get(null);
        return loader.loadClass(OURS + "TypedNumber").getMethod("read", String.class, density.getClass())
                .invoke(null, typed, density);
    }

    @ParameterizedTest
    @ValueSource(strings = {"1350", "1350,5", "1350 kg/m3", "", "abc", "1,350", "1 350", "1e999"})
    void plainNumbersNeedNoLibrary(String typed) throws ReflectiveOperationException {
        assertEquals(TypedNumber.read(typed, CaseFields.DENSITY).toString(), read(typed).toString());
    }

    @Test
    void anotherUnitNeedsIt() {
        assertInstanceOf(NoClassDefFoundError.class,
                assertThrows(InvocationTargetException.class, () -> read("1.35 g/cm3")).getCause());
    }
}
