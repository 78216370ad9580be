package stirwright.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Set;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.widgets.Display;
import org.junit.jupiter.api.Test;
import stirwright.chart.internal.Hint;
import stirwright.chart.internal.Label;
import stirwright.chart.internal.Lettering;
import stirwright.chart.internal.Scene;
import stirwright.chart.internal.Span;

/** The names of the curves at the right. */
class ChartNamesTest {
    private final Display display = Display.getDefault();
    private final Lettering type = new Lettering(display, display.getSystemFont());

    private Scene scene(Picture picture, int width, int height) {
        return scene(picture, width, height, true);
    }

    private Scene scene(Picture picture, int width, int height, boolean legend) {
        GC gc = new GC(display);
        try {
            return new Scene(gc, type, new Point(width, height), picture, Set.of(), legend, new Span(true, 1, 1e6), new Span(true, 0.1, 100));
        } finally {
            gc.dispose();
        }
    }

    @Test
    void fewCurvesAreNamedAtTheirEndsWithoutOverlap() {
        Scene scene = scene(Invented.few(), 900, 600);
        List<Label> labels = scene.labels();
        assertEquals(5, labels.size());
        for (int i = 0; i < labels.size(); i++) {
            assertTrue(Math.abs(labels.get(i).y() - labels.get(i).trace().endY()) < 25, "near its end");
            assertTrue(i == 0 || labels.get(i).y() - labels.get(i - 1).y() >= type.height(), "no overlap");
        }
        scene.dispose();
    }

    @Test
    void aLongNameIsCutAndToldWhole() {
        Scene scene = scene(Invented.few(), 640, 400);
        Label cut = scene.labels().stream().filter(label -> label.trace().curve().id().equals("d")).findFirst().orElseThrow();
        assertTrue(cut.text().endsWith("…"), cut.text());
        Hint hint = scene.hintAt(cut.x() + 3, cut.y());
        assertEquals("Invented anchor with a rather long name that has to be cut", hint.full());
        assertEquals("d", hint.curveId());
        assertNull(scene.hintAt(300, 200));
        scene.dispose();
    }

    @Test
    void withoutALegendManyCurvesLeaveThePlotItsRoom() {
        Scene with = scene(Invented.many(25), 900, 600);
        Scene without = scene(Invented.many(25), 900, 600, false);
        assertEquals(List.of(), without.labels());
        assertTrue(without.plot().width > with.plot().width + 100, () -> with.plot() + " and " + without.plot());
        Scene few = scene(Invented.few(), 900, 600, false);
        assertEquals(5, few.labels().size(), "few curves keep the names at their ends");
        with.dispose();
        without.dispose();
        few.dispose();
    }

    @Test
    void aLegendHasTheOrderOfTheEndsAndCountsTheRest() {
        Scene scene = scene(Invented.many(25), 900, 600);
        assertEquals(25, scene.labels().size());
        assertEquals("Invented curve 25", scene.labels().getFirst().text());
        assertEquals("Invented curve 1", scene.labels().getLast().text());
        scene.dispose();
        Scene low = scene(Invented.many(25), 900, 300);
        Label rest = low.labels().getLast();
        int shown = low.labels().size() - 1;
        assertEquals("and " + (25 - shown) + " more", rest.text());
        assertEquals(25 - shown, low.hintAt(rest.x() + 2, rest.y()).full().lines().count());
        low.dispose();
    }
}
