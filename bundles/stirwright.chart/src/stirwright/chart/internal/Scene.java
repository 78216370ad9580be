package stirwright.chart.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import stirwright.chart.Curve;
import stirwright.chart.Picture;

/**
 * A picture laid out in a size: everything that painting needs and that stays the same until the picture, the zoom or the
 * size changes. All places are in pixels of the whole chart.
 */
public final class Scene {
    private static final int EDGE = 12;
    private static final int GAP = 8;
    private static final int TICK_GAP_X = 72;
    private static final int TICK_GAP_Y = 40;

    final Picture picture;
    final Lettering type;
    final Point size;
    final Rectangle plot;
    final Scale x;
    final Scale y;
    final List<Ticks.Tick> xTicks;
    final List<Ticks.Tick> yTicks;
    final List<Trace> traces = new ArrayList<>();
    final List<PointTrace> points = new ArrayList<>();
    final List<EnvelopeTrace> envelopes = new ArrayList<>();
    final List<PlacedRule> rules;
    final List<Hint> hints = new ArrayList<>();
    final Column column;
    final boolean empty;
    final String xTitle;
    final String yTitle;
    /** Where the operating point is and where its words stand; null when it is not in view. */
    final Point mark;
    final Rectangle markWords;

    public Scene(GC gc, Lettering type, Point size, Picture picture, Set<String> hidden, boolean legend, Span spanX, Span spanY) {
        this.picture = picture;
        this.type = type;
        this.size = size;
        gc.setFont(type.plain());
        List<Curve> visible = visible(picture, hidden);
        empty = !Fit.anything(picture, spanX, spanY);
        int top = EDGE + type.height() + GAP + (picture.bands().isEmpty() ? 0 : type.height() + GAP / 2);
        int bottom = Math.max(top + 1, size.y - EDGE - 2 * type.height() - GAP - GAP / 2);
        y = new Scale(spanY, bottom, top);
        yTicks = Ticks.of(y, TICK_GAP_Y);
        int left = EDGE + Math.ceilDiv(widest(gc, yTicks), GAP) * GAP + GAP;
        boolean named = legend || Column.direct(visible.size());
        int columnWidth = named ? Column.width(gc, type, visible, size.x * 3 / 10) : 0;
        int right = Math.max(left + 1, size.x - EDGE - columnWidth);
        plot = new Rectangle(left, top, right - left, bottom - top);
        x = new Scale(spanX, left, right);
        xTicks = Ticks.of(x, TICK_GAP_X);
        Clip clip = new Clip(left - 4, top - 4, right + 4, bottom + 4);
        for (Curve curve : visible) {
            traces.add(new Trace(gc.getDevice(), curve, x, y, clip));
        }
        picture.points().stream().filter(p -> !hidden.contains(p.id())).forEach(p -> points.add(new PointTrace(p, x, y, plot)));
        picture.envelopes().stream().filter(e -> !hidden.contains(e.curveId()))
                .forEach(e -> visible.stream().filter(c -> c.id().equals(e.curveId())).findFirst()
                        .ifPresent(c -> envelopes.add(new EnvelopeTrace(gc.getDevice(), e, c, x, y))));
        column = new Column(gc, this, named ? traces : List.of(), size.x - EDGE - right);
        yTitle = title(gc, picture.y().words(), EDGE, EDGE, size.x - 2 * EDGE);
        xTitle = title(gc, picture.x().words(), left, size.y - EDGE - type.height(), right - left);
        for (int i = 0; i < picture.bands().size(); i++) {
            BandPainter.hint(gc, this, picture.bands().get(i));
        }
        mark = picture.operatingPoint().map(point -> MarkPainter.at(this, point)).orElse(null);
        rules = RulePainter.place(gc, this);
        markWords = mark == null ? null : MarkPainter.place(gc, this, picture.operatingPoint().orElseThrow());
    }

    private static List<Curve> visible(Picture picture, Set<String> hidden) {
        List<Curve> visible = new ArrayList<>();
        picture.curves().stream().filter(curve -> !hidden.contains(curve.id()) && !curve.pick()).forEach(visible::add);
        picture.curves().stream().filter(curve -> !hidden.contains(curve.id()) && curve.pick()).forEach(visible::add);
        return visible;
    }

    private static int widest(GC gc, List<Ticks.Tick> ticks) {
        int width = 0;
        for (Ticks.Tick tick : ticks) {
            width = Math.max(width, Lettering.width(gc, tick.label()));
        }
        return width;
    }

    private String title(GC gc, String words, int atX, int atY, int width) {
        String fitted = Lettering.fit(gc, words, width);
        hint(new Rectangle(atX, atY, width, type.height()), words, fitted, "");
        return fitted;
    }

    /** Notes a text for the pointer when it was cut or names a curve. */
    void hint(Rectangle area, String words, String fitted, String curveId) {
        if (!fitted.equals(words) || !curveId.isEmpty()) {
            hints.add(new Hint(area, fitted.equals(words) ? "" : words, curveId));
        }
    }

    /** What is written at a place; null for nothing of note. */
    public Hint hintAt(int atX, int atY) {
        for (Hint hint : hints) {
            if (hint.area().contains(atX, atY)) {
                return hint;
            }
        }
        return null;
    }

    /** The curve nearest to a place within some pixels; null when none is. */
    public Trace near(double atX, double atY, double within) {
        Trace nearest = null;
        double least = within;
        for (Trace trace : traces) {
            double distance = trace.distance(atX, atY);
            if (distance <= least) {
                nearest = trace;
                least = distance;
            }
        }
        return nearest;
    }

    /** The plot within the axes. */
    public Rectangle plot() {
        return plot;
    }

    /** The horizontal scale. */
    public Scale x() {
        return x;
    }

    /** The vertical scale. */
    public Scale y() {
        return y;
    }

    /** The curves in view, the pick last. */
    public List<Trace> traces() {
        return traces;
    }

    /** The names in the column at the right. */
    public List<Label> labels() {
        return column.labels();
    }

    /** Whether there is nothing but a message. */
    public boolean empty() {
        return empty;
    }

    /** Gives back what the system lent. */
    public void dispose() {
        traces.forEach(Trace::dispose);
        envelopes.forEach(EnvelopeTrace::dispose);
    }
}
