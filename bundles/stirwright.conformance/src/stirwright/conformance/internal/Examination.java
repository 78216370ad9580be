package stirwright.conformance.internal;

/** The work of one check. */
@FunctionalInterface
public interface Examination {

    void examine(Workpiece workpiece, Findings findings);
}
