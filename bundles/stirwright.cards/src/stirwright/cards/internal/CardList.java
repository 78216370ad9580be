package stirwright.cards.internal;

import java.util.List;
import stirwright.core.Entry;
import stirwright.correlation.Correlation;

/** A table of cards, each a link to its page. */
final class CardList {
    private CardList() {}

    /** @param byQuantity under the heading of a quantity, so that the families are told instead of it */
    static void write(Html html, Holdings holdings, List<Entry> entries, boolean byQuantity) {
        html.open("table", "class", "cards").open("thead").open("tr");
        for (String head : List.of("Card", byQuantity ? "Family" : "Quantity", "Source", "Digits", "Standing")) {
            html.leaf("th", head, "scope", "col");
        }
        html.close().close().line().open("tbody");
        for (Entry entry : entries) {
            Correlation correlation = entry.correlation();
            html.open("tr", "data-card", correlation.id());
            html.open("td").leaf("a", Holdings.heading(correlation.title()), "href", Holdings.file(correlation));
            if (byQuantity && (correlation.modifierFor().isPresent() || correlation.flowKind().isPresent())) {
                html.words(" ").leaf("span", Holdings.gives(correlation).substring(correlation.quantity().title().length() + 2),
                        "class", "quiet");
            }
            html.words(" ").leaf("span", correlation.id(), "class", "id").close();
            html.leaf("td", byQuantity ? IndexPage.families(holdings, correlation) : Holdings.gives(correlation));
            html.leaf("td", correlation.citation().work());
            html.leaf("td", correlation.transcription().words());
            html.leaf("td", Holdings.standing(correlation)).close().line();
        }
        html.close().close().line();
    }
}
