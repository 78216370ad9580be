package stirwright.chart.internal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Rectangle;
import stirwright.chart.Curve;
import stirwright.chart.CurveStyle;
import stirwright.chart.Palette;

/**
 * The names of the curves, in a column right of the plot where they cover no curve: each at the end of its curve while they
 * are few, else a legend in the order in which the curves end.
 */
final class Column {
    private static final int FEW = 6;
    private static final int LEADER = 20;
    private static final int SWATCH = 36;
    private static final int GAP = 8;
    private final Scene scene;
    private final boolean direct;
    private final List<Label> labels = new ArrayList<>();

    /** The width that the names need, within a limit. */
    static int width(GC gc, Lettering type, List<Curve> curves, int most) {
        int width = 0;
        for (Curve curve : curves) {
            gc.setFont(curve.pick() ? type.strong() : type.plain());
            width = Math.max(width, Lettering.width(gc, curve.label()));
        }
        gc.setFont(type.plain());
        return curves.isEmpty() ? 0 : Math.min(most, width + (direct(curves.size()) ? LEADER : GAP + SWATCH + GAP));
    }

    /** Whether so many curves are named at their ends. */
    static boolean direct(int curves) {
        return curves <= FEW;
    }

    Column(GC gc, Scene scene, List<Trace> traces, int width) {
        this.scene = scene;
        direct = direct(traces.size());
        List<Trace> inView = traces.stream().filter(trace -> !direct || !Double.isNaN(trace.endY()))
                .sorted(Comparator.comparingDouble(trace -> Double.isNaN(trace.endY()) ? Double.MAX_VALUE : trace.endY())).toList();
        int row = scene.type.height() + 2;
        int x = scene.plot.x + scene.plot.width + (direct ? LEADER : GAP + SWATCH + GAP);
        int room = scene.plot.x + scene.plot.width + width - x;
        int rows = Math.max(1, (scene.plot.height + row / 2) / row);
        int shown = inView.size() <= rows ? inView.size() : rows - 1;
        double[] wanted = new double[shown];
        for (int i = 0; i < shown; i++) {
            wanted[i] = direct ? inView.get(i).endY() : scene.plot.y + (i + 0.5) * row;
        }
        double[] placed = Spread.apart(wanted, row, scene.plot.y - row / 2.0, scene.plot.y + scene.plot.height + row / 2.0);
        for (int i = 0; i < shown; i++) {
            add(gc, inView.get(i), inView.get(i).curve(), x, (int) Math.round(placed[i]), room);
        }
        if (shown < inView.size()) {
            String more = Lettering.fit(gc, Wording.of("more", inView.size() - shown), room);
            int y = scene.plot.y + shown * row + row / 2;
            labels.add(new Label(null, more, x, y));
            scene.hints.add(new Hint(new Rectangle(x, y - row / 2, room, row), inView.stream().skip(shown)
                    .map(trace -> trace.curve().label()).collect(Collectors.joining("\n")), ""));
        }
    }

    private void add(GC gc, Trace trace, Curve curve, int x, int y, int room) {
        gc.setFont(curve.pick() ? scene.type.strong() : scene.type.plain());
        String text = Lettering.fit(gc, curve.label(), room);
        gc.setFont(scene.type.plain());
        labels.add(new Label(trace, text, x, y));
        int left = scene.plot.x + scene.plot.width + 2;
        Rectangle area = new Rectangle(left, y - scene.type.height() / 2, x - left + room, scene.type.height());
        scene.hint(area, curve.label(), text, curve.id());
    }

    List<Label> labels() {
        return labels;
    }

    void paint(GC gc, Palette palette, String highlighted) {
        for (Label label : labels) {
            Curve curve = label.trace() == null ? null : label.trace().curve();
            if (curve != null) {
                sample(gc, palette, label, curve);
            }
            boolean strong = curve != null && (curve.pick() || curve.id().equals(highlighted));
            gc.setFont(strong && curve.pick() ? scene.type.strong() : scene.type.plain());
            gc.setForeground(curve == null ? palette.quiet() : curve.pick() ? palette.accent() : palette.text());
            gc.drawText(label.text(), label.x(), label.y() - scene.type.height() / 2, SWT.DRAW_TRANSPARENT);
            if (strong && !curve.pick()) {
                int under = label.y() + scene.type.height() / 2;
                gc.setLineWidth(1);
                gc.drawLine(label.x(), under, label.x() + Lettering.width(gc, label.text()), under);
            }
        }
        gc.setFont(scene.type.plain());
    }

    private void sample(GC gc, Palette palette, Label label, Curve curve) {
        int right = scene.plot.x + scene.plot.width;
        if (!direct) {
            CurveStyle.paintSwatch(gc, new Rectangle(right + GAP, label.y() - GAP, SWATCH, 2 * GAP), curve.style(), curve.pick(), palette);
            return;
        }
        gc.setForeground(CurveStyle.colour(curve.style(), curve.pick(), palette));
        gc.setLineWidth(1);
        int endY = (int) Math.round(Math.clamp(label.trace().endY(), scene.plot.y, scene.plot.y + scene.plot.height));
        gc.drawLine(right + 4, endY, label.x() - 4, label.y());
    }
}
