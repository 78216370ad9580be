package stirwright.workbench.internal.parts;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StyleRange;
import stirwright.core.BoundFinding;
import stirwright.core.CaseResult;
import stirwright.correlation.Correlation;
import stirwright.correlation.Effect;
import stirwright.correlation.FlowKind;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.session.Outcome;
import stirwright.workbench.internal.session.Row;
import stirwright.workbench.internal.session.Sheet;

/** The words of a card, and which of them are headings. */
final class CardText {
    static final CardText NOTHING = new CardText();

    private final StringBuilder words = new StringBuilder();
    private final List<int[]> headings = new ArrayList<>();

    private CardText() {}

    /** The candidate's card, then what the case itself must tell. */
    static CardText of(Outcome outcome, Optional<Row> row) {
        CardText card = new CardText();
        CaseResult result = outcome.main().result();
        result.refusal().ifPresent(r -> card.section(Messages.Card_refused, List.of(outcome.words().of(r))));
        row.ifPresent(r -> card.candidate(outcome, r));
        if (!result.flags().isEmpty()) {
            card.section(Messages.Card_flags, outcome.words().of(result.flags()));
        }
        if (!result.notes().isEmpty()) {
            card.section(Messages.Card_notes, outcome.words().of(result.notes()));
        }
        if (!outcome.catalogue().problems().isEmpty()) {
            card.section(Messages.Card_problems, outcome.catalogue().problems());
        }
        return card;
    }

    private void candidate(Outcome outcome, Row row) {
        heading(row.title() + (outcome.sheets().size() > 1 ? ", " + row.familyTitle() : ""));
        line(row.why().isEmpty() ? CandidateColumn.role(row) : row.why());
        row.correlation().ifPresent(c -> {
            section(Messages.Card_formula, formula(c));
            section(Messages.Card_range, range(outcome, row, c));
            section(Messages.Card_source, source(c));
            if (!c.remarks().isEmpty()) {
                section(Messages.Card_remarks, c.remarks());
            }
        });
    }

    private static List<String> formula(Correlation c) {
        List<String> lines = new ArrayList<>(List.of(c.formula()));
        c.flowKind().map(FlowKind::id).ifPresent(lines::add);
        if (!c.contains().isEmpty()) {
            lines.add(Messages.bind(Messages.Card_contains,
                    String.join(", ", c.contains().stream().map(Effect::title).toList())));
        }
        return lines;
    }

    private static List<String> range(Outcome outcome, Row row, Correlation c) {
        return outcome.sheets().stream().filter(s -> s.familyId().equals(row.familyId()) && s.computed()).findFirst()
                .flatMap(Sheet::open)
                .map(open -> open.bounds(c.quantity(), c.id()).stream().map(CardText::bound).toList())
                .orElseGet(() -> c.validity().stream().map(b -> b.words()).toList());
    }

    private static String bound(BoundFinding bound) {
        return bound.verdict().fails()
                ? Messages.bind(Messages.Card_boundFails,
                        new Object[] {bound.bound(), CandidateColumn.verdict(bound.verdict()), bound.found()})
                : Messages.bind(Messages.Card_boundHolds, bound.bound(), CandidateColumn.verdict(bound.verdict()));
    }

    private static List<String> source(Correlation c) {
        List<String> lines = new ArrayList<>(List.of(c.citation().toString(), CandidateColumn.grade(c)));
        c.scatter().ifPresent(s -> lines.add(Messages.bind(Messages.Card_scatter, String.format(Locale.ROOT, "%.0f", 100 * s))));
        lines.add(c.id());
        return lines;
    }

    private void section(String title, List<String> lines) {
        heading(title);
        lines.forEach(this::line);
    }

    private void heading(String title) {
        if (words.length() > 0) {
            words.append('\n');
        }
        headings.add(new int[] {words.length(), title.length()});
        line(title);
    }

    private void line(String text) {
        words.append(text).append('\n');
    }

    String words() {
        return words.toString();
    }

    StyleRange[] styles() {
        return headings.stream().map(h -> new StyleRange(h[0], h[1], null, null, SWT.BOLD)).toArray(StyleRange[]::new);
    }
}
