package stirwright.chart.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import stirwright.chart.Axis;
import stirwright.chart.Curve;

class SpanTest {
    private static final Span DECADES = new Span(true, 1, 1e4);

    @Test
    void theValueUnderThePointerStays() {
        for (Span span : List.of(DECADES, new Span(false, -3, 17))) {
            Scale before = new Scale(span, 40, 640);
            Scale after = new Scale(span.zoomed(before.value(200), 1.25), 40, 640);
            assertEquals(before.value(200), after.value(200), 1e-9 * Math.abs(before.value(200)));
            assertEquals(after.span().along(after.span().most()) - after.span().along(after.span().least()),
                    (span.along(span.most()) - span.along(span.least())) / 1.25, 1e-9);
        }
    }

    @Test
    void zoomingInAndOutReturns() {
        Span there = DECADES.zoomed(30, 1.25).zoomed(30, 0.8);
        assertEquals(1, there.least(), 1e-9);
        assertEquals(1e4, there.most(), 1e-5);
    }

    @Test
    void panningMovesByWhatIsInView() {
        assertEquals(10, DECADES.panned(0.25).least(), 1e-9);
        assertEquals(15, new Span(false, 0, 10).panned(0.5).most(), 1e-12);
    }

    @Test
    void noZoomGoesTooFar() {
        Span span = DECADES;
        for (int i = 0; i < 1000; i++) {
            span = span.zoomed(50, 1.25);
        }
        assertTrue(span.least() < span.most());
        for (int i = 0; i < 1000; i++) {
            span = span.zoomed(50, 0.8);
        }
        assertTrue(span.least() > 0 && Double.isFinite(span.most()));
        assertSame(DECADES, DECADES.between(-1, 5));
        assertSame(DECADES, DECADES.between(5, 5));
        assertSame(DECADES, DECADES.between(Double.NaN, 5));
    }

    @Test
    void pixelsAndValuesAreInverse() {
        Scale scale = new Scale(DECADES, 500, 100);
        assertEquals(500, scale.pixel(1), 1e-9);
        assertEquals(100, scale.pixel(1e4), 1e-9);
        assertEquals(300, scale.pixel(100), 1e-9);
        assertEquals(37, scale.value(scale.pixel(37)), 1e-9);
        assertTrue(Double.isNaN(scale.pixel(0)) && Double.isNaN(scale.pixel(-1)) && Double.isNaN(scale.pixel(Double.NaN)));
    }

    @Test
    void anAxisWithoutEndsTakesThoseOfTheCurves() {
        Curve curve = new Curve("a", "a", new double[] {-1, 0, 10, 1000, Double.POSITIVE_INFINITY}, new double[5],
                new boolean[5], 0, false);
        Span asked = Fit.of(new Axis("x", "", true, 2, 50), List.of(curve.x()));
        assertEquals(new Span(true, 2, 50), asked);
        Span found = Fit.of(new Axis("x", "", true, 0, 0), List.of(curve.x()));
        assertTrue(found.least() < 10 && found.least() > 8 && found.most() > 1000 && found.most() < 1300, () -> "" + found);
        assertEquals(new Span(true, 1, 10), Fit.of(new Axis("x", "", true, 5, 5), List.of()));
        Span level = Fit.of(new Axis("y", "", false, 1, 1), List.of(curve.y()));
        assertTrue(level.least() < 0 && level.most() > 0, () -> "" + level);
    }
}
