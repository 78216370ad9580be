package stirwright.chart;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import org.junit.jupiter.api.Test;

/** The median of a whole show and redraw; the limit is wide since test machines are shared, the figure is written out. */
class ChartSpeedTest {
    private static final double LIMIT_MS = 60;

    @Test
    void twentyFiveCurvesOfFourHundredPointsAreShownAtOnce() {
        try (SwtWindow window = new SwtWindow(Palette.light())) {
            double[] shows = new double[60];
            double[] hovers = new double[60];
            for (int i = 0; i < shows.length; i++) {
                Picture picture = Invented.many(25);
                long start = System.nanoTime();
                window.view.show(picture);
                paint(window);
                shows[i] = (System.nanoTime() - start) / 1e6;
                start = System.nanoTime();
                ChartDemo.point(window.view, 100 + i, 200);
                paint(window);
                hovers[i] = (System.nanoTime() - start) / 1e6;
            }
            System.out.printf("show and redraw %.1f ms, hover and redraw %.1f ms (medians)%n", median(shows), median(hovers));
            assertTrue(median(shows) < LIMIT_MS, () -> "show took " + median(shows) + " ms");
            assertTrue(median(hovers) < LIMIT_MS, () -> "hover took " + median(hovers) + " ms");
        }
    }

    private static void paint(SwtWindow window) {
        window.view.update();
        while (window.display.readAndDispatch()) {
            // until nothing is left to paint
        }
    }

    private static double median(double[] values) {
        double[] sorted = Arrays.copyOfRange(values, values.length / 3, values.length);
        Arrays.sort(sorted);
        return sorted[sorted.length / 2];
    }
}
