package stirwright.chart.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.eclipse.swt.widgets.Display;
import org.junit.jupiter.api.Test;
import stirwright.chart.Curve;

class TraceTest {
    private static final Scale X = new Scale(new Span(false, 0, 100), 0, 100);
    private static final Scale Y = new Scale(new Span(false, 0, 100), 100, 0);

    private static Trace trace(double[] x, double[] y, boolean... inside) {
        return new Trace(Display.getDefault(), new Curve("a", "a", x, y, inside, 0, false), X, Y, new Clip(0, 0, 100, 100));
    }

    @Test
    void theDistanceIsThatToTheDrawnLine() {
        Trace trace = trace(new double[] {0, 100}, new double[] {50, 50}, true, true);
        assertEquals(0, trace.distance(33, 50), 1e-6);
        assertEquals(7, trace.distance(33, 43), 1e-6);
        assertEquals(5, trace.distance(103, 54), 1e-6);
        trace.dispose();
    }

    @Test
    void nothingDrawnIsInfinitelyFar() {
        Trace trace = trace(new double[] {0, 1}, new double[] {Double.NaN, Double.NEGATIVE_INFINITY}, true, true);
        assertEquals(Double.POSITIVE_INFINITY, trace.distance(0, 0));
        assertNull(trace.inside());
        assertTrue(Double.isNaN(trace.endX()));
        trace.dispose();
    }

    @Test
    void aGapIsNotBridged() {
        Trace trace = trace(new double[] {0, 20, 50, 80, 100}, new double[] {50, 50, Double.NaN, 50, 50}, true, true, true, true, true);
        assertEquals(30, trace.distance(50, 50), 1e-6);
        assertFalse(trace.alone(1));
        trace.dispose();
    }

    @Test
    void theEndIsWhereTheCurveLeavesTheView() {
        Trace trace = trace(new double[] {0, 200}, new double[] {0, 100}, true, false);
        assertEquals(100, trace.endX(), 1e-6);
        assertEquals(50, trace.endY(), 1e-6);
        assertNull(trace.inside(), "a stretch with one end outside is outside");
        assertNotNull(trace.outside());
        trace.dispose();
    }

    @Test
    void aSinglePointStandsAlone() {
        Trace trace = trace(new double[] {40}, new double[] {60}, true);
        assertTrue(trace.alone(0));
        assertEquals(40, trace.endY(), 1e-6);
        assertEquals(3, trace.distance(43, 40), 1e-6);
        trace.dispose();
    }

    @Test
    void linesAreCutToTheRectangle() {
        Clip clip = new Clip(0, 0, 10, 10);
        assertTrue(clip.cut(-10, 5, 1e9, 5));
        assertEquals(0, clip.x1, 1e-9);
        assertEquals(10, clip.x2, 1e-6);
        assertFalse(clip.cut(-10, -1, 20, -1));
        assertFalse(clip.cut(-5, 5, 5, -15));
        assertTrue(clip.cut(3, 3, 3, 3));
    }
}
