package stirwright.chart.internal;

import java.util.List;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Rectangle;
import stirwright.chart.CurveStyle;
import stirwright.chart.Curve;
import stirwright.chart.Palette;
import stirwright.chart.Reading;

/** Paints the cursor: a vertical line, a dot on each curve and a small table of the values, the nearest emphasised. */
final class CursorPainter {
    private static final int PAD = 8;
    private static final int SWATCH = 28;
    private static final int AWAY = 16;
    private static final int WIDEST_NAME = 200;
    private static final int READABLE_NAME = 120;
    private static final String DOUBT = Wording.of("doubt");

    private final Scene scene;
    private final Palette palette;
    private final Cursor cursor;

    CursorPainter(Scene scene, Palette palette, Cursor cursor) {
        this.scene = scene;
        this.palette = palette;
        this.cursor = cursor;
    }

    void paint(GC gc) {
        Rectangle plot = scene.plot;
        int x = (int) Math.round(cursor.x());
        gc.setLineWidth(1);
        gc.setForeground(palette.quiet());
        gc.drawLine(x, plot.y, x, plot.y + plot.height);
        List<Reading.At> values = cursor.reading().values();
        for (int i = 0; i < values.size(); i++) {
            double y = scene.y.pixel(values.get(i).value());
            if (scene.y.covers(y)) {
                int radius = i == cursor.nearest() ? 4 : 2;
                Curve curve = curve(values.get(i).curveId());
                gc.setBackground(CurveStyle.colour(curve.style(), curve.pick(), palette));
                gc.fillOval(x - radius, (int) Math.round(y) - radius, 2 * radius + 1, 2 * radius + 1);
            }
        }
        table(gc, x, values);
    }

    private void table(GC gc, int x, List<Reading.At> values) {
        int row = scene.type.height() + 2;
        int rows = Math.max(1, Math.min(values.size(), (scene.plot.height - 2 * PAD) / row - 2));
        int first = Math.clamp(cursor.nearest() - rows / 2, 0, Math.max(0, values.size() - rows));
        int end = Math.min(values.size(), first + rows);
        gc.setFont(scene.type.strong());
        int name = 0;
        int front = 0;
        int back = 0;
        boolean doubt = false;
        for (int i = first; i < end; i++) {
            String number = Numbers.reading(values.get(i).value());
            name = Math.max(name, Lettering.width(gc, values.get(i).label()));
            front = Math.max(front, Lettering.width(gc, front(number)));
            back = Math.max(back, Lettering.width(gc, number.substring(front(number).length())));
            doubt |= !values.get(i).inside();
        }
        int beside = SWATCH + 5 * PAD + front + back + (doubt ? PAD + Lettering.width(gc, DOUBT) : 0);
        int half = scene.plot.width / 2 - AWAY - beside;
        name = Math.min(name, Math.clamp(Math.max(half, Math.min(READABLE_NAME, scene.plot.width - 4 - beside)), 1, WIDEST_NAME));
        String head = Cursor.head(scene, cursor.reading());
        boolean part = end - first < values.size();
        String rest = values.isEmpty() ? Wording.of("nothing.here") : part ? Wording.of("more", values.size() - end + first) : "";
        int width = Math.max(values.isEmpty() ? 0 : beside + name, 2 * PAD + Math.max(Lettering.width(gc, head), Lettering.width(gc, rest)));
        int height = 2 * PAD + (1 + end - first + (rest.isEmpty() ? 0 : 1)) * row;
        Rectangle box = place(x, width, height);
        box(gc, box);
        int y = box.y + PAD;
        gc.setFont(scene.type.plain());
        gc.setForeground(palette.quiet());
        gc.drawText(head, box.x + PAD, y, SWT.DRAW_TRANSPARENT);
        int mark = box.x + PAD + SWATCH + PAD + name + 2 * PAD + front;
        for (int i = first; i < end; i++) {
            y += row;
            line(gc, values.get(i), i == cursor.nearest(), box.x + PAD, y, name, mark, mark + back + PAD);
        }
        gc.setFont(scene.type.plain());
        gc.setForeground(palette.quiet());
        gc.drawText(rest, box.x + PAD, y + row, SWT.DRAW_TRANSPARENT);
    }

    private void line(GC gc, Reading.At at, boolean nearest, int x, int y, int name, int mark, int doubt) {
        Curve curve = curve(at.curveId());
        CurveStyle.paintSwatch(gc, new Rectangle(x, y, SWATCH, scene.type.height()), curve.style(), curve.pick(), palette);
        gc.setFont(nearest ? scene.type.strong() : scene.type.plain());
        gc.setForeground(at.inside() ? palette.text() : palette.quiet());
        gc.drawText(Lettering.fit(gc, at.label(), name), x + SWATCH + PAD, y, SWT.DRAW_TRANSPARENT);
        String number = Numbers.reading(at.value());
        gc.drawText(number, mark - Lettering.width(gc, front(number)), y, SWT.DRAW_TRANSPARENT);
        if (!at.inside()) {
            gc.setFont(scene.type.plain());
            gc.drawText(DOUBT, doubt, y, SWT.DRAW_TRANSPARENT);
        }
    }

    /** What stands before the decimal mark. */
    private static String front(String number) {
        int mark = number.indexOf('.');
        return mark < 0 ? number : number.substring(0, mark);
    }

    /** Within the plot beside the line, at the height of the pointer; where that would hide the operating point, elsewhere. */
    private Rectangle place(int x, int width, int height) {
        Rectangle plot = scene.plot;
        int right = plot.x + plot.width - 2 - width;
        int bottom = plot.y + plot.height - 2 - height;
        int middle = Math.max(plot.y + 1, Math.min(bottom, (int) Math.round(cursor.y()) - height / 2));
        int beside = x + AWAY <= right ? x + AWAY : Math.max(plot.x + 1, x - AWAY - width);
        int other = beside > x && x - AWAY - width > plot.x ? x - AWAY - width : beside;
        Rectangle first = new Rectangle(beside, middle, width, height);
        for (int left : new int[] {beside, other}) {
            for (int top : new int[] {middle, plot.y + 1, bottom}) {
                Rectangle tried = new Rectangle(left, Math.max(plot.y + 1, top), width, height);
                if (scene.mark == null || !tried.intersects(scene.markWords)
                        && !tried.intersects(scene.mark.x - AWAY / 2, scene.mark.y - AWAY / 2, AWAY, AWAY)) {
                    return tried;
                }
            }
        }
        return first;
    }

    private void box(GC gc, Rectangle box) {
        gc.setAlpha(240);
        gc.setBackground(palette.surface());
        gc.fillRoundRectangle(box.x, box.y, box.width, box.height, 6, 6);
        gc.setAlpha(255);
        gc.setForeground(palette.hairline());
        gc.drawRoundRectangle(box.x, box.y, box.width, box.height, 6, 6);
    }

    private Curve curve(String id) {
        for (Trace trace : scene.traces) {
            if (trace.curve().id().equals(id)) {
                return trace.curve();
            }
        }
        throw new IllegalStateException("no curve " + id);
    }
}
