package stirwright.conformance.internal;

import java.util.List;
import stirwright.correlation.Correlation;

/**
 * The reference rows of a subject.
 *
 * @param problems what could not be read
 */
public record ReferenceRows(List<ReferenceRow> rows, List<Problem> problems) {

    /** @param place file, or file and line */
    record Problem(String place, String message) {}

    public int recalled() {
        return (int) rows.stream().filter(row -> row.kind() == RowKind.RECALLED).count();
    }

    List<ReferenceRow> of(Correlation correlation) {
        return rows.stream().filter(row -> row.correlation().id().equals(correlation.id())).toList();
    }
}
