package stirwright.exchange.internal.cases;

import static stirwright.exchange.internal.cases.CaseColumns.CASE;
import static stirwright.exchange.internal.cases.CaseColumns.FAMILY;

import java.util.ArrayList;
import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import stirwright.core.CaseRefusedException;
import stirwright.core.CaseSpec;
import stirwright.core.Catalogue;
import stirwright.core.Choices;
import stirwright.core.SpeedDemand;
import stirwright.exchange.internal.table.Texts;
import stirwright.rheology.Fluid;

/** Turns rows into cases. */
public final class CaseReader {
    private final Catalogue catalogue;
    private final GeometryCells geometry;
    private final Map<String, String> placesByName = new HashMap<>();

    /** @param dimensions the columns of dimensions that any row may have */
    CaseReader(Catalogue catalogue, Collection<String> dimensions) {
        this.catalogue = catalogue;
        this.geometry = new GeometryCells(List.copyOf(dimensions));
    }

    /** For rows that come from no table, and so may have any column. */
    public static CaseReader ofAnyColumn(Catalogue catalogue) {
        return new CaseReader(catalogue, new CaseColumns(catalogue).dimensions());
    }

    /** What to call the case of a row, though the row may be unreadable. */
    public String name(Cells cells) {
        return cells.given(CASE) ? whole(cells, CASE) : cells.place();
    }

    public String family(Cells cells) {
        return whole(cells, FAMILY);
    }

    private static String whole(Cells cells, String column) {
        return cells.row().flaw().isPresent() ? cells.shown(column) : cells.text(column);
    }

    /** @throws CaseRefusedException naming the column and the value as typed */
    public CaseSpec read(Cells cells) {
        refuseFlaw(cells);
        String name = requireName(cells);
        String family = cells.text(FAMILY).toLowerCase(Locale.ROOT);
        if (family.isEmpty()) {
            throw cells.refusal(FAMILY, "is blank; give the id of an impeller family");
        }
        List<String> remarks = new ArrayList<>();
        SpeedDemand speed = SpeedCells.read(cells);
        Fluid fluid = FluidCells.read(cells, remarks);
        Choices choices = ChoiceCells.read(cells);
        Map<String, Double> dimensions = catalogue.family(family)
                .map(f -> geometry.read(cells, f, remarks))
                .orElse(Map.of());
        return new CaseSpec(name, family, dimensions, speed, fluid, choices, remarks);
    }

    private static void refuseFlaw(Cells cells) {
        cells.row().flaw().ifPresent(flaw -> {
            throw new CaseRefusedException(cells.header().nameAt(flaw.cell()), Texts.show(flaw.value()),
                    flaw.reason() + " (" + cells.place() + ")");
        });
    }

    private String requireName(Cells cells) {
        if (!cells.given(CASE)) {
            throw cells.refusal(CASE, "is blank (" + cells.place() + "); every case needs a name");
        }
        String name = cells.text(CASE);
        String first = placesByName.putIfAbsent(name, cells.place());
        if (first != null) {
            throw cells.refusal(CASE, "is the name of two cases, " + first + " and " + cells.place()
                    + "; names are unique in a file");
        }
        return name;
    }
}
