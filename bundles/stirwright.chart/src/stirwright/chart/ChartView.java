package stirwright.chart;

import java.util.Set;
import java.util.function.Consumer;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.widgets.Composite;
import stirwright.chart.internal.Board;
import stirwright.chart.internal.Keys;
import stirwright.chart.internal.Pointer;
import stirwright.chart.internal.Voice;

/**
 * Shows a picture: curves over one variable, regime bands, an operating point and a cursor that reads all curves at once.
 * Every call is made on the UI thread.
 *
 * <p>Mouse: resting reads, the wheel zooms about the pointer, a drawn rectangle zooms, the right or middle button moves what
 * is in view, a double click shows everything, a click near a curve or on its name selects it. Keys: left and right move the
 * cursor by one pixel, with Ctrl by ten, with Shift by fifty; up and down change the emphasised curve and Enter selects it;
 * Home and End go to the edges, Escape clears, + and - zoom about the cursor, 0 shows everything.
 */
public final class ChartView extends Composite {
    private final Board board;
    private final Voice voice;

    /** A view without curves. */
    public ChartView(Composite parent, Palette palette) {
        super(parent, SWT.NONE);
        setLayout(new FillLayout());
        board = new Board(this, palette);
        new Pointer(board);
        new Keys(board);
        voice = new Voice(board);
    }

    /** Shows a picture; a zoom stays when title, unit and kind of both axes stay, else everything is shown. */
    public void show(Picture picture) {
        checkWidget();
        board.show(picture);
    }

    /** Draws one curve stronger; null for none. */
    public void highlight(String curveId) {
        checkWidget();
        board.highlight(curveId);
    }

    /** Leaves out these curves, those of later pictures included, until it is called again. */
    public void setHidden(Set<String> curveIds) {
        checkWidget();
        board.hide(curveIds);
    }

    /**
     * Whether more curves than can be named at their ends get a legend beside the plot; they do until told otherwise. Without,
     * the plot has its room, as where a table with {@link CurveStyle#paintSwatch swatches} stands beside the chart.
     */
    public void setLegend(boolean shown) {
        checkWidget();
        board.legend(shown);
    }

    /** Changes the colours. */
    public void setPalette(Palette palette) {
        checkWidget();
        board.palette(palette);
    }

    /** Takes a zoom back. */
    public void reset() {
        checkWidget();
        board.fit();
    }

    /** Whether something else than the whole picture is in view. */
    public boolean zoomed() {
        checkWidget();
        return board.zoomed();
    }

    /** Tells what the curves say wherever the cursor goes; when it leaves, x is not a number and there are no values. */
    public void onPointed(Consumer<Reading> listener) {
        board.onPointed(listener);
    }

    /** Tells the id of a curve that the user clicks, by mouse or by Enter. */
    public void onSelected(Consumer<String> listener) {
        board.onSelected(listener);
    }

    /** What a screen reader is told: what the chart shows, then the reading at the cursor. */
    public String spokenWords() {
        checkWidget();
        return voice.name() + ". " + voice.description();
    }

    /**
     * The picture as it is in view, without cursor, in a size and in colours of its own, for instance for a report.
     *
     * @param width in pixels of a screen of 100 %, which say how large text and lines are
     * @param height likewise
     * @param dots so many dots of the image for one such pixel: 1 for a screen of 100 %, 2 for one of 200 %, 3 for print
     * @param palette its colours
     */
    public ImageData image(int width, int height, double dots, Palette palette) {
        checkWidget();
        return board.image(width, height, dots, palette);
    }

    @Override
    public boolean setFocus() {
        checkWidget();
        return board.plotArea().forceFocus();
    }
}
