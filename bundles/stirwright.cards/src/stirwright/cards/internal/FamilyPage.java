package stirwright.cards.internal;

import java.util.ArrayList;
import java.util.List;
import stirwright.core.Entry;
import stirwright.correlation.Fallback;
import stirwright.correlation.Family;
import stirwright.correlation.Figures;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.GeometryParameter.Default;

/** One impeller family: what it looks like, how each dimension is measured, and its cards. */
public final class FamilyPage {
    /** Farther than any limit that somebody chose. */
    private static final double OPEN = 1e300;

    private FamilyPage() {}

    public static String of(Holdings holdings, Family family) {
        return Page.of(Holdings.heading(family.title()), "family", html -> {
            html.leaf("h1", Holdings.heading(family.title())).line();
            html.leaf("p", family.description(), "class", "lead");
            html.open("p").leaf("code", family.id()).words(" ")
                    .leaf("span", "brought by " + holdings.originOf(family), "class", "quiet").close().line();
            html.leaf("h2", "Regimes").line();
            RegimeWords.write(html, family.regimes());
            html.leaf("h2", "Dimensions").leaf("p", "A blank takes the first that follows; an assumed one is flagged in results.");
            parameters(html, family);
            html.leaf("h2", "Its cards").line();
            List<Entry> own = holdings.madeFor(family.id());
            if (own.isEmpty()) {
                html.leaf("p", "No correlation names this family.");
            } else {
                CardList.write(html, holdings, own, false);
            }
            if (!holdings.forAny().isEmpty()) {
                html.open("p").words("Cards that hold for ").leaf("a", "any family", "href", Page.INDEX + "#any-family")
                        .words(" apply too.").close().line();
            }
        });
    }

    private static void parameters(Html html, Family family) {
        html.open("div", "class", "wide").open("table").open("thead").open("tr");
        for (String head : List.of("Symbol", "Dimension", "Column of a case table", "How it is measured", "When blank", "Limits")) {
            html.leaf("th", head, "scope", "col");
        }
        html.close().close().line().open("tbody");
        for (GeometryParameter parameter : family.parameters()) {
            html.open("tr").leaf("th", parameter.symbol(), "scope", "row").leaf("td", parameter.title())
                    .open("td").leaf("code", parameter.column()).close().leaf("td", parameter.meaning())
                    .leaf("td", whenBlank(parameter)).leaf("td", limits(parameter)).close().line();
        }
        html.close().close().close().line();
    }

    private static String whenBlank(GeometryParameter parameter) {
        List<String> words = new ArrayList<>();
        for (Fallback fallback : parameter.fallbacks()) {
            words.add(fallback.words() + (fallback.kind() == Default.ASSUMED ? " (assumed)" : ""));
        }
        return words.isEmpty() ? "must be given" : String.join("; else ", words);
    }

    private static String limits(GeometryParameter parameter) {
        String unit = parameter.kind().columnUnit().equals("-") ? "" : " " + parameter.kind().columnUnit();
        String most = parameter.max() < OPEN ? " to " + Figures.show(parameter.toColumn(parameter.max())) : "";
        if (parameter.min() == Double.MIN_VALUE) {
            return most.isEmpty() ? "above 0" : "above 0," + most + unit;
        }
        String least = Figures.show(parameter.toColumn(parameter.min()));
        return most.isEmpty() ? "at least " + least + unit : least + most + unit;
    }
}
