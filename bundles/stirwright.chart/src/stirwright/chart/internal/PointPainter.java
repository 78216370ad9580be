package stirwright.chart.internal;

import org.eclipse.swt.graphics.GC;
import stirwright.chart.CurveStyle;
import stirwright.chart.Palette;

/** Paints measured points and how far curves are known. */
final class PointPainter {
    private PointPainter() { }

    static void envelopes(GC gc, Scene scene, Palette palette) {
        gc.setAlpha(Strokes.ENVELOPE_ALPHA);
        for (EnvelopeTrace envelope : scene.envelopes) {
            gc.setBackground(CurveStyle.colour(envelope.curve().style(), envelope.curve().pick(), palette));
            gc.fillPath(envelope.path());
        }
        gc.setAlpha(255);
    }

    static void points(GC gc, Scene scene, Palette palette) {
        for (PointTrace trace : scene.points) {
            Strokes.toMarks(gc, trace.points().used(), palette);
            Marker marker = Strokes.marker(trace.points().style());
            for (int i = 0; i < trace.count(); i++) {
                marker.draw(gc, trace.px(i), trace.py(i));
            }
        }
    }
}
