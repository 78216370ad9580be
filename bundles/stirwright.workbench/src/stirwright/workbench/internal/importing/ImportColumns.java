package stirwright.workbench.internal.importing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import stirwright.exchange.CurveBlock;
import stirwright.exchange.CurveColumn;
import stirwright.exchange.CurveImport;
import stirwright.exchange.RawRow;

/** The columns of a source, read or not. */
final class ImportColumns {
    /** More columns than these are not offered one by one. */
    private static final int MOST = 40;

    private ImportColumns() {}

    /**
     * One column.
     *
     * @param position from 1
     * @param header what stands above it; empty for nothing
     * @param read what it is read as; empty where it is not
     */
    record One(int position, String header, Optional<CurveColumn> read) { }

    static List<One> of(CurveImport found) {
        int count = Math.min(MOST, found.rows().stream().filter(r -> r.kind() == RawRow.Kind.POINT).limit(200)
                .mapToInt(r -> r.cells().size()).max().orElse(0));
        RawRow names = found.rows().stream().filter(r -> r.kind() == RawRow.Kind.NAMES).findFirst().orElse(null);
        List<One> all = new ArrayList<>();
        for (int i = 1; i <= count; i++) {
            all.add(new One(i, names == null ? "" : names.cell(i - 1), read(found, i)));
        }
        return all;
    }

    private static Optional<CurveColumn> read(CurveImport found, int position) {
        for (CurveBlock block : found.blocks()) {
            for (CurveColumn column : block.columns()) {
                if (column.column() == position) {
                    return Optional.of(column);
                }
            }
        }
        return Optional.empty();
    }
}
