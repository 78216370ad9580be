package stirwright.chart.internal;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.LineAttributes;
import org.eclipse.swt.graphics.Rectangle;
import stirwright.chart.Palette;
import stirwright.chart.Rule;

/** Paints named places on the x axis: a line across the plot, its words where they cover least. */
final class RulePainter {
    private static final int AIR = 6;
    private static final int PAD = 4;
    /** How many rows from the top and as many from the bottom are tried for the words. */
    private static final int ROWS = 4;
    private static final float[] DASH = {4, 4};

    private RulePainter() { }

    static String inWords(Rule rule) {
        return Wording.of("rule", rule.words() + (rule.doubt().isEmpty() ? "" : ", " + rule.doubt()), Numbers.reading(rule.x()));
    }

    /** Those in view, each with the place of its words. */
    static List<PlacedRule> place(GC gc, Scene scene) {
        List<PlacedRule> placed = new ArrayList<>();
        for (Rule rule : scene.picture.rules()) {
            double x = scene.x.pixel(rule.x());
            if (!Double.isNaN(x) && scene.x.covers(x)) {
                placed.add(new PlacedRule(rule, (int) Math.round(x), words(gc, scene, rule, (int) Math.round(x), placed)));
            }
        }
        return placed;
    }

    private static Rectangle words(GC gc, Scene scene, Rule rule, int x, List<PlacedRule> others) {
        int width = Math.max(Lettering.width(gc, rule.words()), Lettering.width(gc, rule.doubt())) + 2 * PAD;
        int height = (rule.doubt().isEmpty() ? 1 : 2) * scene.type.height() + PAD;
        Rectangle best = null;
        int least = Integer.MAX_VALUE;
        for (int i = 0; i < 4 * ROWS; i++) {
            int row = i / 4 * (2 * scene.type.height() + 2 * PAD) + AIR;
            int left = i % 2 == 0 ? x + AIR : x - AIR - width;
            int top = i / 2 % 2 == 0 ? scene.plot.y + row : scene.plot.y + scene.plot.height - row - height;
            Rectangle tried = new Rectangle(left, top, width, height);
            int covered = covered(scene, tried, others);
            if (covered < least) {
                least = covered;
                best = tried;
            }
        }
        return best;
    }

    /** Words on words count most, then words beyond the plot, then on the line of another place, then each point of a curve or of a measurement. */
    private static int covered(Scene scene, Rectangle area, List<PlacedRule> others) {
        int count = scene.plot.intersection(area).equals(area) ? 0 : 100_000;
        for (PlacedRule other : others) {
            count += other.words().intersects(area) ? 1_000_000 : 0;
        }
        for (Rule other : scene.picture.rules()) {
            double x = scene.x.pixel(other.x());
            count += x > area.x - AIR / 2 && x < area.x + area.width + AIR / 2 ? 10_000 : 0;
        }
        for (Trace trace : scene.traces) {
            for (int i = 0; i < trace.count(); i++) {
                count += trace.stands(i) && area.contains((int) trace.px(i), (int) trace.py(i)) ? 1 : 0;
            }
        }
        for (PointTrace trace : scene.points) {
            for (int i = 0; i < trace.count(); i++) {
                count += area.contains(trace.px(i), trace.py(i)) ? 5 : 0;
            }
        }
        return count;
    }

    static void lines(GC gc, Scene scene, Palette palette) {
        gc.setForeground(palette.quiet());
        for (PlacedRule rule : scene.rules) {
            boolean doubt = !rule.rule().doubt().isEmpty();
            gc.setLineAttributes(new LineAttributes(1, SWT.CAP_FLAT, SWT.JOIN_ROUND, doubt ? SWT.LINE_CUSTOM : SWT.LINE_SOLID,
                    doubt ? DASH : null, 0, 10));
            gc.drawLine(rule.x(), scene.plot.y, rule.x(), scene.plot.y + scene.plot.height);
        }
        gc.setLineAttributes(new LineAttributes(1));
    }

    static void words(GC gc, Scene scene, Palette palette) {
        for (PlacedRule placed : scene.rules) {
            Rectangle place = placed.words();
            gc.setBackground(palette.page());
            gc.setAlpha(205);
            gc.fillRoundRectangle(place.x, place.y, place.width, place.height, 6, 6);
            gc.setAlpha(255);
            gc.setForeground(palette.text());
            gc.drawText(placed.rule().words(), place.x + PAD, place.y + PAD / 2, SWT.DRAW_TRANSPARENT);
            gc.setForeground(palette.near());
            gc.drawText(placed.rule().doubt(), place.x + PAD, place.y + PAD / 2 + scene.type.height(), SWT.DRAW_TRANSPARENT);
        }
    }
}
