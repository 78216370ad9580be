package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.TimeUnit;
import java.util.random.RandomGenerator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import stirwright.rheology.FitOptions;
import stirwright.rheology.FlowCurve;
import stirwright.rheology.ModelKind;
import stirwright.rheology.RankedFits;

/** How long fits take. Of several passes the fastest counts: what else the machine does only ever adds. */
class FitSpeedTest {
    private static final double MOST_MILLISECONDS = 5;
    private static final double LEAST_RATIO = 5;
    private static final int TRIES = 3;

    @TempDir
    Path folder;

    @Test
    void allModelsWithIntervalsAgainstCurveFit() throws IOException, InterruptedException {
        Path set = OpenRheogramsTest.set();
        List<FlowCurve> curves = CurveImport.of(CurveSource.file(set), ImportChoice.DETECT).curves().stream()
                .map(MeasuredCurve::points).toList();
        double own = milliseconds(curves, 16);
        System.out.printf(Locale.ROOT, "all models with intervals: %.3f ms a curve over %d curves%n", own, curves.size());
        assertTrue(own <= MOST_MILLISECONDS, own + " ms a curve");
        String reference = curveFit(set);
        assumeTrue(reference.contains(" ms a curve"), "no Python with SciPy here: the comparison was left out, the limit above was not");
        double ratio = 0;
        for (int i = 0; i < TRIES && ratio < LEAST_RATIO; i++) {
            double other = Double.parseDouble((i == 0 ? reference : curveFit(set)).split(" ")[0]);
            own = Math.min(own, milliseconds(curves, 6));
            ratio = Math.max(ratio, other / own);
            System.out.printf(Locale.ROOT, "curve_fit, in its fastest way: %.3f ms a curve, %.1f times as long%n", other, other / own);
        }
        assertTrue(ratio >= LEAST_RATIO, "curve_fit takes only " + ratio + " times as long");
    }

    /** On one core; the first passes warm up. */
    private static double milliseconds(List<FlowCurve> curves, int passes) {
        long least = Long.MAX_VALUE;
        int fitted = 0;
        for (int pass = 0; pass < passes; pass++) {
            long start = System.nanoTime();
            for (FlowCurve curve : curves) {
                fitted += (int) RankedFits.of(curve, FitOptions.DEFAULT).attempts().stream().filter(a -> a.fit().isPresent()).count();
            }
            least = Math.min(least, System.nanoTime() - start);
        }
        assertEquals(passes * curves.size() * ModelKind.values().length, fitted);
        return least / 1e6 / curves.size();
    }

    /** What the script prints, or nothing where it cannot run. */
    private String curveFit(Path set) throws IOException, InterruptedException {
        Path scripts = Path.of("").toAbsolutePath().resolve("../../releng/fit-reference").normalize();
        assertTrue(Files.exists(scripts.resolve("time-curve-fit.py")), scripts.toString());
        Path out = folder.resolve("out.txt");
        try {
            Process python = new ProcessBuilder("python3", "time-curve-fit.py", set.toString(), "logarithms", "8")
                    .directory(scripts.toFile()).redirectOutput(out.toFile()).redirectError(ProcessBuilder.Redirect.DISCARD).start();
            if (!python.waitFor(120, TimeUnit.SECONDS)) {
                python.destroyForcibly();
            }
        } catch (IOException noPython) {
            return "";
        }
        return Files.readString(out);
    }

    @Test
    void aHundredThousandPoints() throws IOException {
        // invented: Herschel-Bulkley, 1 % noise
        RandomGenerator random = RandomGenerator.of("L64X128MixRandom");
        StringBuilder text = new StringBuilder("shear rate (1/s);shear stress (Pa)\n");
        for (int i = 0; i < 100_000; i++) {
            double rate = 0.01 * Math.pow(1e5, i / 99_999.0);
            text.append(rate).append(';').append((6 + 3 * Math.sqrt(rate)) * (1 + 0.01 * random.nextGaussian())).append('\n');
        }
        Path file = folder.resolve("long.csv");
        Files.writeString(file, text, StandardCharsets.UTF_8);
        long least = Long.MAX_VALUE;
        for (int i = 0; i < TRIES; i++) {
            long start = System.nanoTime();
            MeasuredCurve curve = CurveImport.of(CurveSource.file(file), ImportChoice.DETECT).requireCurves().get(0);
            RankedFits fits = RankedFits.of(curve.points(), FitOptions.DEFAULT);
            long took = System.nanoTime() - start;
            least = Math.min(least, took);
            System.out.printf(Locale.ROOT, "100,000 points imported and fitted: %.2f s%n", took / 1e9);
            assertEquals(100_000, curve.points().size());
            assertEquals(ModelKind.HERSCHEL_BULKLEY, fits.recommended().orElseThrow().kind());
        }
        assertTrue(least <= 2e9, least / 1e9 + " s");
    }
}
