package stirwright.conformance.internal;

/** Whether the contributions answer at all. */
public final class Answers {

    private Answers() {}

    public static void examine(Workpiece workpiece, Findings findings) {
        Offer offer = workpiece.offer();
        offer.failures().forEach(failure -> findings.add(offer.origin(), failure));
        if (offer.failures().isEmpty() && offer.families().isEmpty() && offer.correlations().isEmpty()) {
            findings.add(offer.origin(), "contributes neither a family nor a correlation");
        }
    }
}
