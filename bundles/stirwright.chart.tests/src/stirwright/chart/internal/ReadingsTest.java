package stirwright.chart.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import stirwright.chart.Curve;
import stirwright.chart.Reading;

class ReadingsTest {
    private static final Span LOG = new Span(true, 1, 1000);
    private static final Span LINEAR = new Span(false, 0, 1000);

    private static Curve curve(String id, double[] x, double... y) {
        boolean[] inside = new boolean[x.length];
        java.util.Arrays.fill(inside, 0, Math.min(2, x.length), true);
        return new Curve(id, id, x, y, inside, 0, false);
    }

    private static double value(Curve curve, double at, Span x, Span y) {
        return Readings.at(at, List.of(curve), x, y).values().getFirst().value();
    }

    /** Half of a decade is the geometric mean; on linear axes the middle is the mean. */
    @Test
    void readsTheLineThatIsDrawn() {
        Curve curve = curve("a", new double[] {1, 100}, 4, 16);
        assertEquals(8, value(curve, 10, LOG, LOG), 1e-12);
        assertEquals(10, value(curve, 10, LOG, LINEAR), 1e-12);
        assertEquals(10, value(curve, 50.5, LINEAR, LINEAR), 1e-12);
        assertEquals(8, value(curve, 50.5, LINEAR, LOG), 1e-12);
        assertEquals(4, value(curve, 1, LOG, LOG));
        assertEquals(16, value(curve, 100, LOG, LOG));
    }

    @Test
    void theHighestComesFirst() {
        double[] x = {1, 10};
        Reading reading = Readings.at(5, List.of(curve("low", x, 1, 1), curve("high", x, 9, 9), curve("mid", x, 4, 4)), LOG, LOG);
        assertEquals(List.of("high", "mid", "low"), reading.values().stream().map(Reading.At::curveId).toList());
    }

    @Test
    void gapsAndPlacesBeyondTheCurveHaveNoValue() {
        Curve curve = curve("a", new double[] {1, 2, 3, 4, 5, 6}, 1, Double.NaN, 3, -1, Double.POSITIVE_INFINITY, 7);
        for (double at : new double[] {0.5, 1.5, 2, 2.5, 3.5, 4.5, 5.5, 7}) {
            assertTrue(Readings.at(at, List.of(curve), LOG, LOG).values().isEmpty(), "at " + at);
        }
        assertEquals(3, value(curve, 3, LOG, LOG), "a point by itself is read at its place");
        assertEquals(1, value(curve, 3.5, LINEAR, LINEAR), 1e-12, "on a linear axis -1 is a value");
    }

    @Test
    void betweenInsideAndOutsideIsOutside() {
        Curve curve = curve("a", new double[] {1, 2, 3, 4}, 1, 1, 1, 1);
        assertTrue(Readings.at(1.5, List.of(curve), LOG, LOG).values().getFirst().inside());
        assertFalse(Readings.at(2.5, List.of(curve), LOG, LOG).values().getFirst().inside());
    }

    @Test
    void noCurvesAndNoPointsGiveNothing() {
        assertTrue(Readings.at(1, List.of(), LOG, LOG).values().isEmpty());
        assertTrue(Readings.at(1, List.of(curve("a", new double[0])), LOG, LOG).values().isEmpty());
    }
}
