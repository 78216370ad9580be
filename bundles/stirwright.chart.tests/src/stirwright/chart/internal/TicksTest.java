package stirwright.chart.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

class TicksTest {
    private static List<String> labels(boolean log, double least, double most, double pixels) {
        return Ticks.of(new Scale(new Span(log, least, most), 0, pixels), 60).stream().map(Ticks.Tick::label).toList();
    }

    @Test
    void decadesAreLabelledAsPeopleWriteThem() {
        assertEquals(List.of("0.1", "1", "10", "100", "10³", "10⁴"), labels(true, 0.1, 2e4, 600));
    }

    @Test
    void decadesAreLeftOutWhenTheyWouldCrowd() {
        assertEquals(List.of("10⁻⁶", "10⁻³", "1", "10³", "10⁶"), labels(true, 1e-6, 1e6, 300));
    }

    @Test
    void lessThanTwoDecadesShowTwoAndFive() {
        assertEquals(List.of("2", "5", "10", "20", "50"), labels(true, 1.5, 60, 600));
    }

    @Test
    void lessThanADecadeShowsRoundNumbers() {
        assertEquals(List.of("1.5", "2", "2.5", "3"), labels(true, 1.3, 3.2, 400));
    }

    @Test
    void linearStepsAreOneTwoOrFive() {
        assertEquals(List.of("0", "20", "40", "60", "80", "100"), labels(false, 0, 100, 400));
        assertEquals(List.of("−0.5", "0", "0.5", "1"), labels(false, -0.5, 1, 200));
    }

    /** Over many axes: in order, in view, at least two, and on logarithmic axes of decades not closer than asked. */
    @Test
    void anyAxisHasTicksInOrder() {
        Random random = new Random(7);
        for (int i = 0; i < 2000; i++) {
            boolean log = random.nextBoolean();
            double least = log ? Math.pow(10, random.nextDouble(-12, 12)) : random.nextDouble(-1e4, 1e4);
            double most = log ? least * Math.pow(10, random.nextDouble(0.01, 15)) : least + Math.pow(10, random.nextDouble(-3, 6));
            Scale scale = new Scale(new Span(log, least, most), 0, 500);
            List<Ticks.Tick> ticks = Ticks.of(scale, 60);
            String axis = log + " " + least + " to " + most + ": " + ticks;
            assertTrue(!ticks.isEmpty() && ticks.size() <= 21, axis);
            for (int k = 0; k < ticks.size(); k++) {
                assertTrue(scale.covers(scale.pixel(ticks.get(k).value())), axis);
                assertTrue(k == 0 || scale.pixel(ticks.get(k).value()) - scale.pixel(ticks.get(k - 1).value()) > 15, axis);
                assertTrue(k == 0 || !ticks.get(k).label().equals(ticks.get(k - 1).label()), axis);
            }
        }
    }

    @Test
    void minorLinesStayInTheDecadeOfThePointer() {
        assertArrayEquals(new double[] {100, 200, 300, 400, 500, 600, 700, 800, 900, 1000},
                Ticks.minor(new Span(true, 1, 1e6), 345), 1e-9);
        assertArrayEquals(new double[] {300, 400}, Ticks.minor(new Span(true, 250, 450), 345), 1e-9);
        assertEquals(0, Ticks.minor(new Span(false, 0, 10), 3).length);
        assertEquals(0, Ticks.minor(new Span(true, 1, 10), Double.NaN).length);
    }
}
