package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import stirwright.exchange.ColumnChoice;
import stirwright.exchange.CurveQuantity;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.internal.table.SourceRow;
import stirwright.exchange.internal.table.Texts;

/** Makes a layout of a row of names, the row of units below it and the row of samples above it. */
final class LayoutBuilder {
    static final String BY_HAND = "chosen by hand";

    /** What is said of every viscosity or stress and names no sample. */
    private static final Set<String> NO_SAMPLE = Set.of("", "apparent", "dynamic", "dyn", "steady", "steady state", "measured",
            "mean", "average", "calculated", "actual", "shear", "scheinbare", "dynamische", "gemessene", "apparente", "dynamique",
            "aparente", "dinamica");

    private final String sheet;
    private final ImportChoice choice;
    private final HeaderCells headers;
    private final List<String> problems = new ArrayList<>();
    private final List<String> notes = new ArrayList<>();
    private final Map<Column, String> labels = new IdentityHashMap<>();

    LayoutBuilder(String sheet, ImportChoice choice, HeaderCells headers) {
        this.sheet = sheet;
        this.choice = choice;
        this.headers = headers;
    }

    /**
     * @param units the row below; null for none
     * @param above the row above, which may name samples; null for none
     */
    Layout build(SourceRow names, SourceRow units, SourceRow above) {
        int width = Math.max(names.cells().size(), units == null ? 0 : units.cells().size());
        width = Math.max(width, choice.columns().stream().mapToInt(ColumnChoice::column).max().orElse(0));
        List<Column> columns = new ArrayList<>();
        int last = 0;
        for (int i = 0; i < width; i++) {
            Column column = column(names.cell(i), units == null ? "" : units.cell(i), i);
            if (column != null) {
                labels.putIfAbsent(column, labelAbove(above, i));
                columns.add(column);
            }
            last = names.cell(i).isEmpty() ? last : i + 1;
        }
        byUnit(names, units, columns, above);
        List<Group> groups = new ArrayList<>();
        for (Group group : grouped(columns)) {
            if (group.complete()) {
                groups.add(group);
            } else {
                problems.add(missing(names, group));
            }
        }
        return new Layout(names.line(), List.copyOf(groups), last, List.copyOf(problems), List.copyOf(notes), List.of());
    }

    private Column column(String name, String unitBelow, int position) {
        Optional<ColumnChoice> said = choice.columns().stream().filter(c -> c.speaksOf(sheet, position + 1)).findFirst();
        Optional<HeaderCell> read = headers.read(name);
        if (said.isPresent()) {
            CurveQuantity quantity = said.get().quantity().orElse(null);
            String unit = !said.get().unit().isEmpty() ? said.get().unit() : !unitBelow.isEmpty() ? inside(unitBelow)
                    : read.map(HeaderCell::unit).orElse("");
            return quantity == null ? null : scaled(name, quantity, unit, position, BY_HAND);
        }
        if (read.isEmpty()) {
            return null;
        }
        String unit = inside(unitBelow).isEmpty() ? read.get().unit() : inside(unitBelow);
        Column column = scaled(name, read.get().quantity(), unit, position, "by its name");
        if (column != null && !NO_SAMPLE.contains(Folded.of(read.get().label()).words())) {
            labels.put(column, read.get().label());
        }
        return column;
    }

    /** What no name says, the unit of a column may say, if it is the only one. */
    private void byUnit(SourceRow names, SourceRow units, List<Column> columns, SourceRow above) {
        boolean rated = columns.stream().anyMatch(c -> c.quantity() == CurveQuantity.SHEAR_RATE);
        boolean stressed = columns.stream().anyMatch(c -> isMain(c) && c.quantity() != CurveQuantity.SHEAR_RATE);
        for (CurveQuantity quantity : List.of(CurveQuantity.SHEAR_RATE, CurveQuantity.SHEAR_STRESS, CurveQuantity.VISCOSITY)) {
            List<Column> told = new ArrayList<>();
            for (int i = 0; i < names.cells().size() && !(quantity == CurveQuantity.SHEAR_RATE ? rated : stressed); i++) {
                int column = i + 1;
                Optional<HeaderCell> cell = choice.columns().stream().anyMatch(c -> c.speaksOf(sheet, column)) ? Optional.empty()
                        : headers.byUnit(names.cell(i), units == null ? "" : inside(units.cell(i)));
                if (cell.isPresent() && cell.get().quantity() == quantity) {
                    told.add(scaled(names.cell(i), quantity, cell.get().unit(), i, "no name says so, but no other unit is one of a "
                            + quantity.words()));
                }
            }
            if (told.size() == 1) {
                labels.put(told.get(0), labelAbove(above, told.get(0).position()));
                columns.add(told.get(0));
            } else if (told.size() > 1) {
                notes.add("several columns have a unit of a " + quantity.words() + " and no name that is known: "
                        + String.join(", ", told.stream().map(Column::name).toList()) + "; choose the one that holds it");
            }
        }
        columns.sort(Comparator.comparingInt(Column::position));
    }

    private Column scaled(String name, CurveQuantity named, String unit, int position, String reason) {
        boolean percent = named == CurveQuantity.TORQUE && UnitWords.find(CurveQuantity.TORQUE_PERCENT, unit).isPresent();
        CurveQuantity quantity = percent ? CurveQuantity.TORQUE_PERCENT : named;
        if (!quantity.measured()) {
            return new Column(position, name, quantity, UnitWords.own(quantity), reason);
        }
        if (unit.isEmpty()) {
            return new Column(position, name, quantity, UnitWords.own(quantity), reason + "; no unit stands there, "
                    + quantity.unit() + " is assumed");
        }
        Optional<UnitScale> scale = UnitWords.find(quantity, unit);
        if (scale.isEmpty()) {
            notes.add("column " + (position + 1) + " '" + Texts.show(name) + "': the unit '" + Texts.show(unit)
                    + "' is not known for a " + quantity.words() + ", so the column is not read; choose its unit");
            return null;
        }
        return new Column(position, name, quantity, scale.get(), reason);
    }

    static String inside(String unit) {
        String text = unit.strip();
        return text.length() > 1 && "[({<".indexOf(text.charAt(0)) >= 0 ? text.substring(1, text.length() - 1).strip() : text;
    }

    /** A merged cell stands over all columns to its right, up to the next one. */
    private static String labelAbove(SourceRow above, int position) {
        for (int i = position; above != null && i >= 0; i--) {
            if (!above.cell(i).isEmpty()) {
                return above.cell(i);
            }
        }
        return "";
    }

    private List<Group> grouped(List<Column> columns) {
        long rates = columns.stream().filter(c -> c.quantity() == CurveQuantity.SHEAR_RATE).count();
        List<Group> groups = new ArrayList<>();
        Map<CurveQuantity, Column> now = new EnumMap<>(CurveQuantity.class);
        Map<CurveQuantity, Column> coming = new EnumMap<>(CurveQuantity.class);
        for (Column column : columns) {
            Column before = now.get(column.quantity());
            if (before == null) {
                now.put(column.quantity(), column);
            } else if (!isMain(column)) {
                coming.putIfAbsent(column.quantity(), column);
            } else if (rates > 1 || !labels.get(before).equals(labels.get(column))) {
                groups.add(group(groups.size() + 1, now));
                Map<CurveQuantity, Column> next = rates > 1 ? new EnumMap<>(CurveQuantity.class) : shared(now);
                next.putAll(coming);
                next.put(column.quantity(), column);
                now = next;
                coming = new EnumMap<>(CurveQuantity.class);
            } else {
                notes.add(column.words() + " is not read: " + before.name() + " holds that already; choose it to read it instead");
            }
        }
        groups.add(group(groups.size() + 1, now));
        return groups;
    }

    /** With one shear rate for all, samples share whatever is no stress and no viscosity. */
    private static EnumMap<CurveQuantity, Column> shared(Map<CurveQuantity, Column> columns) {
        EnumMap<CurveQuantity, Column> shared = new EnumMap<>(columns);
        shared.remove(CurveQuantity.SHEAR_STRESS);
        shared.remove(CurveQuantity.VISCOSITY);
        return shared;
    }

    private static boolean isMain(Column column) {
        return column.quantity() == CurveQuantity.SHEAR_RATE || column.quantity() == CurveQuantity.SHEAR_STRESS
                || column.quantity() == CurveQuantity.VISCOSITY;
    }

    private Group group(int sample, Map<CurveQuantity, Column> columns) {
        Column own = columns.getOrDefault(CurveQuantity.SHEAR_STRESS, columns.get(CurveQuantity.VISCOSITY));
        return Group.of(sample, own == null ? "" : labels.get(own), new EnumMap<>(columns));
    }

    private static String missing(SourceRow names, Group group) {
        boolean rate = group.column(CurveQuantity.SHEAR_RATE) != null;
        return (names.line() > 0 ? "the header on line " + names.line() : "a table without a header") + " has no column for the shear " + (rate
                ? "stress (nor a viscosity), for instance shear_stress_Pa" : "rate, for instance shear_rate_1_s")
                + "; choose the column that holds it" + (!rate && group.column(CurveQuantity.SPEED) != null
                ? ". A speed gives no shear rate without the instrument's geometry" : "");
    }
}
