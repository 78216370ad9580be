package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import stirwright.exchange.BlockChoice;
import stirwright.exchange.ColumnChoice;
import stirwright.exchange.CurveQuantity;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.internal.table.Texts;

/** What was chosen, or stands in a template, and finds nothing in this source, a sentence each. */
final class ChoiceCheck {

    private ChoiceCheck() {}

    /**
     * @param sheets the names of those that are read; one empty name for a text
     * @param blocks how many there are
     */
    static List<String> unmatched(ImportChoice choice, List<String> sheets, List<WorkRow> rows, int blocks) {
        List<String> words = new ArrayList<>();
        for (String sheet : choice.sheets()) {
            if (!sheets.contains(sheet)) {
                words.add("the sheet '" + Texts.show(sheet) + "' is chosen, but " + none(sheets) + ": this has no effect");
            }
        }
        Map<String, Integer> widths = new HashMap<>();
        int widest = 0;
        if (!choice.columns().isEmpty()) {
            for (WorkRow row : rows) {
                widest = Math.max(widest, row.row.cells().size());
                widths.merge(row.sheet, row.row.cells().size(), Math::max);
            }
        }
        for (ColumnChoice column : choice.columns()) {
            String what = "column " + column.column() + " is chosen" + column.quantity().map(q -> " for the " + q.words()).orElse("");
            int width = column.sheet().isEmpty() ? widest : widths.getOrDefault(column.sheet(), 0);
            if (!column.sheet().isEmpty() && !sheets.contains(column.sheet())) {
                words.add(what + " on the sheet '" + Texts.show(column.sheet()) + "', but " + none(sheets) + ": this has no effect");
            } else if (column.column() > width) {
                words.add(what + ", but the widest row has " + width + (width == 1 ? " cell" : " cells") + ": this has no effect");
            } else if (column.quantity().isPresent() && isStrange(column.quantity().get(), column.unit())) {
                words.add(what + " in '" + Texts.show(column.unit()) + "', a unit that is not known for it: the column is not read");
            }
        }
        for (BlockChoice block : choice.blocks()) {
            if (block.block() > blocks) {
                words.add("block " + block.block() + " is chosen, but there " + (blocks == 1 ? "is 1 block" : "are " + blocks + " blocks")
                        + ": this has no effect");
            }
        }
        return words;
    }

    private static String none(List<String> sheets) {
        return sheets.equals(List.of("")) ? "a text has no sheets" : "the sheets that are read are " + String.join(", ", sheets);
    }

    private static boolean isStrange(CurveQuantity quantity, String unit) {
        return !unit.isEmpty() && quantity.measured() && UnitWords.find(quantity, unit).isEmpty()
                && !(quantity == CurveQuantity.TORQUE && UnitWords.find(CurveQuantity.TORQUE_PERCENT, unit).isPresent());
    }
}
