package stirwright.exchange.internal.cases;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import stirwright.core.CaseRefusedException;
import stirwright.core.CaseSpec;
import stirwright.core.Catalogue;
import stirwright.correlation.Figures;
import stirwright.exchange.DecimalSign;
import stirwright.exchange.internal.table.Header;
import stirwright.exchange.internal.table.Row;
import stirwright.exchange.internal.table.Texts;
import stirwright.study.Amount;
import stirwright.study.Case;
import stirwright.study.Constant;
import stirwright.study.Fluid;
import stirwright.study.Impeller;
import stirwright.study.Part;
import stirwright.study.Study;

/** A case of a study as the cells of a row: the amounts of its parts under the names of their columns. */
public final class StudyRow {
    private final String place;
    private final CaseColumns columns;
    private final Map<String, String> cells = new LinkedHashMap<>();
    /** Who gave each cell, in words. */
    private final Map<String, String> givers = new LinkedHashMap<>();
    private final List<String> remarks = new ArrayList<>();
    private final StudyPicks picks;
    /** The first thing that keeps the case from being one; null when nothing does. */
    private CaseRefusedException obstacle;

    private StudyRow(Case one, Catalogue catalogue) {
        place = one.eContainer() instanceof Study study ? "case " + (study.getCases().indexOf(one) + 1) : "the case";
        columns = new CaseColumns(catalogue);
        picks = new StudyPicks(catalogue, this);
        put(CaseColumns.CASE, one.getName(), "the case");
        part("fluid", one.getFluid());
        part("vessel", one.getVessel());
        part("impeller", one.getImpeller());
        demand(one.getDemand());
        // These speak of the vessel and of correlations, so they hold whichever family is looked at.
        put(CaseColumns.EFFECTS_LEFT_OUT, String.join(" ", one.getLeftOut()), "the case");
        put(CaseColumns.CONSTANTS, String.join("; ", one.getConstants().stream().map(this::inWords).toList()), "the case");
    }

    private String inWords(Constant constant) {
        if (constant.getCorrelation() == null || constant.getName() == null || !constant.isSetValue()) {
            obstruct(new CaseRefusedException(CaseColumns.CONSTANTS, "", "has an entry that lacks its correlation, its"
                    + " name or its value; complete or delete it"));
            return "";
        }
        return constant.getCorrelation() + " " + constant.getName() + "=" + Figures.exact(constant.getValue());
    }

    public static StudyRow of(Case one, Catalogue catalogue) {
        StudyRow row = new StudyRow(one, catalogue);
        Impeller impeller = one.getImpeller();
        row.put(CaseColumns.FAMILY, impeller == null ? null : impeller.getFamily(), "the impeller");
        row.amounts(one.getAmounts(), "the case");
        one.getPicks().forEach(row.picks::take);
        return row;
    }

    /** With a family in place of the impeller's, and nothing that was settled by hand for that. */
    public static StudyRow of(Case one, Catalogue catalogue, String familyId) {
        StudyRow row = new StudyRow(one, catalogue);
        row.put(CaseColumns.FAMILY, familyId, "the comparison");
        row.amounts(one.getAmounts(), "the case");
        for (String column : ChoiceCells.VALUES) {
            String value = row.cells.remove(column);
            if (value != null) {
                row.remarks.add(column + " " + value + " was given for another family; not used for " + familyId);
            }
        }
        return row;
    }

    private void part(String what, Part part) {
        if (part == null) {
            obstruct(new CaseRefusedException(what, "", "is missing; give the case a " + what + " of its study"));
            return;
        }
        String giver = what + " '" + Texts.show(Optional.ofNullable(part.getName()).orElse("")) + "'";
        if (part instanceof Fluid fluid) {
            put(CaseColumns.MODEL, fluid.getModel(), giver);
        }
        amounts(part.getAmounts(), giver);
    }

    private void demand(Amount demand) {
        if (demand != null && demand.isSetValue() && !CaseColumns.SPEEDS.contains(demand.getColumn())) {
            obstruct(new CaseRefusedException("demand", Texts.show(String.valueOf(demand.getColumn())),
                    "is neither a speed nor a target; give one of " + String.join(", ", CaseColumns.SPEEDS)));
        } else if (demand != null) {
            amounts(List.of(demand), "the demand");
        }
    }

    private void amounts(List<Amount> amounts, String giver) {
        for (Amount amount : amounts) {
            if (!amount.isSetValue()) {
                continue;
            }
            String value = Figures.exact(amount.getValue());
            if (amount.getColumn() != null && columns.isNumeric(amount.getColumn())) {
                put(amount.getColumn(), value, giver);
            } else {
                remarks.add("amount '" + Texts.show(String.valueOf(amount.getColumn())) + "' " + value + " of " + giver
                        + " is not known; ignored");
            }
        }
    }

    /** A cell that two give is nobody's: the case is refused instead of one of them being preferred. */
    void put(String column, String text, String giver) {
        String given = text == null ? "" : Texts.trim(text);
        if (given.isEmpty()) {
            return;
        }
        String first = givers.putIfAbsent(column, giver);
        if (first != null) {
            obstruct(new CaseRefusedException(column, Texts.show(given), "of " + giver + " stands beside "
                    + Texts.show(cells.get(column)) + " of " + first + "; keep one of them"));
            return;
        }
        cells.put(column, given);
    }

    boolean isColumn(String name) {
        return columns.isKnown(name);
    }

    void remark(String words) {
        remarks.add(words);
    }

    void obstruct(CaseRefusedException refusal) {
        obstacle = obstacle == null ? refusal : obstacle;
    }

    public Cells cells() {
        Row row = new Row(0, List.copyOf(cells.values()), false, Optional.empty());
        return new Cells(Header.of(List.copyOf(cells.keySet())), row, DecimalSign.POINT, place);
    }

    /** @throws CaseRefusedException naming the column and the value */
    public CaseSpec read(CaseReader reader) {
        if (obstacle != null) {
            throw obstacle;
        }
        CaseSpec spec = reader.read(cells());
        List<String> all = new ArrayList<>(spec.remarks());
        all.addAll(remarks);
        return new CaseSpec(spec.name(), spec.familyId(), spec.geometry(), spec.speed(), spec.fluid(),
                picks.addTo(spec.choices()), all);
    }
}
