package stirwright.conformance.internal;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;

/** How a published number was made, which settles how closely it must be met. */
enum RowKind {
    /** Worked out by hand from the printed formula. */
    FORMULA(0.005),
    /** Printed as a number in a table or an example. */
    TABLE(0.02),
    /** Read off a chart. */
    CHART(0.15);

    private final double tolerance;

    RowKind(double tolerance) {
        this.tolerance = tolerance;
    }

    String id() {
        return name().toLowerCase(Locale.ROOT);
    }

    /** Relative. */
    double tolerance() {
        return tolerance;
    }

    static Optional<RowKind> of(String id) {
        return Arrays.stream(values()).filter(kind -> kind.id().equals(id)).findFirst();
    }
}
