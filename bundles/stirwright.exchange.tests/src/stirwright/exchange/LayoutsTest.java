package stirwright.exchange;

import static java.nio.charset.StandardCharsets.UTF_16LE;
import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.Charset;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import stirwright.rheology.FitOptions;
import stirwright.rheology.Fits;
import stirwright.rheology.FlowCurve;
import stirwright.rheology.FluidModel;
import stirwright.rheology.ModelKind;

/** The invented curve is the same curve, to the last bit, in every layout, language and encoding. */
class LayoutsTest {

    @TempDir
    Path folder;

    /** @param dropped points that the layout holds and nobody can use */
    record Written(String name, byte[] bytes, int curves, int dropped, int left) {
        @Override
        public String toString() {
            return name;
        }
    }

    static List<Written> all() {
        List<Written> all = new ArrayList<>();
        for (Tongue tongue : Tongue.values()) {
            for (Charset charset : List.of(UTF_8, UTF_16LE, Charset.forName("windows-1252"))) {
                text(all, "A", tongue, charset, Layouts::a, 2, 3, 15);
                text(all, "B", tongue, charset, Layouts::b, 2, 5, 0);
                text(all, "D", tongue, charset, Layouts::d, 1, 3, 0);
                text(all, "E", tongue, charset, Layouts::e, 2, 1, 0);
            }
            all.add(new Written("C " + tongue + ".xlsx", Layouts.c(tongue, false), 2, 0, 0));
            all.add(new Written("C " + tongue + " as text.xlsx", Layouts.c(tongue, true), 2, 0, 0));
        }
        return all;
    }

    private static void text(List<Written> into, String layout, Tongue tongue, Charset charset, Function<Tongue, String> writer,
            int curves, int dropped, int left) {
        into.add(new Written(layout + " " + tongue + " " + charset + ".txt", writer.apply(tongue).getBytes(charset), curves, dropped, left));
    }

    @ParameterizedTest
    @MethodSource("all")
    void theSameCurve(Written written) {
        CurveImport read = CurveFiles.read(folder, written.name(), written.bytes());
        assertEquals(written.curves(), read.requireCurves().size(), () -> String.join("\n", read.report()));
        assertCurve(InventedCurve.curve(InventedCurve.up()), read.curves().get(0));
        assertEquals(written.dropped(), read.counts().dropped(), () -> read.dropped().toString());
        assertEquals(written.left(), read.counts().left());
        assertTrue(read.counts().addUp(), read.counts().words());
        if (written.name().matches("[ABC].*")) {
            assertEquals(Ramp.UP, read.curves().get(0).measurement().ramp());
            assertEquals(Ramp.DOWN, read.curves().get(1).measurement().ramp());
            assertCurve(InventedCurve.curve(InventedCurve.down()), read.curves().get(1));
            assertEquals(25.1, read.curves().get(0).measurement().temperature(), 1e-9);
        }
        if (written.name().startsWith("E")) {
            assertTrue(read.curves().get(0).label().endsWith(" A up"), read.curves().get(0).label());
            assertEquals(1, read.curves().get(1).measurement().replicate());
            assertEquals(7, read.curves().get(1).points().size());
        }
        assertTrue(read.messages().stream().noneMatch(m -> m.weight() == ImportMessage.Weight.PROBLEM), read.messages().toString());
    }

    private static void assertCurve(FlowCurve expected, MeasuredCurve curve) {
        assertArrayEquals(expected.shearRates(), curve.points().shearRates());
        assertArrayEquals(expected.stresses(), curve.points().stresses());
        assertEquals(model(expected), model(curve.points()));
    }

    private static FluidModel model(FlowCurve curve) {
        return Fits.one(ModelKind.HERSCHEL_BULKLEY, curve, FitOptions.DEFAULT).model();
    }

    @ParameterizedTest
    @MethodSource("all")
    void theSourceIsNeverTouched(Written written) throws IOException {
        CurveImport read = CurveFiles.read(folder, written.name(), written.bytes());
        assertArrayEquals(written.bytes(), Files.readAllBytes(folder.resolve(written.name())));
        assertEquals(64, read.source().sha256().length());
    }
}
