package stirwright.cards.internal;

import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import stirwright.conformance.Proof;
import stirwright.correlation.Correlation;
import stirwright.correlation.Figures;
import stirwright.correlation.GeometryParameter;

/** What a correlation was checked against: each number, where it comes from, and how near the two are. */
final class ProofTable {
    private ProofTable() {}

    static void write(Html html, Correlation card, Optional<Proof> proof, Set<GeometryParameter> read) {
        html.leaf("h2", "What it was checked against", "id", "checks").line();
        if (proof.isEmpty() || proof.get().rows().isEmpty()) {
            html.leaf("p", "No number: its bundle brings no reference row for it.");
        } else {
            rows(html, card, proof.get(), read);
        }
        proof.flatMap(Proof::lack).ifPresent(reason -> html.leaf("p", "No number from outside: " + reason, "class", "doubt"));
    }

    private static void rows(Html html, Correlation card, Proof proof, Set<GeometryParameter> read) {
        html.open("div", "class", "wide").open("table").open("thead").open("tr");
        html.leaf("th", "Number from", "scope", "col").leaf("th", "At", "scope", "col")
                .leaf("th", "Expected", "scope", "col", "class", "figure").leaf("th", "Computed", "scope", "col", "class", "figure")
                .leaf("th", "Off by", "scope", "col", "class", "figure").leaf("th", "Agreed", "scope", "col", "class", "figure")
                .close().close().line().open("tbody");
        for (Proof.Row row : proof.rows()) {
            boolean met = Math.abs(row.deviation()) <= row.tolerance();
            html.open("tr", "class", row.fromOutside() ? "outside" : "own");
            html.open("td").leaf("strong", row.group())
                    .words(row.source().startsWith(row.group()) ? row.source().substring(row.group().length()) : ": " + row.source())
                    .close();
            html.leaf("td", at(card, row, read));
            html.leaf("td", Figures.show(row.expected()), "class", "figure");
            html.leaf("td", Figures.show(row.computed()), "class", "figure");
            html.leaf("td", deviation(row) + (met ? "" : ", missed"), "class", "figure");
            html.leaf("td", String.format(Locale.ROOT, "%s %%", Figures.show(100 * row.tolerance())), "class", "figure");
            html.close().line();
        }
        html.close().close().close().line();
    }

    private static String deviation(Proof.Row row) {
        String words = String.format(Locale.ROOT, "%+.2f %%", 100 * row.deviation());
        return Double.isNaN(row.deviation()) ? "unknown" : words.substring(1).equals("0.00 %") ? "0 %" : words;
    }

    private static String at(Correlation card, Proof.Row row, Set<GeometryParameter> read) {
        return row.family().title() + CaseWords.dimensions(row.geometry(), read) + CaseWords.variables(row.point(), card.reads());
    }
}
