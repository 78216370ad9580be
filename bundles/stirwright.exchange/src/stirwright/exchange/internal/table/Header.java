package stirwright.exchange.internal.table;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The names of a table's columns. */
public final class Header {
    private final Row row;
    private final Map<String, Integer> positions = new HashMap<>();

    Header(Row row) {
        this.row = row;
        for (int i = 0; i < row.cells().size(); i++) {
            positions.putIfAbsent(row.cell(i), i);
        }
    }

    /** Names that come from no file. */
    public static Header of(List<String> names) {
        return new Header(new Row(0, names, false, Optional.empty()));
    }

    public int line() {
        return row.line();
    }

    /** Trimmed, in the file's order; may hold blanks and repetitions. */
    public List<String> names() {
        return row.cells();
    }

    /** The column's position, or -1. */
    public int position(String name) {
        return positions.getOrDefault(name, -1);
    }

    public boolean has(String name) {
        return positions.containsKey(name);
    }

    /** The name for messages of a column at a position. */
    public String nameAt(int position) {
        String name = row.cell(position);
        return name.isEmpty() ? "column " + (position + 1) : name;
    }
}
