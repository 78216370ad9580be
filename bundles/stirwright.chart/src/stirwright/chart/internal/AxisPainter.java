package stirwright.chart.internal;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Rectangle;
import stirwright.chart.Palette;

/** Paints grids, ticks and titles. */
final class AxisPainter {
    private static final int TICK = 4;
    private static final int EDGE = 12;

    private AxisPainter() { }

    /** The lines at the ticks. */
    static void grid(GC gc, Scene scene, Palette palette) {
        Rectangle plot = scene.plot;
        gc.setForeground(palette.hairline());
        gc.setLineWidth(1);
        for (int i = 0; i < scene.xTicks.size(); i++) {
            int x = (int) Math.round(scene.x.pixel(scene.xTicks.get(i).value()));
            gc.drawLine(x, plot.y, x, plot.y + plot.height);
        }
        for (int i = 0; i < scene.yTicks.size(); i++) {
            int y = (int) Math.round(scene.y.pixel(scene.yTicks.get(i).value()));
            gc.drawLine(plot.x, y, plot.x + plot.width, y);
        }
    }

    /** The lines within the decade of a value; nothing on linear axes. */
    static void minor(GC gc, Scene scene, Palette palette, double x, double y) {
        Rectangle plot = scene.plot;
        gc.setForeground(palette.hairline());
        gc.setLineWidth(1);
        gc.setAlpha(150);
        for (double value : Ticks.minor(scene.x.span(), x)) {
            int at = (int) Math.round(scene.x.pixel(value));
            gc.drawLine(at, plot.y, at, plot.y + plot.height);
        }
        for (double value : Ticks.minor(scene.y.span(), y)) {
            int at = (int) Math.round(scene.y.pixel(value));
            gc.drawLine(plot.x, at, plot.x + plot.width, at);
        }
        gc.setAlpha(255);
    }

    /** The axes with their ticks, outside the plot. */
    static void axes(GC gc, Scene scene, Palette palette) {
        Rectangle plot = scene.plot;
        int bottom = plot.y + plot.height;
        int right = plot.x + plot.width;
        int height = scene.type.height();
        gc.setLineWidth(1);
        gc.setFont(scene.type.plain());
        gc.setForeground(palette.quiet());
        gc.drawLine(plot.x - 1, bottom, right, bottom);
        gc.drawLine(plot.x - 1, plot.y, plot.x - 1, bottom);
        int taken = Integer.MIN_VALUE;
        for (Ticks.Tick tick : scene.xTicks) {
            int x = (int) Math.round(scene.x.pixel(tick.value()));
            int width = Lettering.width(gc, tick.label());
            gc.drawLine(x, bottom, x, bottom + TICK);
            if (x - width / 2 > taken) {
                gc.drawText(tick.label(), x - width / 2, bottom + TICK + 2, SWT.DRAW_TRANSPARENT);
                taken = x + width / 2 + 4;
            }
        }
        for (Ticks.Tick tick : scene.yTicks) {
            int y = (int) Math.round(scene.y.pixel(tick.value()));
            gc.drawLine(plot.x - 1 - TICK, y, plot.x - 1, y);
            gc.drawText(tick.label(), plot.x - TICK - 4 - Lettering.width(gc, tick.label()), y - height / 2, SWT.DRAW_TRANSPARENT);
        }
        gc.setForeground(palette.text());
        gc.drawText(scene.yTitle, EDGE, EDGE, SWT.DRAW_TRANSPARENT);
        gc.drawText(scene.xTitle, right - Lettering.width(gc, scene.xTitle), scene.size.y - EDGE - height, SWT.DRAW_TRANSPARENT);
    }
}
