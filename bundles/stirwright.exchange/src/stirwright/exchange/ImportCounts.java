package stirwright.exchange;

/**
 * Where every row of a source went. A row that holds points of several samples counts once for each.
 *
 * @param rows rows of the source
 * @param beside how many points more than rows there are, since samples stand side by side
 * @param taken points in curves
 * @param dropped points with a reason
 * @param left good points in blocks that are not taken
 * @param headers rows with names, units or heads of blocks
 * @param blank rows without anything
 * @param notes rows with anything else
 */
public record ImportCounts(int rows, int beside, int taken, int dropped, int left, int headers, int blank, int notes) {

    /** Whether nothing was lost; true for every import. */
    public boolean addUp() {
        return rows + beside == taken + dropped + left + headers + blank + notes;
    }

    /** One sentence. */
    public String words() {
        return rows + " rows" + (beside > 0 ? " and " + beside + " points beside others" : "") + ": " + taken
                + " points taken, " + dropped + " dropped, " + left + " in blocks that are not taken, " + headers
                + " header rows, " + blank + " blank, " + notes + " notes";
    }
}
