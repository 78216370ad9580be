package stirwright.exchange;

/**
 * Where a point stands in its source.
 *
 * @param sheet of a workbook; empty for text
 * @param line from 1
 * @param sample from 1; above 1 only where several samples stand side by side
 */
public record PointPlace(String sheet, int line, int sample) {

    /** For messages. */
    public String words() {
        return (sheet.isEmpty() ? "" : "sheet '" + sheet + "', ") + "line " + line
                + (sample > 1 ? ", sample " + sample : "");
    }
}
