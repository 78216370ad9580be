package stirwright.conformance.internal;

import stirwright.correlation.Correlation;

/** Whether what people read of a correlation is complete. */
public final class PrintedForm {

    /** What the contract says of a modifier that declared nothing. */
    private static final String UNDECLARED = "always";

    private PrintedForm() {}

    public static void formula(Workpiece workpiece, Findings findings) {
        for (Correlation correlation : workpiece.correlations()) {
            String printed = correlation.formula();
            if (printed.isBlank() || printed.contains("{") || printed.contains("}")) {
                findings.add(correlation.id(), "the formula prints as '" + printed
                        + "'; a slot is {name}, letters and digits alone, and names a constant or curve");
            }
        }
    }

    public static void applicability(Workpiece workpiece, Findings findings) {
        for (Correlation correlation : workpiece.correlations()) {
            String when = correlation.appliesWhen();
            if (correlation.modifierFor().isPresent() && (when.isBlank() || when.equals(UNDECLARED))) {
                findings.add(correlation.id(), "is a modifier and does not say when it applies; use"
                        + " appliesWhen(words, test)");
            }
        }
    }
}
