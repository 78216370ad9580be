package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.List;
import stirwright.exchange.CurveQuantity;
import stirwright.exchange.internal.table.SourceRow;
import stirwright.exchange.internal.table.Texts;

/** Rows of points of one sample under one head. */
final class Stretch {
    final Layout layout;
    final Group group;
    final String sheet;
    final Heads heads;
    /** The names above; null without. */
    final SourceRow names;
    final List<WorkRow> rows = new ArrayList<>();

    Stretch(Layout layout, Group group, String sheet, Heads heads, SourceRow names) {
        this.names = names;
        this.layout = layout;
        this.group = group;
        this.sheet = sheet;
        this.heads = heads;
    }

    /**
     * What the heads above call it.
     *
     * @param own a number of its own that is its label; empty without
     * @param sample the sample's name
     * @param run the run's or test's name
     * @param block the interval's name
     * @param title a line of words that are not known
     */
    record Heads(String own, String sample, String run, String block, String title) {
        static final Heads NONE = new Heads("", "", "", "", "");

        /** All of it in one line. */
        String words() {
            return String.join(", ", List.of(own, sample, title, run, block).stream().filter(w -> !w.isEmpty()).toList());
        }
    }

    /**
     * What the sample of a row is called, by its own cell, by the header of its columns or by the head above.
     *
     * @param above what that of the row above is called: a merged cell is written once
     */
    String sample(SourceRow row, String above) {
        Column column = group.column(CurveQuantity.SAMPLE);
        return column != null ? row.cell(column.position()).isEmpty() ? above : Texts.show(row.cell(column.position()))
                : group.label().isEmpty() || layout.groups().size() == 1 ? heads.sample() : group.label();
    }
}
