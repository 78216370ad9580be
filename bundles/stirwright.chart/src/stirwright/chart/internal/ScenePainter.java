package stirwright.chart.internal;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.graphics.TextLayout;
import stirwright.chart.Palette;

/** Paints a scene: what is outside the plot and what is in it, in pixels of the whole chart. */
public final class ScenePainter {
    private ScenePainter() { }

    /** Axes, titles, names of bands and curves. */
    public static void frame(GC gc, Scene scene, Palette palette, String highlighted) {
        ready(gc, scene);
        gc.setBackground(palette.page());
        gc.fillRectangle(0, 0, scene.size.x, scene.size.y);
        if (scene.empty) {
            message(gc, scene, palette);
        } else {
            AxisPainter.axes(gc, scene, palette);
            BandPainter.words(gc, scene, palette);
            scene.column.paint(gc, palette, highlighted);
        }
    }

    /** The plot; {@code cursor} is null for none. */
    public static void plot(GC gc, Scene scene, Palette palette, String highlighted, Cursor cursor) {
        ready(gc, scene);
        gc.setBackground(palette.page());
        gc.fillRectangle(scene.plot);
        if (scene.empty) {
            message(gc, scene, palette);
            return;
        }
        BandPainter.tint(gc, scene, palette);
        AxisPainter.grid(gc, scene, palette);
        if (cursor != null) {
            AxisPainter.minor(gc, scene, palette, cursor.reading().x(), scene.y.value(cursor.y()));
        }
        PointPainter.envelopes(gc, scene, palette);
        RulePainter.lines(gc, scene, palette);
        PointPainter.points(gc, scene, palette);
        CurvePainter.paint(gc, scene, palette, highlighted);
        RulePainter.words(gc, scene, palette);
        if (scene.mark != null) {
            MarkPainter.paint(gc, scene, palette);
        }
        if (cursor != null) {
            new CursorPainter(scene, palette, cursor).paint(gc);
        }
    }

    private static void ready(GC gc, Scene scene) {
        gc.setAntialias(SWT.ON);
        gc.setTextAntialias(SWT.ON);
        gc.setFont(scene.type.plain());
    }

    private static void message(GC gc, Scene scene, Palette palette) {
        if (scene.picture.emptyMessage().isEmpty()) {
            return;
        }
        TextLayout layout = new TextLayout(gc.getDevice());
        layout.setFont(scene.type.plain());
        layout.setText(scene.picture.emptyMessage());
        layout.setAlignment(SWT.CENTER);
        layout.setWidth(Math.max(1, Math.min(420, scene.size.x - 32)));
        Rectangle bounds = layout.getBounds();
        gc.setForeground(palette.quiet());
        layout.draw(gc, (scene.size.x - Math.max(1, Math.min(420, scene.size.x - 32))) / 2, (scene.size.y - bounds.height) / 2);
        layout.dispose();
    }
}
