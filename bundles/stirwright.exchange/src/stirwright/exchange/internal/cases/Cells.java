package stirwright.exchange.internal.cases;

import java.util.List;
import stirwright.core.CaseRefusedException;
import stirwright.core.Refusal;
import stirwright.exchange.DecimalSign;
import stirwright.exchange.internal.table.Header;
import stirwright.exchange.internal.table.Numbers;
import stirwright.exchange.internal.table.Row;
import stirwright.exchange.internal.table.Texts;

/**
 * The cells of one row by the names of their columns.
 *
 * @param place where the row stands, for messages, for instance "line 4"
 */
public record Cells(Header header, Row row, DecimalSign decimal, String place) {

    /** As typed, trimmed; empty when blank or when there is no such column. */
    String text(String column) {
        return row.cell(header.position(column));
    }

    /** As typed, fit for a message of one line. */
    public String shown(String column) {
        return Texts.show(text(column));
    }

    boolean given(String column) {
        return !text(column).isEmpty();
    }

    /** Those of some columns that are not blank. */
    List<String> given(List<String> columns) {
        return columns.stream().filter(this::given).toList();
    }

    /**
     * The number in a cell.
     *
     * @return NaN when blank
     * @throws CaseRefusedException when it is not a number
     */
    double number(String column) {
        String text = text(column);
        if (text.isEmpty()) {
            return Double.NaN;
        }
        double value = Numbers.parse(text, decimal);
        if (Double.isNaN(value)) {
            throw refusal(column, Numbers.problem(text, decimal));
        }
        return value;
    }

    /**
     * A number above 0.
     *
     * @return NaN when blank
     * @throws CaseRefusedException when it is not a number or not above 0
     */
    double positive(String column) {
        double value = number(column);
        if (value <= 0) {
            throw refusal(column, "must be greater than 0");
        }
        return value;
    }

    CaseRefusedException refusal(String column, String reason) {
        return new CaseRefusedException(column, shown(column), reason);
    }

    /** The same refusal with the column and the value as they stand in the file, where they do. */
    public Refusal asTyped(Refusal refusal) {
        boolean inRpm = refusal.field().equals(CaseColumns.SPEED_REV_S) && given(CaseColumns.SPEED_RPM);
        String column = inRpm ? CaseColumns.SPEED_RPM : refusal.field();
        return given(column) ? new Refusal(column, shown(column), refusal.reason()) : refusal;
    }

    /** "column value" for each, for a message that sets cells against each other. */
    String inWords(List<String> columns) {
        return String.join(" and ", columns.stream().map(c -> c + " " + shown(c)).toList());
    }
}
