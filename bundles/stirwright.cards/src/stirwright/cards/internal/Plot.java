package stirwright.cards.internal;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import stirwright.correlation.Correlation;
import stirwright.correlation.Figures;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Measure;
import stirwright.correlation.Variable;

/** A small picture of a correlation, with words for those who do not see it. */
final class Plot {
    private static final String SVG = "http://www.w3.org/2000/svg";

    private Plot() {}

    static void write(Html html, Correlation card, Optional<PlotData> plot) {
        if (plot.isEmpty()) {
            html.leaf("p", "No plot: there is no case with numbers to draw it for.", "class", "quiet").line();
            return;
        }
        PlotData data = plot.get();
        String yTitle = card.modifierFor().isPresent() ? "factor on " + card.quantity().title()
                : card.quantity().title() + ", " + card.quantity().symbol()
                        + unit(card.quantity().unit());
        html.open("figure").line().open("svg", "xmlns", SVG, "viewBox", "0 0 " + PlotFrame.WIDTH + " " + PlotFrame.HEIGHT,
                "role", "img", "aria-labelledby", "plot-title plot-desc").line();
        html.leaf("title", card.title() + ": " + yTitle + " over " + data.sweep().title(), "id", "plot-title");
        html.leaf("desc", description(card, data), "id", "plot-desc").line();
        PlotFrame frame = PlotFrame.of(data);
        frame.axes(html, data, yTitle);
        if (data.sweep().reynolds()) {
            frame.regimes(html, data.base().family().regimes().forFluid(data.base().fluid()));
        }
        new PlotInk(html, frame).draw(data);
        html.close().line();
        html.leaf("figcaption", caption(card, data)).close().line();
    }

    private static String unit(String unit) {
        return unit.equals("-") ? "" : unit.startsWith("per ") ? " " + unit : ", in " + unit;
    }

    private static String description(Correlation card, PlotData data) {
        List<PlotData.Point> inside = data.points().stream().filter(PlotData.Point::inside).toList();
        List<PlotData.Point> told = inside.isEmpty() ? data.points() : inside;
        PlotData.Point first = told.get(0);
        PlotData.Point last = told.get(told.size() - 1);
        return (inside.isEmpty() ? "Beyond the stated range: " : "Where no stated bound fails: ")
                + card.quantity().symbol() + " " + Figures.show(first.y()) + " at " + Figures.show(first.x()) + ", "
                + Figures.show(last.y()) + " at " + Figures.show(last.x()) + ".";
    }

    private static String caption(Correlation card, PlotData data) {
        List<String> words = new ArrayList<>();
        words.add("Drawn for: " + data.base().family().title() + others(card, data) + "." );
        words.add(data.sweep().note());
        String solid = data.sweep().whole() ? "Full dots" : "Solid";
        String dashed = data.sweep().whole() ? "pale dots" : "dashed";
        words.add(!data.anyInside() ? "Beyond the stated range throughout."
                : data.allInside() ? solid + " throughout: no stated bound fails."
                : solid + ": no stated bound fails; " + dashed + ": beyond what the source states.");
        if (data.sweep().reynolds() && card.bound(Measure.REYNOLDS).map(bound -> !bound.stated()).orElse(true)) {
            words.add("The source states no range of the Reynolds number.");
        }
        if (!data.rings().isEmpty()) {
            words.add("Rings: the numbers below that it was checked against and that belong on this curve; filled when they come"
                    + " from outside.");
        }
        return String.join(" ", words.stream().filter(sentence -> !sentence.isEmpty()).toList());
    }

    /** Everything that stays, at its value. */
    private static String others(Correlation card, PlotData data) {
        Set<Variable> still = new LinkedHashSet<>(card.reads());
        still.remove(data.sweep().variable());
        Set<GeometryParameter> dimensions = new LinkedHashSet<>(data.read());
        dimensions.remove(data.sweep().dimension());
        return CaseWords.dimensions(data.base(), dimensions) + CaseWords.variables(data.base(), still);
    }
}
