package stirwright.exchange.internal.curves;

import java.util.Optional;
import stirwright.exchange.internal.curves.Stretch.Heads;
import stirwright.exchange.internal.table.Numbers;
import stirwright.exchange.internal.table.SourceRow;
import stirwright.exchange.internal.table.Texts;

/**
 * Heads of curves in a set of many: number, name and a third cell; pairs of shear rate and stress follow, and an empty
 * line ends the curve.
 */
final class SetHeads {

    /** The head of a curve; empty when it is none. */
    Optional<Heads> read(SourceRow row, boolean afterGap) {
        boolean named = isCount(row.cell(0)) && !row.cell(1).isEmpty() && !Numbers.isNumber(row.cell(1));
        boolean third = row.filled() == 3 && isCount(row.cell(2)) && isCount(row.cell(0)) && !row.cell(1).isEmpty();
        return named && (afterGap || third) || third && afterGap
                ? Optional.of(new Heads(Texts.show(row.cell(0)), Texts.show(row.cell(1)), "", "", "")) : Optional.empty();
    }

    private static boolean isCount(String cell) {
        return !cell.isEmpty() && cell.length() < 10 && cell.chars().allMatch(c -> c >= '0' && c <= '9');
    }
}
