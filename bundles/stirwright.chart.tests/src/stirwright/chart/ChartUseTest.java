package stirwright.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Event;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** A straight line on log-log axes, y = 1000/x, which is what interpolation in the logarithm keeps exactly. */
class ChartUseTest {
    private static final Axis X = new Axis("Reynolds number, ρND²/μ", "", true, 1, 1e4);
    private static final Axis Y = new Axis("Power number, P/(ρN³D⁵)", "", true, 0.1, 1e3);
    private final List<Reading> readings = new ArrayList<>();
    private final List<String> selected = new ArrayList<>();
    private SwtWindow window;

    @BeforeEach
    void open() {
        window = new SwtWindow(Palette.light());
        window.view.onPointed(readings::add);
        window.view.onSelected(selected::add);
        window.show(picture(X));
    }

    @AfterEach
    void close() {
        window.close();
    }

    private static Picture picture(Axis x) {
        boolean[] inside = {true, true};
        return new Picture(x, Y, List.of(new Curve("fall", "Falling", new double[] {1, 1e4}, new double[] {1000, 0.1}, inside, 0, true),
                new Curve("level", "Level", new double[] {1, 1e4}, new double[] {5, 5}, new boolean[] {true, false}, 1, false)),
                List.of(), Optional.empty(), "");
    }

    private void key(int code, char character, int mask) {
        Event event = new Event();
        event.keyCode = code;
        event.character = character;
        event.stateMask = mask;
        window.plotArea().notifyListeners(SWT.KeyDown, event);
    }

    private Rectangle plot() {
        return window.plotArea().getBounds();
    }

    private Reading last() {
        return readings.getLast();
    }

    @Test
    void hoveringReadsAllCurvesThere() {
        ChartDemo.point(window.view, plot().width / 4, 10);
        // Two pixels of four decades: a quarter of the width need not be a whole pixel.
        assertEquals(1, Math.log10(last().x()), 2 * 4.0 / plot().width);
        assertEquals(List.of("fall", "level"), last().values().stream().map(Reading.At::curveId).toList());
        assertEquals(1000 / last().x(), last().values().get(0).value(), 1e-6 * 1000);
        assertEquals(5, last().values().get(1).value(), 1e-9);
        assertTrue(last().values().get(0).inside());
        assertFalse(last().values().get(1).inside());
    }

    @Test
    void theKeyboardReadsToo() {
        key(SWT.HOME, (char) 0, 0);
        assertEquals(1, last().x(), 1e-9);
        key(SWT.ARROW_RIGHT, (char) 0, SWT.SHIFT);
        key(SWT.ARROW_RIGHT, (char) 0, SWT.CTRL);
        key(SWT.ARROW_RIGHT, (char) 0, 0);
        key(SWT.ARROW_LEFT, (char) 0, 0);
        assertEquals(Math.pow(1e4, 60.0 / plot().width), last().x(), 1e-9);
        key(SWT.END, (char) 0, 0);
        assertEquals(1e4, last().x(), 1e-6);
        assertTrue(window.view.spokenWords().contains("At Reynolds number 10000"), window.view.spokenWords());
        key(SWT.ARROW_DOWN, (char) 0, 0);
        key(SWT.CR, '\r', 0);
        assertEquals(List.of("fall"), selected);
        key(SWT.ESC, (char) 0, 0);
        assertTrue(Double.isNaN(last().x()) && last().values().isEmpty(), "the cursor has left");
        assertTrue(window.view.spokenWords().contains("2 curves"), window.view.spokenWords());
    }

    @Test
    void aZoomStaysForTheSameAxesOnly() {
        assertFalse(window.view.zoomed());
        key('+', '+', 0);
        assertTrue(window.view.zoomed());
        key(SWT.HOME, (char) 0, 0);
        double left = last().x();
        assertTrue(left > 2);
        Picture other = picture(X);
        window.show(other);
        assertTrue(window.view.zoomed());
        key(SWT.HOME, (char) 0, 0);
        assertEquals(left, last().x(), 1e-9);
        window.show(picture(new Axis("Froude number", "", true, 1, 1e4)));
        assertFalse(window.view.zoomed());
    }

    @Test
    void allWaysBackShowEverything() {
        for (Runnable back : List.<Runnable>of(window.view::reset, () -> key('0', '0', 0),
                () -> ChartDemo.send(window.view, SWT.MouseDoubleClick, 50, 50, 1))) {
            key('-', '-', 0);
            assertTrue(window.view.zoomed());
            back.run();
            assertFalse(window.view.zoomed());
            key(SWT.HOME, (char) 0, 0);
            assertEquals(1, last().x(), 1e-9);
        }
    }

    @Test
    void theWheelZoomsAboutThePointer() {
        ChartDemo.point(window.view, 200, 100);
        double there = last().x();
        ChartDemo.send(window.view, SWT.MouseVerticalWheel, 200, 100, 0);
        assertTrue(window.view.zoomed());
        ChartDemo.point(window.view, 201, 100);
        ChartDemo.point(window.view, 200, 100);
        assertEquals(there, last().x(), 0.03 * there);
    }

    @Test
    void aDrawnRectangleIsZoomedTo() {
        ChartDemo.send(window.view, SWT.MouseDown, plot().width / 4, plot().height / 4, 1);
        ChartDemo.send(window.view, SWT.MouseMove, plot().width / 2, plot().height / 2, 0);
        ChartDemo.send(window.view, SWT.MouseUp, plot().width / 2, plot().height / 2, 1);
        key(SWT.HOME, (char) 0, 0);
        assertEquals(10, last().x(), 0.2);
        key(SWT.END, (char) 0, 0);
        assertEquals(100, last().x(), 2);
        assertEquals(List.of(), selected);
    }

    @Test
    void theRightButtonMovesWhatIsInView() {
        ChartDemo.send(window.view, SWT.MouseDown, 400, 200, 3);
        ChartDemo.send(window.view, SWT.MouseMove, 400 - plot().width / 4, 200, 0);
        ChartDemo.send(window.view, SWT.MouseUp, 400 - plot().width / 4, 200, 3);
        key(SWT.HOME, (char) 0, 0);
        assertEquals(10, last().x(), 0.2);
    }

    @Test
    void aClickSelectsTheCurveUnderIt() {
        click(plot().width / 2, plot().height / 2 + 3);
        assertEquals(List.of("fall"), selected);
        click(plot().width / 2, 5);
        assertEquals(List.of("fall"), selected, "nothing is near");
    }

    private void click(int x, int y) {
        ChartDemo.send(window.view, SWT.MouseDown, x, y, 1);
        ChartDemo.send(window.view, SWT.MouseUp, x, y, 1);
    }

    @Test
    void nothingListenedToBreaksOnBadNumbers() {
        double[] bad = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, 0, -1, 1e-320, 1e308, 5};
        for (boolean log : new boolean[] {true, false}) {
            Curve curve = new Curve("bad", "Bad", bad, bad, new boolean[8], 2, false);
            Curve none = new Curve("none", "None", new double[0], new double[0], new boolean[0], 3, false);
            window.show(new Picture(new Axis("x", "", log, Double.NaN, 0), new Axis("y", "", log, 0, 0), List.of(curve, none),
                    List.of(new Band("band", Double.NaN, -3)), Optional.of(new Mark(-1, Double.NaN, "", "")), ""));
            ChartDemo.point(window.view, 100, 100);
            key(SWT.HOME, (char) 0, 0);
            ChartDemo.settle(window.display);
            assertTrue(plot().width > 300, () -> "the plot is still there: " + plot());
        }
    }
}
