package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Locale;
import org.junit.jupiter.api.Test;
import stirwright.rheology.Fits;
import stirwright.rheology.Objective;

/** 100,000 points within 2 s, import and a fit together, after warm-up; and no work that grows faster than the file. */
class ImportSpeedTest {
    private static final int POINTS = 100_000;

    private static String text(int points, boolean unordered) {
        StringBuilder text = new StringBuilder("Point;Time [s];Shear rate [1/s];Shear stress [Pa];Viscosity [Pa s];Status\n");
        for (int i = 0; i < points; i++) {
            double place = unordered ? (i * 7919L % points) / (double) points : i / (double) points;
            double rate = Math.pow(10, 4 * place - 1);
            double stress = 12 + 3.5 * Math.pow(rate, 0.45);
            text.append(String.format(Locale.ROOT, "%d;%.1f;%.6g;%.6g;%.6g;ok%n", i + 1, 0.1 * i, rate, stress, stress / rate));
        }
        return text.toString();
    }

    private static double seconds(String text) {
        CurveSource source = CurveSource.clipboard(text);
        long begin = System.nanoTime();
        CurveImport read = CurveImport.of(source, ImportChoice.DETECT);
        Fits.herschelBulkley(read.requireCurves().get(0).points(), Objective.RELATIVE);
        double seconds = 1e-9 * (System.nanoTime() - begin);
        assertEquals(text.lines().count() - 1, read.counts().taken());
        return seconds;
    }

    @Test
    void aHundredThousandPoints() {
        for (boolean unordered : new boolean[] {false, true}) {
            String text = text(POINTS, unordered);
            double best = Double.MAX_VALUE;
            for (int i = 0; i < 5; i++) {
                best = Math.min(best, seconds(text));
            }
            System.out.printf(Locale.ROOT, "100,000 points, %s: %.2f s%n", unordered ? "in no order" : "rising", best);
            assertTrue(best < 2, best + " s");
        }
    }
}
