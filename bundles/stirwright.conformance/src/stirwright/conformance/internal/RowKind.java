package stirwright.conformance.internal;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;

/** How a published number was made, which settles how closely it must be met. */
enum RowKind {
    /** Worked out by hand from the printed formula. */
    FORMULA(0.005, 0.1),
    /** Printed as a number in a table or an example. */
    TABLE(0.02, 0.1),
    /** Read off a chart. */
    CHART(0.15, 0.4),
    /** The number itself, from memory: it shows that the correlation gives it and proves nothing. */
    RECALLED(0.005, 0.1);

    private final double tolerance;
    private final double noticed;

    RowKind(double tolerance, double noticed) {
        this.tolerance = tolerance;
        this.noticed = noticed;
    }

    String id() {
        return name().toLowerCase(Locale.ROOT);
    }

    /** Relative. */
    double tolerance() {
        return tolerance;
    }

    /** The relative change of a constant that a row of this kind can be asked to notice. */
    double noticed() {
        return noticed;
    }

    static Optional<RowKind> of(String id) {
        return Arrays.stream(values()).filter(kind -> kind.id().equals(id)).findFirst();
    }
}
