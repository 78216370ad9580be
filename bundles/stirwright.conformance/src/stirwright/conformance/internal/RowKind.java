package stirwright.conformance.internal;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;

/** Where a number came from, which settles how closely it must be met. */
enum RowKind {
    /** Worked out by hand from the correlation's own formula: it shows that the code is the formula. */
    FORMULA("by hand", false, 0.005, 0.1),
    /** Printed as a number in a table or an example of the source. */
    TABLE("printed", true, 0.02, 0.1),
    /** Read off a chart of the source. */
    CHART("printed", true, 0.15, 0.4),
    /** What a second author has for the same impeller; the row says how near they are agreed to be. */
    AUTHOR("second author", true, Double.NaN, Double.NaN),
    /** Worked out from a relation that shares nothing with this one; the row says how near they are agreed to be. */
    INDEPENDENT("independent", true, Double.NaN, Double.NaN),
    /** The number itself, from memory: it shows that the correlation gives it and proves nothing. */
    RECALLED("from memory", false, 0.005, 0.1);

    private final String group;
    private final boolean outside;
    private final double tolerance;
    private final double noticed;

    RowKind(String group, boolean outside, double tolerance, double noticed) {
        this.group = group;
        this.outside = outside;
        this.tolerance = tolerance;
        this.noticed = noticed;
    }

    /** The kind as reports count it. */
    String group() {
        return group;
    }

    /** Whether the number comes from outside of what was typed in. */
    boolean isFromOutside() {
        return outside;
    }

    /** Whether the row itself says how closely it must be met. */
    boolean isBanded() {
        return Double.isNaN(tolerance);
    }

    String id() {
        return name().toLowerCase(Locale.ROOT);
    }

    /** Relative; NaN where the row says it. */
    double tolerance() {
        return tolerance;
    }

    /** The relative change of a constant that a row of this kind can be asked to notice; NaN for none. */
    double noticed() {
        return noticed;
    }

    static Optional<RowKind> of(String id) {
        return Arrays.stream(values()).filter(kind -> kind.id().equals(id)).findFirst();
    }
}
