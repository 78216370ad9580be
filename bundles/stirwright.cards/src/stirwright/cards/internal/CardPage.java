package stirwright.cards.internal;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import stirwright.core.Entry;
import stirwright.correlation.Constants;
import stirwright.correlation.Correlation;
import stirwright.correlation.Effect;
import stirwright.correlation.Family;
import stirwright.correlation.Figures;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** One correlation, always in this order: formula, plot, symbols, range, source, what was checked, conflicts, neighbours. */
public final class CardPage {
    private static final String CONFLICT = "Conflict:";

    private final Holdings holdings;
    private final Correlation card;
    private final Html html;

    private CardPage(Holdings holdings, Correlation card, Html html) {
        this.holdings = holdings;
        this.card = card;
        this.html = html;
    }

    public static String of(Holdings holdings, Entry entry) {
        Correlation card = entry.correlation();
        String title = Holdings.heading(card.title()) + ", " + card.quantity().title();
        try {
            return Page.of(title, "card", html -> new CardPage(holdings, card, html).write(entry.origin()));
        } catch (RuntimeException | LinkageError | StackOverflowError failure) {
            // Code of a contributor in its formula or its family; one defect must not take away all other cards.
            return Page.of(title, "card", html -> html.leaf("h1", Holdings.heading(card.title())).line()
                    .open("p").leaf("code", card.id()).words(" ").leaf("span", "brought by " + entry.origin(), "class", "quiet").close()
                    .leaf("p", "This card cannot be made: code of its bundle fails with " + failure
                            + ". 'check' with the bundle's file says more.", "class", "doubt").line());
        }
    }

    private void write(String origin) {
        Optional<PlotData> plot = Plotting.of(holdings, card);
        head(origin);
        formula();
        Plot.write(html, card, plot);
        SymbolTable.write(html, card, plot);
        range();
        source();
        ProofTable.write(html, card, holdings.proof(card), plot.map(PlotData::read).orElse(Set.of()));
        remarks();
        families();
        Neighbours.write(html, holdings, card);
    }

    private void head(String origin) {
        html.leaf("h1", Holdings.heading(card.title())).line();
        html.open("p", "class", "lead").words(Holdings.gives(card) + ", for ");
        if (card.families().isEmpty()) {
            html.words("any family");
        }
        String between = "";
        for (String id : card.families()) {
            html.words(between);
            holdings.family(id).ifPresentOrElse(family -> html.leaf("a", family.title(), "href", Holdings.file(family)),
                    () -> html.words("family " + id + ", which is not installed"));
            between = ", ";
        }
        html.close().open("p").leaf("code", card.id()).words(" ").leaf("span", "brought by " + origin, "class", "quiet").close();
        html.line().open("p", "class", "grades").leaf("span", Holdings.standing(card)).leaf("span", "digits "
                + card.transcription().words());
        if (!card.standing().recommendable() || !card.citation().hasSource() || card.transcription() == Transcription.UNSURE) {
            html.leaf("span", "never recommended", "class", "doubt");
        }
        html.close().line();
    }

    /** A long one has a line for each of its parts. */
    private void formula() {
        html.leaf("h2", "Formula").open("pre", "class", "formula");
        for (String part : card.formula().split("(?<=; )")) {
            html.leaf("span", part);
        }
        html.close();
        Constants constants = card.constants();
        if (!constants.names().isEmpty()) {
            html.leaf("p", (card.modifierFor().isPresent() ? "Constants: " : "Constants, by the names under which a case can change them: ")
                    + String.join(", ",
                    constants.names().stream().map(name -> name + " = " + Figures.show(constants.get(name))).toList()) + ".");
        }
        html.line();
    }

    private void range() {
        html.leaf("h2", "Where it holds").line();
        BoundTable.write(html, card);
        card.modifierFor().ifPresent(effect -> html.leaf("p", "A factor: it multiplies the " + card.quantity().title()
                + " of a correlation that does not contain the effect of " + effect.title() + ". It applies when: "
                + card.appliesWhen() + "."));
        if (card.modifierFor().isEmpty()) {
            contains();
        }
        if (card.reads().contains(Variable.REYNOLDS)) {
            html.leaf("p", "Reynolds number: " + card.reynoldsDefinition().title() + ".");
        }
        card.belongsWith().ifPresent(id -> {
            html.open("p").words("Its source used it with the shear-rate constant ");
            holdings.linked(html, id);
            html.words(".").close();
        });
        html.line();
    }

    private void contains() {
        html.leaf("p", card.contains().isEmpty() ? "It contains no effect of the vessel, so each factor for one may be applied to it."
                : "It already contains the effect of " + String.join(", ", card.contains().stream().map(Effect::title).toList())
                        + "; no factor for that is applied to it.");
    }

    private void source() {
        html.leaf("h2", "Source").leaf("p", card.citation().toString(), "class", "source");
        html.leaf("p", "Digits: " + card.transcription().words() + ". Standing: " + Holdings.standing(card) + ". "
                + (card.scatter().isPresent()
                        ? String.format(Locale.ROOT, "Scatter by the source: plus or minus %s %%.",
                                Figures.show(100 * card.scatter().getAsDouble()))
                        : "Scatter: none stated by the source.")).line();
    }

    private void remarks() {
        list("Conflicts", card.remarks().stream().filter(remark -> remark.startsWith(CONFLICT))
                .map(remark -> Holdings.heading(remark.substring(CONFLICT.length()).strip())).toList());
        list("Remarks", card.remarks().stream().filter(remark -> !remark.startsWith(CONFLICT)).toList());
    }

    private void list(String title, List<String> sentences) {
        if (!sentences.isEmpty()) {
            html.leaf("h2", title).open("ul");
            for (String sentence : sentences) {
                html.open("li");
                holdings.linked(html, sentence);
                html.close();
            }
            html.close().line();
        }
    }

    private void families() {
        List<Family> families = card.families().stream().flatMap(id -> holdings.family(id).stream()).toList();
        if (!families.isEmpty()) {
            html.leaf("h2", families.size() == 1 ? "The family" : "The families").line();
        }
        for (Family family : families) {
            html.open("p").leaf("a", family.title(), "href", Holdings.file(family)).words(": " + family.description()).close().line();
            RegimeWords.write(html, family.regimes());
        }
    }
}
