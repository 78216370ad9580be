package stirwright.chart.internal;

import java.util.List;
import java.util.Objects;
import java.util.Set;
import java.util.function.Consumer;
import java.util.function.Function;
import java.util.stream.Stream;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.graphics.Transform;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swtchart.Chart;
import org.eclipse.swtchart.ICustomPaintListener;
import stirwright.chart.Curve;
import stirwright.chart.Palette;
import stirwright.chart.Picture;
import stirwright.chart.Points;
import stirwright.chart.Reading;

/** The state of a chart view and what changes it. The scene is made anew when it must be, painting only paints. */
public final class Board {
    private static final Reading NOWHERE = new Reading(Double.NaN, List.of());
    private final Chart chart;
    private final Control plotArea;
    private final Lettering type;
    private Palette palette;
    private Picture picture = Picture.empty("");
    private Set<String> hidden = Set.of();
    private boolean legend = true;
    private String highlighted;
    private Span spanX = new Span(false, 0, 1);
    private Span spanY = new Span(false, 0, 1);
    private boolean zoomed;
    private Scene scene;
    private Cursor cursor;
    private Rectangle rubber;
    private Consumer<Reading> pointed = reading -> { };
    private Consumer<String> selected = id -> { };
    private Runnable spoken = () -> { };

    public Board(Composite parent, Palette palette) {
        this.palette = palette;
        chart = new Chart(parent, Chart.NO_AXIS_POSITION_UPDATE);
        plotArea = chart.getPlotArea().getControl();
        type = new Lettering(parent.getDisplay(), parent.getDisplay().getSystemFont());
        Axes.quiet(chart);
        chart.setLayout(new PlotLayout(this, plotArea));
        chart.addPaintListener(event -> ScenePainter.frame(event.gc, scene(), this.palette, highlighted));
        chart.getPlotArea().addCustomPaintListener((ICustomPaintListener) event -> paintPlot(event.gc));
        chart.addListener(SWT.Resize, event -> rebuild());
        plotArea.addListener(SWT.FocusIn, event -> plotArea.redraw());
        plotArea.addListener(SWT.FocusOut, event -> plotArea.redraw());
        chart.addListener(SWT.Dispose, event -> {
            forget();
            type.dispose();
        });
        colours();
    }

    private void colours() {
        Color page = palette.page();
        chart.setBackground(page);
        plotArea.setBackground(page);
    }

    /** The scene as it is now. */
    public Scene scene() {
        if (scene == null) {
            Point size = chart.getSize();
            GC gc = new GC(chart);
            scene = new Scene(gc, type, new Point(Math.max(1, size.x), Math.max(1, size.y)), picture, hidden, legend, spanX, spanY);
            gc.dispose();
        }
        return scene;
    }

    private void forget() {
        if (scene != null) {
            scene.dispose();
            scene = null;
        }
    }

    private void rebuild() {
        forget();
        Axes.follow(chart, spanX, spanY);
        plotArea.setBounds(scene().empty() ? new Rectangle(0, 0, 0, 0) : scene().plot());
        if (cursor != null) {
            cursor = scene.empty() ? null : Cursor.at(scene, scene.x().pixel(cursor.reading().x()), cursor.y());
        }
        chart.redraw();
    }

    public void show(Picture next) {
        if (next.equals(picture)) {
            return;
        }
        boolean keep = zoomed && next.x().sameKind(picture.x()) && next.y().sameKind(picture.y());
        picture = next;
        if (keep) {
            rebuild();
        } else {
            fit();
        }
    }

    /** Shows everything. */
    public void fit() {
        zoomed = false;
        spanX = Fit.of(picture.x(), values(Curve::x, Points::x));
        spanY = Fit.of(picture.y(), values(Curve::y, Points::y));
        rebuild();
    }

    private List<double[]> values(Function<Curve, double[]> ofCurve, Function<Points, double[]> ofPoints) {
        return Stream.concat(picture.curves().stream().map(ofCurve), picture.points().stream().map(ofPoints)).toList();
    }

    /** Shows other parts of the axes. */
    public void zoom(Span x, Span y) {
        if (!scene().empty() && !(x.equals(spanX) && y.equals(spanY))) {
            spanX = x;
            spanY = y;
            zoomed = true;
            rebuild();
        }
    }

    public boolean zoomed() {
        return zoomed;
    }

    public void hide(Set<String> curveIds) {
        if (!hidden.equals(curveIds)) {
            hidden = Set.copyOf(curveIds);
            rebuild();
        }
    }

    public void highlight(String curveId) {
        if (!Objects.equals(highlighted, curveId)) {
            highlighted = curveId;
            chart.redraw();
        }
    }

    public void palette(Palette next) {
        if (!palette.equals(next)) {
            palette = next;
            colours();
            chart.redraw();
        }
    }

    /** The cursor; null for none. */
    public Cursor cursor() {
        return cursor;
    }

    /** Sets the cursor and tells who listens; null clears it. */
    public void point(Cursor next) {
        if (Objects.equals(cursor, next)) {
            return;
        }
        cursor = next;
        plotArea.redraw();
        spoken.run();
        pointed.accept(next == null ? NOWHERE : next.reading());
    }

    /** The rectangle that the user draws; null for none. */
    public void rubber(Rectangle next) {
        rubber = next;
        plotArea.redraw();
    }

    public void select(String curveId) {
        if (curveId != null && !curveId.isEmpty()) {
            selected.accept(curveId);
        }
    }

    public void onPointed(Consumer<Reading> listener) {
        pointed = pointed.andThen(listener);
    }

    public void onSelected(Consumer<String> listener) {
        selected = selected.andThen(listener);
    }

    void onSpoken(Runnable listener) {
        spoken = listener;
    }

    Picture picture() {
        return picture;
    }

    public Chart chart() {
        return chart;
    }

    public Control plotArea() {
        return plotArea;
    }

    /** Whether curves that are too many for names at their ends get a legend. */
    public void legend(boolean shown) {
        if (legend != shown) {
            legend = shown;
            rebuild();
        }
    }

    private void paintPlot(GC gc) {
        if (scene().empty()) {
            return;
        }
        Rectangle plot = scene.plot();
        Transform shift = new Transform(gc.getDevice(), 1, 0, 0, 1, -plot.x, -plot.y);
        gc.setTransform(shift);
        ScenePainter.plot(gc, scene, palette, highlighted, cursor);
        gc.setForeground(palette.accent());
        gc.setLineWidth(1);
        if (rubber != null) {
            gc.setBackground(palette.accent());
            gc.setAlpha(Strokes.RUBBER_ALPHA);
            gc.fillRectangle(rubber);
            gc.setAlpha(255);
            gc.drawRectangle(rubber);
        }
        if (plotArea.isFocusControl()) {
            gc.drawRectangle(plot.x, plot.y, plot.width - 1, plot.height - 1);
        }
        gc.setTransform(null);
        shift.dispose();
    }

    /** Paints the picture as it is shown, without cursor and focus, in another size, with so many dots for a pixel. */
    public ImageData image(int width, int height, double dots, Palette colours) {
        Image image = new Image(chart.getDisplay(), (int) Math.round(width * dots), (int) Math.round(height * dots));
        GC gc = new GC(image);
        Transform larger = new Transform(gc.getDevice(), (float) dots, 0, 0, (float) dots, 0, 0);
        gc.setTransform(larger);
        Scene other = new Scene(gc, type, new Point(width, height), picture, hidden, legend, spanX, spanY);
        ScenePainter.frame(gc, other, colours, highlighted);
        gc.setClipping(other.plot());
        ScenePainter.plot(gc, other, colours, highlighted, null);
        other.dispose();
        larger.dispose();
        gc.dispose();
        ImageData data = image.getImageData();
        image.dispose();
        return data;
    }
}
