package stirwright.conformance;

import java.util.List;
import stirwright.conformance.internal.Offer;
import stirwright.conformance.internal.Workpiece;
import stirwright.core.Catalogue;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;

/** What one bundle contributes, with its reference rows, amid everything else that is installed. */
public final class Subject {
    private final Workpiece workpiece;

    private Subject(Workpiece workpiece) {
        this.workpiece = workpiece;
    }

    /**
     * Asks the contributions once, as the workbench does.
     *
     * @param origin the bundle's symbolic name and version
     * @param others what the other bundles contribute
     */
    public static Subject of(
            String origin, List<Contribution> contributions, List<ReferenceFile> references, Catalogue others) {
        return new Subject(new Workpiece(Offer.ask(origin, contributions), references, others));
    }

    public String origin() {
        return workpiece.offer().origin();
    }

    public List<Family> families() {
        return workpiece.offer().families();
    }

    public List<Correlation> correlations() {
        return workpiece.offer().correlations();
    }

    /** How many reference rows could be read. */
    public int rows() {
        return workpiece.references().rows().size();
    }

    Workpiece workpiece() {
        return workpiece;
    }

    @Override
    public String toString() {
        return origin();
    }
}
