package stirwright.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.Rectangle;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Level curves on linear axes from 0 to 100, between the grid's lines, so that a column of pixels shows each line's thickness. */
class ChartPixelsTest {
    private static final Axis AXIS = new Axis("x", "", false, 0, 100);
    private SwtWindow window;

    @BeforeEach
    void open() {
        window = new SwtWindow(Palette.light());
    }

    @AfterEach
    void close() {
        window.close();
    }

    /** Level at {@code y}, inside up to x = 50. */
    private static Curve level(String id, double y, int style, boolean pick) {
        double[] x = IntStream.rangeClosed(0, 100).asDoubleStream().toArray();
        double[] values = new double[101];
        boolean[] inside = new boolean[101];
        Arrays.fill(values, y);
        Arrays.fill(inside, 0, 51, true);
        return new Curve(id, id, x, values, inside, style, pick);
    }

    private static Picture picture(Curve... curves) {
        return new Picture(AXIS, AXIS, List.of(curves), List.of(), Optional.empty(), "nothing");
    }

    private Pixels pixels(Palette palette) {
        return new Pixels(ChartDemo.capture(window.view), palette);
    }

    private int column(double x) {
        Rectangle plot = window.plotArea().getBounds();
        return (int) Math.round(plot.x + plot.width * x / 100);
    }

    private int row(double y) {
        Rectangle plot = window.plotArea().getBounds();
        return (int) Math.round(plot.y + plot.height * (1 - y / 100));
    }

    /** The thickness in the columns from one x to another, sorted. */
    private double[] thickness(Pixels pixels, double fromX, double toX, double y, Color colour) {
        return IntStream.range(column(fromX), column(toX))
                .mapToDouble(x -> pixels.thickness(x, row(y) - 6, row(y) + 6, colour)).sorted().toArray();
    }

    private static double median(double[] sorted) {
        return sorted[sorted.length / 2];
    }

    @ParameterizedTest
    @ValueSource(booleans = {false, true})
    void thePickIsThickerAndTheOutsideLighter(boolean dark) {
        Palette palette = dark ? Palette.dark() : Palette.light();
        window.view.setPalette(palette);
        window.show(picture(level("pick", 65, 3, true), level("other", 35, 0, false)));
        Pixels pixels = pixels(palette);
        double[] pick = thickness(pixels, 22, 28, 65, palette.accent());
        assertEquals(2.5, median(pick), 0.2);
        assertEquals(2.5, pick[0], 0.2, "solid: no gap");
        Color blue = CurveStyle.colour(0, false, palette);
        assertEquals(1.25, median(thickness(pixels, 22, 28, 35, blue)), 0.2);

        double[] outside = thickness(pixels, 62, 68, 65, palette.accent());
        assertTrue(outside[outside.length - 1] < 2.5 * 0.45, () -> "at most 35 %: " + Arrays.toString(outside));
        assertTrue(outside[outside.length - 1] > 2.5 * 0.25, () -> "visible: " + Arrays.toString(outside));
        assertTrue(outside[0] < 2.5 * 0.1, () -> "dashed: " + Arrays.toString(outside));
    }

    @Test
    void aHighlightedCurveIsStrongerUntilItIsNoMore() {
        window.show(picture(level("other", 35, 0, false)));
        Color blue = CurveStyle.colour(0, false, Palette.light());
        window.view.highlight("other");
        ChartDemo.settle(window.display);
        assertEquals(2.5, median(thickness(pixels(Palette.light()), 22, 28, 35, blue)), 0.2);
        window.view.highlight(null);
        ChartDemo.settle(window.display);
        assertEquals(1.25, median(thickness(pixels(Palette.light()), 22, 28, 35, blue)), 0.2);
    }

    @Test
    void aHiddenCurveIsGone() {
        window.show(picture(level("pick", 65, 3, true), level("other", 35, 0, false)));
        window.view.setHidden(Set.of("other"));
        ChartDemo.settle(window.display);
        Pixels pixels = pixels(Palette.light());
        assertEquals(0, pixels.inked(column(22), row(35) - 4, column(28), row(35) + 4));
        assertTrue(pixels.inked(column(22), row(65) - 4, column(28), row(65) + 4) > 0);
    }

    @Test
    void theOperatingPointIsAHollowRingWithHairlines() {
        Mark mark = new Mark(50.7, 49.3, "x 50.7", "y 49.3");
        window.show(new Picture(AXIS, AXIS, List.of(level("pick", 65, 3, true)), List.of(), Optional.of(mark), ""));
        Pixels pixels = pixels(Palette.light());
        int x = column(50.7);
        int y = row(49.3);
        Color text = Palette.light().text();
        assertEquals(0, pixels.covered(x, y, text), 0.05, "hollow");
        assertTrue(pixels.thickness(x, y - 7, y - 3, text) > 1.5, "a ring above");
        assertTrue(pixels.covered(x, y + 30, text) > 0.3, "a hairline down");
        assertTrue(pixels.covered(x - 30, y, text) > 0.3, "a hairline to the left");
        assertEquals(0, pixels.covered(x, y - 30, text), 0.05, "none up");
    }

    @Test
    void bandsAreFaint() {
        window.show(new Picture(AXIS, AXIS, List.of(level("pick", 65, 3, true)),
                List.of(new Band("laminar", Double.NEGATIVE_INFINITY, 35)), Optional.empty(), ""));
        Pixels pixels = pixels(Palette.light());
        assertEquals(0.06, pixels.covered(column(25), row(15), Palette.light().quiet()), 0.01);
        assertEquals(0, pixels.covered(column(55), row(15), Palette.light().quiet()), 0.01);
        assertTrue(pixels.inked(column(41), row(99), column(49), row(92)) == 0, "no words beside the band");
    }

    @Test
    void anEmptyPictureSaysWhatToDoInTheMiddle() {
        window.show(Picture.empty("Choose an impeller to see its curves."));
        Pixels pixels = pixels(Palette.light());
        Rectangle area = window.view.getClientArea();
        int all = pixels.inked(0, 0, area.width, area.height);
        assertTrue(all > 200, "something is written");
        assertEquals(all, pixels.inked(area.width / 2 - 220, area.height / 2 - 20, area.width / 2 + 220, area.height / 2 + 20));
    }

    @Test
    void aSinglePointIsShown() {
        Curve point = new Curve("p", "p", new double[] {53}, new double[] {47}, new boolean[] {true}, 0, true);
        window.show(picture(point));
        assertTrue(pixels(Palette.light()).inked(column(53) - 5, row(47) - 5, column(53) + 5, row(47) + 5) > 10);
    }

    @Test
    void anImageForAReportHasItsOwnSizeAndColours() {
        window.show(picture(level("pick", 65, 3, true)));
        var data = window.view.image(600, 400, 2, Palette.dark());
        assertEquals(1200, data.width);
        assertEquals(800, data.height);
        Pixels pixels = new Pixels(data, Palette.dark());
        assertEquals(0, pixels.covered(1, 1, Palette.dark().accent()), 0.01);
        double thickest = IntStream.range(100, 700).mapToDouble(y -> pixels.covered(300, y, Palette.dark().accent()))
                .filter(covered -> covered > 0.95).count();
        assertTrue(thickest >= 4, "2.5 pixels of two dots: " + thickest);
    }
}
