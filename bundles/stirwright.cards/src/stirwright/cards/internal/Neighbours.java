package stirwright.cards.internal;

import java.util.List;
import stirwright.core.Entry;
import stirwright.correlation.Correlation;

/** The other cards for the same quantity of the same family: where a reader compares. */
final class Neighbours {
    private Neighbours() {}

    static void write(Html html, Holdings holdings, Correlation card) {
        List<Entry> others = holdings.entries().stream().filter(entry -> isNeighbour(entry.correlation(), card)).toList();
        html.leaf("h2", "Beside it").line();
        html.open("p").words("The same quantity" + (card.families().isEmpty() ? "" : " for the same family") + ", ")
                .leaf("a", "and " + card.quantity().title() + " of all", "href", Page.INDEX + "#quantity-" + card.quantity().id())
                .words(":").close().line();
        if (others.isEmpty()) {
            html.leaf("p", "No other card.");
            return;
        }
        html.open("ul");
        for (Entry entry : others) {
            Correlation other = entry.correlation();
            html.open("li").leaf("a", Holdings.heading(other.title()), "href", Holdings.file(other)).words(" ")
                    .leaf("span", other.modifierFor().map(effect -> "factor for " + effect.title() + ", ").orElse("")
                            + IndexPage.families(holdings, other), "class", "quiet").close();
        }
        html.close().line();
    }

    private static boolean isNeighbour(Correlation other, Correlation card) {
        return !other.id().equals(card.id()) && other.quantity().equals(card.quantity())
                && (card.families().isEmpty() ? other.families().isEmpty() : card.families().stream().anyMatch(other::holdsFor));
    }
}
