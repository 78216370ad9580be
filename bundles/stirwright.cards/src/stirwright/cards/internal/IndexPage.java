package stirwright.cards.internal;

import java.util.List;
import stirwright.core.Entry;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;
import stirwright.correlation.Quantity;

/** All cards, by family and by quantity. */
public final class IndexPage {
    private static final String TITLE = "Correlation cards";

    private IndexPage() {}

    public static String of(Holdings holdings) {
        return Page.of(TITLE, "index", html -> {
            html.leaf("h1", TITLE).line();
            html.leaf("p", holdings.entries().size() + " correlations and " + holdings.families().size() + " impeller families"
                    + " are installed. A card has the formula, its symbols and units, the range that its source states, the"
                    + " source, and what its numbers were checked against.", "class", "lead").line();
            contents(html, holdings);
            filter(html);
            html.leaf("h2", "By family", "id", "families").line();
            for (Family family : holdings.families()) {
                html.open("section", "class", "list", "id", "family-" + family.id());
                html.open("h3").leaf("a", Holdings.heading(family.title()), "href", Holdings.file(family)).close().line();
                List<Entry> own = holdings.madeFor(family.id());
                if (own.isEmpty()) {
                    html.leaf("p", "No correlation names this family; those for any family apply.");
                } else {
                    CardList.write(html, holdings, own, false);
                }
                html.close().line();
            }
            if (!holdings.forAny().isEmpty()) {
                html.open("section", "class", "list", "id", "any-family").leaf("h3", "For any family").line();
                CardList.write(html, holdings, holdings.forAny(), false);
                html.close().line();
            }
            orphans(html, holdings);
            html.leaf("h2", "By quantity", "id", "quantities").line();
            for (Quantity quantity : holdings.quantities()) {
                html.open("section", "class", "list", "id", "quantity-" + quantity.id()).leaf("h3", Holdings.heading(quantity.title())).line();
                CardList.write(html, holdings, holdings.entries().stream()
                        .filter(entry -> entry.correlation().quantity().equals(quantity)).toList(), true);
                html.close().line();
            }
            html.leaf("script", "", "src", Page.SCRIPT).line();
        });
    }

    /** Those that name only families which nobody describes at the moment. */
    private static void orphans(Html html, Holdings holdings) {
        List<Entry> orphans = holdings.entries().stream().filter(entry -> !entry.correlation().families().isEmpty()
                && entry.correlation().families().stream().allMatch(id -> holdings.family(id).isEmpty())).toList();
        if (!orphans.isEmpty()) {
            html.open("section", "class", "list", "id", "no-family").leaf("h3", "For families that are not installed").line();
            CardList.write(html, holdings, orphans, true);
            html.close().line();
        }
    }

    private static void contents(Html html, Holdings holdings) {
        html.open("nav", "class", "contents").open("p").leaf("a", "By family", "href", "#families").words(": ");
        for (Family family : holdings.families()) {
            html.leaf("a", family.title(), "href", "#family-" + family.id()).words(", ");
        }
        if (holdings.forAny().isEmpty()) {
            html.words("none for any family");
        } else {
            html.leaf("a", "any family", "href", "#any-family");
        }
        html.close().open("p").leaf("a", "By quantity", "href", "#quantities").words(": ");
        List<Quantity> quantities = holdings.quantities();
        for (Quantity quantity : quantities) {
            html.words(quantity.equals(quantities.get(0)) ? "" : ", ")
                    .leaf("a", quantity.title(), "href", "#quantity-" + quantity.id());
        }
        html.close().close().line();
    }

    /** Shown by the script that makes it work. */
    private static void filter(Html html) {
        html.open("p", "id", "filter", "hidden", "hidden").leaf("label", "Show only cards with these words", "for", "words")
                .words(" ").single("input", "id", "words", "type", "search", "autocomplete", "off")
                .words(" ").leaf("span", "", "id", "shown", "role", "status").close().line();
    }

    /** The families of a correlation, in words. */
    static String families(Holdings holdings, Correlation correlation) {
        return correlation.families().isEmpty() ? "any family" : String.join(", ", correlation.families().stream()
                .map(id -> holdings.family(id).map(Family::title).orElse(id + " (not installed)")).toList());
    }
}
