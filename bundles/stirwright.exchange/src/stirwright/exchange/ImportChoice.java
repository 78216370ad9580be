package stirwright.exchange;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Predicate;

/**
 * What somebody overruled; whatever is absent is detected. Immutable: each {@code with} gives a copy.
 *
 * @param encoding name of a character set that the JDK knows
 * @param sheets those of a workbook that are read; empty: all
 * @param putBack points that were dropped and shall be taken
 * @param leftOut points that shall be dropped
 */
public record ImportChoice(
        Optional<String> encoding, Optional<CurveSeparator> separator, Optional<DecimalSign> decimalSign,
        List<String> sheets, List<ColumnChoice> columns, List<BlockChoice> blocks,
        Set<PointPlace> putBack, Set<PointPlace> leftOut) {

    /** Nothing is overruled. */
    public static final ImportChoice DETECT = new ImportChoice(Optional.empty(), Optional.empty(), Optional.empty(),
            List.of(), List.of(), List.of(), Set.of(), Set.of());

    public ImportChoice {
        sheets = List.copyOf(sheets);
        columns = List.copyOf(columns);
        blocks = List.copyOf(blocks);
        putBack = Set.copyOf(putBack);
        leftOut = Set.copyOf(leftOut);
    }

    public ImportChoice withEncoding(Optional<String> name) {
        return new ImportChoice(name, separator, decimalSign, sheets, columns, blocks, putBack, leftOut);
    }

    public ImportChoice withSeparator(Optional<CurveSeparator> sign) {
        return new ImportChoice(encoding, sign, decimalSign, sheets, columns, blocks, putBack, leftOut);
    }

    public ImportChoice withDecimalSign(Optional<DecimalSign> sign) {
        return new ImportChoice(encoding, separator, sign, sheets, columns, blocks, putBack, leftOut);
    }

    /** An empty list reads all. */
    public ImportChoice withSheets(List<String> names) {
        return new ImportChoice(encoding, separator, decimalSign, names, columns, blocks, putBack, leftOut);
    }

    /** Replaces what was said of the same column before. */
    public ImportChoice with(ColumnChoice said) {
        List<ColumnChoice> all = others(columns, c -> c.column() == said.column() && c.sheet().equals(said.sheet()));
        all.add(said);
        return new ImportChoice(encoding, separator, decimalSign, sheets, all, blocks, putBack, leftOut);
    }

    /** Replaces what was said of the same block before. */
    public ImportChoice with(BlockChoice said) {
        List<BlockChoice> all = others(blocks, b -> b.block() == said.block());
        all.add(said);
        return new ImportChoice(encoding, separator, decimalSign, sheets, columns, all, putBack, leftOut);
    }

    /** Takes a point although it was dropped; what the last word on a point is holds. */
    public ImportChoice puttingBack(PointPlace place) {
        return new ImportChoice(encoding, separator, decimalSign, sheets, columns, blocks,
                plus(putBack, place), minus(leftOut, place));
    }

    /** Drops a point. */
    public ImportChoice leavingOut(PointPlace place) {
        return new ImportChoice(encoding, separator, decimalSign, sheets, columns, blocks,
                minus(putBack, place), plus(leftOut, place));
    }

    /** Without what speaks of single points, which no other file has at the same places. */
    public ImportChoice forOtherFiles() {
        return new ImportChoice(encoding, separator, decimalSign, sheets, columns, blocks, Set.of(), Set.of());
    }

    private static <T> List<T> others(List<T> all, Predicate<T> replaced) {
        return new ArrayList<>(all.stream().filter(replaced.negate()).toList());
    }

    private static Set<PointPlace> plus(Set<PointPlace> all, PointPlace one) {
        Set<PointPlace> more = new HashSet<>(all);
        more.add(one);
        return more;
    }

    private static Set<PointPlace> minus(Set<PointPlace> all, PointPlace one) {
        Set<PointPlace> fewer = new HashSet<>(all);
        fewer.remove(one);
        return fewer;
    }
}
