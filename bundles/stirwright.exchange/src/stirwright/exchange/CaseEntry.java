package stirwright.exchange;

import java.util.Optional;
import java.util.function.Supplier;
import stirwright.core.CaseRefusedException;
import stirwright.core.CaseResult;
import stirwright.core.CaseSpec;
import stirwright.core.CrossCheck;
import stirwright.core.Refusal;
import stirwright.exchange.internal.cases.CaseReader;
import stirwright.exchange.internal.cases.Cells;
import stirwright.exchange.internal.cases.StudyRow;

/** One row of a case table or one case of a study: a case, or the reason why it is none. Immutable. */
public final class CaseEntry {
    private final Cells cells;
    private final String name;
    private final String family;
    private final Optional<CaseSpec> spec;
    private final Optional<Refusal> refusal;

    private CaseEntry(Cells cells, String name, String family, Optional<CaseSpec> spec, Optional<Refusal> refusal) {
        this.cells = cells;
        this.name = name;
        this.family = family;
        this.spec = spec;
        this.refusal = refusal;
    }

    static CaseEntry of(CaseReader reader, Cells cells) {
        return of(reader, cells, () -> reader.read(cells));
    }

    static CaseEntry of(CaseReader reader, StudyRow row) {
        return of(reader, row.cells(), () -> row.read(reader));
    }

    private static CaseEntry of(CaseReader reader, Cells cells, Supplier<CaseSpec> read) {
        Optional<CaseSpec> spec = Optional.empty();
        Optional<Refusal> refusal = Optional.empty();
        try {
            spec = Optional.of(read.get());
        } catch (CaseRefusedException refused) {
            refusal = Optional.of(refused.refusal());
        }
        return new CaseEntry(cells, reader.name(cells), reader.family(cells), spec, refusal);
    }

    /** Where the case stands: "line 12" of a table, "case 3" of a study. */
    public String place() {
        return cells.place();
    }

    /** The line of the table on which the row begins, from 1; 0 for a case of a study. */
    public int line() {
        return cells.row().line();
    }

    /** The case's name; its {@link #place} where none can be read. */
    public String name() {
        return name;
    }

    /** The family's id as typed; may be blank or unknown. */
    public String family() {
        return family;
    }

    /** Present unless the row is refused. */
    public Optional<CaseSpec> spec() {
        return spec;
    }

    /** Why the row is no case. */
    public Optional<Refusal> refusal() {
        return refusal;
    }

    /** Computes the case; a refusal names the column and shows the value as it was typed. */
    public CaseResult check(CrossCheck crossCheck) {
        return spec.map(crossCheck::check).map(this::asTyped)
                .orElseGet(() -> CaseResult.refused(name, family, refusal.orElseThrow()));
    }

    /** The core knows numbers in SI units; the author of the file knows what stands in the cell. */
    public CaseResult asTyped(CaseResult result) {
        return result.refusal()
                .map(r -> CaseResult.refused(name, family, cells.asTyped(r)))
                .orElse(result);
    }
}
