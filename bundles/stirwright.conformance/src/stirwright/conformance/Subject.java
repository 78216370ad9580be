package stirwright.conformance;

import java.util.List;
import stirwright.conformance.internal.Workpiece;
import stirwright.core.Arrival;
import stirwright.core.Catalogue;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;

/** What one bundle contributes, with its reference rows, amid everything else that is installed. */
public final class Subject {
    private final Workpiece workpiece;

    private Subject(Workpiece workpiece) {
        this.workpiece = workpiece;
    }

    /**
     * Takes what a bundle answered when it was asked once, as the workbench asks.
     *
     * @param origin the bundle's symbolic name and version
     * @param others what the other bundles contribute
     */
    public static Subject of(String origin, List<Arrival> arrivals, List<ReferenceFile> references, Catalogue others) {
        return new Subject(new Workpiece(origin, arrivals, references, others));
    }

    public String origin() {
        return workpiece.origin();
    }

    public List<Family> families() {
        return workpiece.ownFamilies();
    }

    public List<Correlation> correlations() {
        return workpiece.correlations();
    }

    /** How many reference rows could be read. */
    public int rows() {
        return workpiece.references().rows().size();
    }

    /** How many of them are numbers from memory, which prove nothing. */
    public int recalledRows() {
        return workpiece.references().recalled();
    }

    /** What holds each correlation up, in the order of {@link #correlations}. */
    public List<Proof> proofs() {
        return workpiece.correlations().stream().map(workpiece.references()::proof).toList();
    }

    Workpiece workpiece() {
        return workpiece;
    }

    @Override
    public String toString() {
        return origin();
    }
}
