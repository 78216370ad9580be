package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import stirwright.rheology.FitOptions;
import stirwright.rheology.ModelKind;
import stirwright.rheology.RankedFits;

/**
 * The open set of 385 measured rheograms of drilling fluids (Open Source Drilling Community, YPLCalibrationFromRheometer,
 * RheogramSet.txt, revision ab3ad266, MIT), as it is. It lies beside the checkout and is not part of it.
 */
class OpenRheogramsTest {
    /** Of rheogram 73, "Xan+25 KCl+25 barite 0%", by rising rate. */
    private static final double[] STRESSES_73 = {4.51, 4.66, 4.81, 4.96, 5.12, 5.29, 5.48, 5.67, 5.87, 6.09, 6.33, 6.59, 6.87, 7.18, 7.52,
        7.89, 8.3, 8.76, 9.28, 9.86, 10.5};

    static Path set() {
        for (Path folder = Path.of("").toAbsolutePath(); folder != null; folder = folder.getParent()) {
            Path set = folder.resolve("shared/data/open-rheograms/RheogramSet.txt");
            if (Files.isRegularFile(set)) {
                return set;
            }
        }
        return Assumptions.abort("shared/data/open-rheograms does not lie beside the checkout: nothing was compared");
    }

    @Test
    void all385() {
        CurveImport read = CurveImport.of(CurveSource.file(set()), ImportChoice.DETECT);
        assertEquals(385, read.curves().size());
        assertEquals(8339, read.counts().taken());
        assertEquals(0, read.counts().dropped() + read.counts().left() + read.counts().notes(), read.counts().words());
        assertTrue(read.counts().addUp());
        HashSet<String> labels = new HashSet<>();
        read.curves().forEach(c -> assertTrue(labels.add(c.label()), c.label()));
        MeasuredCurve curve = read.curves().stream().filter(c -> c.label().equals("73")).findFirst().orElseThrow();
        assertArrayEquals(STRESSES_73, curve.points().stresses());
        assertEquals(1, curve.points().shearRate(0));
        assertEquals(100, curve.points().shearRate(20));
        assertEquals(Ramp.DOWN, curve.measurement().ramp());
        MeasuredCurve first = read.curves().get(0);
        assertEquals("49", first.label());
        assertEquals(10, first.measurement().temperature());
        assertTrue(first.measurement().block().contains("KCl/Polymer 1.75sg 10degC"), first.measurement().block());
    }

    @Test
    void everyModelFitsEveryCurve() {
        for (MeasuredCurve curve : CurveImport.of(CurveSource.file(set()), ImportChoice.DETECT).curves()) {
            RankedFits fits = CurveFits.of(curve, FitOptions.DEFAULT).fits();
            fits.attempts().forEach(a -> assertTrue(a.fit().isPresent(), () -> curve.label() + " " + a.kind() + ": " + a.notes()));
            assertTrue(fits.recommended().orElseThrow().determined(), curve.label());
            assertTrue(residual(fits, ModelKind.HERSCHEL_BULKLEY) <= residual(fits, ModelKind.POWER_LAW), curve.label());
            assertTrue(residual(fits, ModelKind.SISKO) <= residual(fits, ModelKind.POWER_LAW), curve.label());
        }
    }

    private static double residual(RankedFits fits, ModelKind kind) {
        return fits.attempt(kind).fit().orElseThrow().residualSumOfSquares();
    }
}
