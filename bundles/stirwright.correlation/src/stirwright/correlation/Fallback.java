package stirwright.correlation;

import java.util.function.ToDoubleFunction;
import stirwright.correlation.GeometryParameter.Default;

/** A value that stands in for a dimension or count which nobody gave. */
public final class Fallback {
    private final Default kind;
    private final String words;
    private final ToDoubleFunction<Geometry> value;

    Fallback(Default kind, String words, ToDoubleFunction<Geometry> value) {
        this.kind = kind;
        this.words = words;
        this.value = value;
    }

    /** Never {@link Default#NONE}. */
    public Default kind() {
        return kind;
    }

    /** In words, for instance "D/5". */
    public String words() {
        return words;
    }

    /**
     * The value in the SI unit.
     *
     * @param geometry what is known so far; NaN for the rest
     * @return NaN when it does not follow from what is known
     */
    public double value(Geometry geometry) {
        return value.applyAsDouble(geometry);
    }
}
