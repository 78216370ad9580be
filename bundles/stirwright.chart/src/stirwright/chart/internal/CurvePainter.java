package stirwright.chart.internal;

import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.LineAttributes;
import stirwright.chart.Curve;
import stirwright.chart.CurveStyle;
import stirwright.chart.Palette;

/** Paints the curves: what is outside a curve's range is lighter and finely dashed. */
final class CurvePainter {
    private static final int APART = 112;
    private static final int APART_IN_A_CROWD = 168;
    private static final int CROWD = 12;
    private static final int SHIFT = 37;
    private static final LineAttributes MARKER_LINE = new LineAttributes(Strokes.THIN);

    private CurvePainter() { }

    static void paint(GC gc, Scene scene, Palette palette, String highlighted) {
        Trace last = null;
        for (int i = 0; i < scene.traces.size(); i++) {
            Trace trace = scene.traces.get(i);
            if (trace.curve().id().equals(highlighted)) {
                last = trace;
            } else {
                paint(gc, scene, trace, palette, false);
            }
        }
        if (last != null) {
            paint(gc, scene, last, palette, true);
        }
    }

    private static void paint(GC gc, Scene scene, Trace trace, Palette palette, boolean strong) {
        Curve curve = trace.curve();
        gc.setForeground(CurveStyle.colour(curve.style(), curve.pick(), palette));
        if (trace.outside() != null) {
            gc.setLineAttributes(Strokes.line(curve.style(), curve.pick(), false, strong));
            gc.setAlpha(Strokes.OUTSIDE_ALPHA);
            gc.drawPath(trace.outside());
            gc.setAlpha(255);
        }
        if (trace.inside() != null) {
            gc.setLineAttributes(Strokes.line(curve.style(), curve.pick(), true, strong));
            gc.drawPath(trace.inside());
        }
        gc.setLineAttributes(MARKER_LINE);
        gc.setBackground(palette.page());
        markers(gc, scene, trace);
    }

    /** A marker each so many pixels, shifted from style to style, and on every point that no line shows. */
    private static void markers(GC gc, Scene scene, Trace trace) {
        Curve curve = trace.curve();
        Marker marker = Strokes.marker(curve.style());
        int apart = scene.traces.size() > CROWD ? APART_IN_A_CROWD : APART;
        double next = scene.plot.x + 24 + curve.style() * SHIFT % apart;
        for (int i = 0; i < trace.count(); i++) {
            if (!trace.stands(i)) {
                continue;
            }
            float x = trace.px(i);
            boolean due = x >= next && curve.inside()[i] && !curve.pick();
            if ((due || trace.alone(i)) && scene.x.covers(x) && scene.y.covers(trace.py(i))) {
                marker.draw(gc, Math.round(x), Math.round(trace.py(i)));
            }
            if (x >= next) {
                next += Math.ceil((x - next + 1) / apart) * apart;
            }
        }
    }
}
