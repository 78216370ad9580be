package stirwright.cards.internal;

import java.util.List;
import java.util.Locale;
import stirwright.correlation.Figures;
import stirwright.correlation.RegimeLimits;

/** The two axes of a plot with their ticks, and the regimes behind it. Sizes in units of the picture. */
record PlotFrame(Scale x, Scale y) {
    static final int WIDTH = 640;
    static final int HEIGHT = 320;
    static final int LEFT = 68;
    static final int RIGHT = 624;
    static final int TOP = 26;
    static final int BOTTOM = 262;

    private static final int TICK = 5;
    private static final int LABEL = 18;
    private static final int TITLE = 44;
    private static final int TEXT_DROP = 4;
    private static final int TITLE_IN = 16;
    /** Narrower than this a regime's word would not fit. */
    private static final int WORD = 74;

    /** From this ratio of values on the axis is logarithmic. */
    private static final double WIDE = 12;
    private static final double ROOM = 1.15;
    /** So far beyond what is within the stated range an extrapolation is followed. */
    private static final double FOLLOWED = 10;

    static PlotFrame of(PlotData data) {
        List<PlotData.Point> points = data.points();
        Sweep sweep = data.sweep();
        double half = sweep.whole() ? 0.5 : 0;
        Scale x = new Scale(points.get(0).x() - half, points.get(points.size() - 1).x() + half, sweep.logarithmic(), sweep.whole(),
                LEFT, RIGHT);
        double[] all = span(points);
        double[] kept = data.anyInside() ? span(points.stream().filter(PlotData.Point::inside).toList()) : all;
        for (PlotData.Ring ring : data.rings()) {
            kept[0] = Math.min(kept[0], ring.y());
            kept[1] = Math.max(kept[1], ring.y());
        }
        double least = kept[0] > 0 ? Math.max(all[0], kept[0] / FOLLOWED) : all[0];
        double most = kept[1] > 0 ? Math.min(all[1], kept[1] * FOLLOWED) : all[1];
        boolean logarithmic = least > 0 && most / least > WIDE;
        return new PlotFrame(x, logarithmic
                ? new Scale(least / ROOM, most * ROOM, true, false, BOTTOM, TOP)
                : new Scale(Math.min(0, least * ROOM), most > 0 ? most * ROOM : 1, false, false, BOTTOM, TOP));
    }

    private static double[] span(List<PlotData.Point> points) {
        double[] span = {Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY};
        for (PlotData.Point point : points) {
            span[0] = Math.min(span[0], point.y());
            span[1] = Math.max(span[1], point.y());
        }
        return span;
    }

    void axes(Html html, PlotData data, String yTitle) {
        html.open("g", "class", "axis").line();
        for (double tick : x.ticks()) {
            String at = number(x.at(tick));
            line(html, "grid", at, number(TOP), at, number(BOTTOM));
            line(html, "tick", at, number(BOTTOM), at, number(BOTTOM + TICK));
            label(html, x, tick, at, number(BOTTOM + LABEL), "middle");
        }
        for (double tick : y.ticks()) {
            String at = number(y.at(tick));
            line(html, "grid", number(LEFT), at, number(RIGHT), at);
            line(html, "tick", number(LEFT - TICK), at, number(LEFT), at);
            label(html, y, tick, number(LEFT - 2 * TICK), number(y.at(tick) + TEXT_DROP), "end");
        }
        html.single("path", "class", "frame", "d", "M" + LEFT + " " + TOP + "V" + BOTTOM + "H" + RIGHT);
        html.leaf("text", data.sweep().title(), "class", "title", "x", number((LEFT + RIGHT) / 2.0), "y", number(BOTTOM + TITLE),
                "text-anchor", "middle");
        String middle = number((TOP + BOTTOM) / 2.0);
        html.leaf("text", yTitle, "class", "title", "x", number(TITLE_IN), "y", middle, "text-anchor", "middle", "transform",
                "rotate(-90 " + TITLE_IN + " " + middle + ")");
        html.close().line();
    }

    /** A raised exponent instead of the characters for it, which not every font has. */
    private static void label(Html html, Scale scale, double tick, String x, String y, String anchor) {
        html.open("text", "x", x, "y", y, "text-anchor", anchor);
        scale.exponent(tick).ifPresentOrElse(exponent -> html.words("10").leaf("tspan", (exponent < 0 ? "\u2212" : "")
                + Math.abs(exponent), "dy", "-5", "class", "raised"), () -> html.words(Figures.show(tick)));
        html.close().line();
    }

    /** The family's own limits as faint lines, with words between them. */
    void regimes(Html html, RegimeLimits limits) {
        double laminar = Math.clamp(x.at(limits.laminarUpTo()), LEFT, RIGHT);
        double turbulent = Math.clamp(x.at(limits.turbulentFrom()), LEFT, RIGHT);
        html.open("g", "class", "regimes").line();
        for (double limit : new double[] {laminar, turbulent}) {
            if (limit > LEFT && limit < RIGHT) {
                line(html, "limit", number(limit), number(TOP), number(limit), number(BOTTOM));
            }
        }
        word(html, "laminar", LEFT, laminar);
        word(html, "transitional", laminar, turbulent);
        word(html, "turbulent", turbulent, RIGHT);
        html.close().line();
    }

    private static void word(Html html, String word, double from, double to) {
        if (to - from >= WORD) {
            html.leaf("text", word, "x", number((from + to) / 2), "y", number(TOP - TICK - 2), "text-anchor", "middle").line();
        }
    }

    private static void line(Html html, String kind, String x1, String y1, String x2, String y2) {
        html.single("line", "class", kind, "x1", x1, "y1", y1, "x2", x2, "y2", y2);
    }

    static String number(double value) {
        return String.format(Locale.ROOT, "%.1f", value);
    }
}
