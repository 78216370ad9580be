package stirwright.workbench.internal.parts;

import java.util.Comparator;
import java.util.Locale;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;
import org.eclipse.swt.graphics.Color;
import stirwright.chart.Palette;
import stirwright.core.Role;
import stirwright.correlation.Correlation;
import stirwright.correlation.Figures;
import stirwright.correlation.Measure;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;
import stirwright.correlation.Verdict;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.session.Row;
import stirwright.workbench.internal.session.View;

/** The columns of the candidates, with how each is read and sorted. */
enum CandidateColumn {
    CANDIDATE(48, Row::title),
    FAMILY(18, Row::familyTitle),
    VALUE(Row::value, v -> Figures.show(v)),
    POWER(Row::power, v -> Figures.show(v)),
    TORQUE(Row::torque, v -> Figures.show(v)),
    DEVIATION(Row::deviation, v -> String.format(Locale.ROOT, "%+.1f", 100 * v)),
    VERDICT(38, r -> verdict(r), Comparator.comparing(Row::role).thenComparing(Row::verdict)),
    SOURCE(26, r -> r.correlation().map(c -> c.citation().toString()).orElse("")),
    GRADE(22, r -> r.correlation().map(CandidateColumn::shortGrade).orElse(""));

    /** Where the table is narrower, the source stands in the card alone. In points. */
    private static final int ROOM_FOR_SOURCE = 720;

    private final int share;
    private final Function<Row, String> text;
    private final Comparator<Row> order;
    private final boolean number;

    CandidateColumn(int share, Function<Row, String> text) {
        this(share, text, Comparator.comparing(text));
    }

    CandidateColumn(int share, Function<Row, String> text, Comparator<Row> order) {
        this.share = share;
        this.text = text;
        this.order = order;
        this.number = false;
    }

    CandidateColumn(ToDoubleFunction<Row> value, Function<Double, String> format) {
        this.share = 0;
        this.text = r -> Double.isFinite(value.applyAsDouble(r)) ? format.apply(value.applyAsDouble(r)) : "";
        this.order = Comparator.comparingDouble(value);
        this.number = true;
    }

    /** Its share of the width that numbers leave to words. */
    int share() {
        return share;
    }

    boolean number() {
        return number;
    }

    /** Where two texts differ often at their ends only, the end is kept. */
    boolean keepsEnd() {
        return this == CANDIDATE;
    }

    String text(Row row) {
        return text.apply(row);
    }

    Comparator<Row> order() {
        return order;
    }

    /** Whether a view has it. */
    boolean shownIn(View view, boolean severalFamilies, int width) {
        return switch (this) {
            case FAMILY -> severalFamilies;
            case POWER -> view == View.POWER;
            case TORQUE -> view == View.TORQUE;
            case SOURCE -> width >= ROOM_FOR_SOURCE;
            default -> true;
        };
    }

    /**
     * What a cell does not show of a row: of a candidate its source and grade, of a grade the whole, else the text that was
     * cut; null where it shows all.
     */
    String tip(Row row, String shown) {
        if (this == CANDIDATE) {
            return String.join("\n", Stream.of(row.title(), SOURCE.text(row), row.correlation().map(CandidateColumn::grade).orElse("")).filter(t -> !t.isEmpty()).toList());
        }
        if (this == GRADE) {
            return row.correlation().map(CandidateColumn::grade).orElse(null);
        }
        return number() || text(row).equals(shown) ? null : text(row);
    }

    /** What its head means; null where the words say it. */
    String tip() {
        return this == DEVIATION ? Messages.Column_deviationTip : null;
    }

    String title(View view) {
        return switch (this) {
            case CANDIDATE -> Messages.bind(Messages.Column_candidate, CaseForm.capital(view.quantity().title()));
            case FAMILY -> Messages.Column_family;
            case VALUE -> view.quantity().symbol();
            case POWER -> Messages.Column_power;
            case TORQUE -> Messages.Column_torque;
            case DEVIATION -> Messages.Column_deviation;
            case VERDICT -> Messages.Column_verdict;
            case SOURCE -> Messages.Column_source;
            case GRADE -> Messages.Column_grade;
        };
    }

    /** The bounds that fail; else what the candidate is to the case, with the verdict. */
    private static String verdict(Row row) {
        String word = verdict(row.verdict());
        boolean set = row.role() == Role.CHOSEN || row.pick();
        String bounds = row.failedBounds().isEmpty() ? word : word + ": " + String.join("; ", row.failedBounds().stream().map(CandidateColumn::brief).toList());
        return row.failedBounds().isEmpty() || set ? role(row) + ", " + bounds : bounds;
    }

    /** "Re 827 (at least 10000)" for "Reynolds number 827 is outside (at least 10000)": the verdict stands before it. */
    private static String brief(String bound) {
        return bound.replace(Measure.REYNOLDS.title() + " ", Variable.REYNOLDS.symbol() + " ")
                .replaceFirst(" is (" + Verdict.OUTSIDE.id() + "|" + Verdict.NEAR.id() + ") \\(", " (");
    }

    static String verdict(Verdict verdict) {
        return switch (verdict) {
            case INSIDE -> Messages.Verdict_inside;
            case NOT_STATED -> Messages.Verdict_notStated;
            case NEAR -> Messages.Verdict_near;
            case OUTSIDE -> Messages.Verdict_outside;
        };
    }

    static Color colour(Verdict verdict, Palette palette) {
        return switch (verdict) {
            case INSIDE -> palette.inside();
            case NOT_STATED -> palette.notStated();
            case NEAR -> palette.near();
            case OUTSIDE -> palette.outside();
        };
    }

    /** A pick that was neither chosen nor recommended is only the nearest. */
    static String role(Row row) {
        if (row.pick() && (row.role() == Role.CANDIDATE || row.role() == Role.EXCLUDED)) {
            return Messages.Role_nearest;
        }
        return switch (row.role()) {
            case RECOMMENDED -> Messages.Role_recommended;
            case CHOSEN -> Messages.Role_chosen;
            case CANDIDATE -> Messages.Role_candidate;
            case EXCLUDED -> Messages.Role_excluded;
        };
    }

    static String grade(Correlation correlation) {
        return (correlation.citation().hasSource() ? correlation.standing().words() : Messages.Grade_ruleOfTrade) + ", "
                + correlation.transcription().words();
    }

    /** The same in as few words as a narrow column takes: who stands behind it, unless its digits are in doubt. */
    private static String shortGrade(Correlation correlation) {
        if (correlation.transcription() == Transcription.UNSURE) {
            return Messages.Digits_unsure;
        }
        return correlation.citation().hasSource() ? correlation.standing().words() : Messages.Grade_ruleOfTradeBriefly;
    }
}
