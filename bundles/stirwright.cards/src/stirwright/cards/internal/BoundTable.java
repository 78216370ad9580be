package stirwright.cards.internal;

import stirwright.correlation.Bound;
import stirwright.correlation.Correlation;

/** Every bound in words, those that the source does not state with the reason. */
final class BoundTable {
    private BoundTable() {}

    static void write(Html html, Correlation card) {
        if (card.validity().isEmpty()) {
            html.leaf("p", "It speaks of no bound.");
            return;
        }
        html.open("table").open("thead").open("tr").leaf("th", "What", "scope", "col").leaf("th", "Range", "scope", "col")
                .close().close().line().open("tbody");
        for (Bound bound : card.validity()) {
            html.open("tr").leaf("th", bound.subject().title(), "scope", "row");
            if (bound instanceof Bound.NotStated silent) {
                html.open("td", "class", "quiet").words("not stated: " + silent.reason()).close();
            } else {
                html.leaf("td", bound.allowance());
            }
            html.close().line();
        }
        html.close().close().line();
    }
}
