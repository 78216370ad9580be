package stirwright.conformance.internal;

import java.util.List;
import stirwright.conformance.Proof;
import stirwright.correlation.Correlation;

/**
 * The reference rows of a subject.
 *
 * @param lacks which correlations have no number from outside, and why
 * @param problems what could not be read
 */
public record ReferenceRows(List<ReferenceRow> rows, List<Lack> lacks, List<Problem> problems) {

    /** A row of the kind {@code none}. */
    record Lack(String correlation, String reason) {
        static final String KIND = "none";
    }

    /** @param place file, or file and line */
    record Problem(String place, String message) {}

    public int recalled() {
        return (int) rows.stream().filter(row -> row.kind() == RowKind.RECALLED).count();
    }

    /** What holds a correlation up. */
    public Proof proof(Correlation correlation) {
        return new Proof(correlation,
                of(correlation).stream().map(row -> new Proof.Row(row.place(), row.kind().id(), row.kind().group(),
                        row.kind().isFromOutside(), row.expected(),
                        Outcome.of(correlation, row.situation()).value(), row.tolerance(), row.source(),
                        row.family(), row.situation(), row.situation())).toList(),
                lacks.stream().filter(lack -> lack.correlation().equals(correlation.id())).map(Lack::reason).findFirst());
    }

    List<ReferenceRow> of(Correlation correlation) {
        return rows.stream().filter(row -> row.correlation().id().equals(correlation.id())).toList();
    }
}
