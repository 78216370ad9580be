package stirwright.cards.internal;

import java.util.ArrayList;
import java.util.List;

/** The curve of a plot: strong where no stated bound fails, faint and dashed beyond. */
record PlotInk(Html html, PlotFrame frame) {
    private static final String DOT = "4.5";
    private static final String RING = "5";

    void draw(PlotData data) {
        html.open("clipPath", "id", "area").single("rect", "x", "" + PlotFrame.LEFT, "y", "" + (PlotFrame.TOP - 6),
                "width", "" + (PlotFrame.RIGHT - PlotFrame.LEFT), "height", "" + (PlotFrame.BOTTOM - PlotFrame.TOP + 6)).close();
        html.open("g", "clip-path", "url(#area)").line();
        if (data.sweep().whole()) {
            for (PlotData.Point point : drawable(data)) {
                circle(point.inside() ? "dot" : "dot beyond", point.x(), point.y(), DOT);
            }
        } else {
            runs(drawable(data)).forEach(this::run);
        }
        for (PlotData.Ring ring : data.rings()) {
            circle(ring.fromOutside() ? "ring outside" : "ring", ring.x(), ring.y(), RING);
        }
        html.close().line();
    }

    /** A logarithmic axis has no place for the rest. */
    private List<PlotData.Point> drawable(PlotData data) {
        return data.points().stream().filter(point -> !frame.y().logarithmic() || point.y() > 0).toList();
    }

    private static List<List<PlotData.Point>> runs(List<PlotData.Point> points) {
        List<List<PlotData.Point>> runs = new ArrayList<>();
        PlotData.Point last = null;
        for (PlotData.Point point : points) {
            if (last == null || last.inside() != point.inside()) {
                runs.add(new ArrayList<>());
            }
            runs.get(runs.size() - 1).add(point);
            last = point;
        }
        return runs;
    }

    private void run(List<PlotData.Point> points) {
        StringBuilder path = new StringBuilder();
        for (PlotData.Point point : points) {
            path.append(path.isEmpty() ? 'M' : 'L').append(PlotFrame.number(frame.x().at(point.x()))).append(' ')
                    .append(PlotFrame.number(frame.y().at(point.y())));
        }
        html.single("path", "class", points.get(0).inside() ? "curve" : "curve beyond", "d", path.toString()).line();
    }

    private void circle(String kind, double x, double y, String radius) {
        html.single("circle", "class", kind, "cx", PlotFrame.number(frame.x().at(x)), "cy", PlotFrame.number(frame.y().at(y)),
                "r", radius).line();
    }
}
