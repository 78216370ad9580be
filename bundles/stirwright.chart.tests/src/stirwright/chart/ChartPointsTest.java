package stirwright.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import java.util.stream.IntStream;
import org.eclipse.swt.graphics.Rectangle;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** Measured points, how far a curve is known, and named places, on linear axes from 0 to 100 so that pixels can be told. */
class ChartPointsTest {
    private static final Axis AXIS = new Axis("x", "", false, 0, 100);
    private static final double[] ENDS = {0, 100};
    private SwtWindow window;

    @BeforeEach
    void open() {
        window = new SwtWindow(Palette.light());
    }

    @AfterEach
    void close() {
        window.close();
    }

    private static Picture picture(List<Curve> curves, List<Points> points, List<Envelope> envelopes, List<Rule> rules) {
        return new Picture(AXIS, AXIS, curves, List.of(), Optional.empty(), points, envelopes, rules, "nothing");
    }

    private static Points at(String id, double x, double y, int style, boolean used) {
        return new Points(id, id, new double[] {x}, new double[] {y}, style, used);
    }

    private static Curve level(String id, double y) {
        return new Curve(id, id, ENDS, new double[] {y, y}, new boolean[] {true, true}, 0, false);
    }

    private Pixels pixels() {
        return new Pixels(ChartDemo.capture(window.view), Palette.light());
    }

    private int column(double x) {
        Rectangle plot = window.plotArea().getBounds();
        return (int) Math.round(plot.x + plot.width * x / 100);
    }

    private int row(double y) {
        Rectangle plot = window.plotArea().getBounds();
        return (int) Math.round(plot.y + plot.height * (1 - y / 100));
    }

    private int inkedAbout(Pixels pixels, double x, double y) {
        return pixels.inked(column(x) - 6, row(y) - 6, column(x) + 6, row(y) + 6);
    }

    @Test
    void pointsAreFilledAndThoseNotUsedAreLighter() {
        window.show(picture(List.of(), List.of(at("used", 25, 35, 0, true), at("aside", 75, 35, 0, false)), List.of(), List.of()));
        Pixels pixels = pixels();
        assertEquals(0.75, pixels.covered(column(25), row(35), Palette.light().text()), 0.05);
        assertEquals(0.35, pixels.covered(column(75), row(35), Palette.light().text()), 0.05);
    }

    @Test
    void eachSeriesHasAMarkOfItsOwn() {
        List<Points> points = IntStream.range(0, 8).mapToObj(i -> at("p" + i, 11 + 10 * i, 53, i, true)).toList();
        window.show(picture(List.of(), points, List.of(), List.of()));
        Pixels pixels = pixels();
        List<String> shapes = points.stream().map(p -> shape(pixels, column(p.x()[0]), row(53))).toList();
        assertEquals(8, Set.copyOf(shapes).size(), () -> String.join("\n\n", shapes));
    }

    private static String shape(Pixels pixels, int x, int y) {
        StringBuilder shape = new StringBuilder();
        for (int dy = -6; dy <= 6; dy++) {
            for (int dx = -6; dx <= 6; dx++) {
                shape.append(pixels.covered(x + dx, y + dy, Palette.light().text()) > 0.3 ? '#' : '.');
            }
            shape.append('\n');
        }
        return shape.toString();
    }

    @Test
    void hiddenPointsAreGone() {
        window.show(picture(List.of(), List.of(at("one", 25, 35, 0, true), at("other", 75, 35, 1, true)), List.of(), List.of()));
        window.view.setHidden(Set.of("one"));
        ChartDemo.settle(window.display);
        assertEquals(0, inkedAbout(pixels(), 25, 35));
        assertTrue(inkedAbout(pixels(), 75, 35) > 20);
    }

    @Test
    void anEnvelopeIsTintedAtFifteenPerCentAndHiddenWithItsCurve() {
        window.show(picture(List.of(level("c", 50)), List.of(),
                List.of(new Envelope("c", ENDS, new double[] {42, 42}, new double[] {58, 58})), List.of()));
        Pixels pixels = pixels();
        assertEquals(0.15, pixels.covered(column(33), row(54.5), CurveStyle.colour(0, false, Palette.light())), 0.02);
        assertEquals(0, pixels.covered(column(33), row(62), CurveStyle.colour(0, false, Palette.light())), 0.02);
        window.view.setHidden(Set.of("c"));
        ChartDemo.settle(window.display);
        assertEquals(0, pixels().covered(column(33), row(54.5), CurveStyle.colour(0, false, Palette.light())), 0.02);
    }

    @Test
    void anEnvelopeHasAGapWhereItIsNotKnown() {
        double[] x = {0, 20, 40, 60, 80, 100};
        double[] low = {42, 42, Double.NaN, 42, 42, 42};
        double[] high = {58, 58, 58, 58, 58, 58};
        window.show(picture(List.of(level("c", 50)), List.of(), List.of(new Envelope("c", x, low, high)), List.of()));
        assertEquals(0, pixels().covered(column(43), row(54.5), CurveStyle.colour(0, false, Palette.light())), 0.02);
        assertEquals(0.15, pixels().covered(column(73), row(54.5), CurveStyle.colour(0, false, Palette.light())), 0.02);
    }

    @Test
    void aNamedPlaceIsALineThatIsDashedInDoubt() {
        window.show(picture(List.of(level("c", 50)), List.of(), List.of(),
                List.of(new Rule(23, "at the impeller", ""), new Rule(67, "at the wall", "1.2 decades below"))));
        Pixels pixels = pixels();
        assertEquals(1, inkedShare(pixels, 23), 0.05);
        double dashed = inkedShare(pixels, 67);
        assertTrue(dashed > 0.3 && dashed < 0.8, () -> "strokes and gaps of one length, blurred at their ends: " + dashed);
        assertTrue(window.view.spokenWords().contains("at the wall, 1.2 decades below at 67.00"), window.view.spokenWords());
    }

    /** Away from words and curve; a line of the grid may cross it. */
    private double inkedShare(Pixels pixels, double x) {
        int from = row(38);
        int to = row(22);
        return pixels.inked(column(x) - 1, from, column(x) + 2, to) / (double) (to - from);
    }

    @Test
    void aHundredThousandPointsArePaintedInTime() {
        Random random = new Random(7);
        double[] x = random.doubles(100_000, 0, 100).toArray();
        double[] y = Arrays.stream(x).map(v -> v * v / 100).toArray();
        window.show(picture(List.of(), List.of(new Points("many", "many", x, y, 0, true)), List.of(), List.of()));
        long start = System.nanoTime();
        for (int i = 0; i < 10; i++) {
            window.view.redraw();
            window.plotArea().redraw();
            window.view.update();
        }
        long millis = (System.nanoTime() - start) / 10_000_000;
        assertTrue(millis < 100, () -> "a frame takes " + millis + " ms");
        assertTrue(inkedAbout(pixels(), 50, 25) > 40);
    }

    @Test
    void pointsAloneAreNoEmptyPicture() {
        window.show(new Picture(new Axis("x", "", true, 0, 0), new Axis("y", "", true, 0, 0), List.of(), List.of(), Optional.empty(),
                List.of(new Points("p", "p", new double[] {1, 10, 100}, new double[] {2, 20, 200}, 0, true)), List.of(), List.of(), "nothing"));
        assertTrue(window.plotArea().getBounds().width > 500, "the plot is shown");
        assertTrue(window.view.spokenWords().contains("3 measured points"), window.view.spokenWords());
    }
}
