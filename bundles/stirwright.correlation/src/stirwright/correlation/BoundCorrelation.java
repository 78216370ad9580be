package stirwright.correlation;

import org.osgi.annotation.versioning.ConsumerType;

/** A correlation bound to one geometry. Used by one thread at a time. */
@FunctionalInterface
@ConsumerType
public interface BoundCorrelation {

    /**
     * The value at an operating point, in the unit of the correlation's quantity. Called in hot
     * loops: must not allocate. Outside its range it extrapolates or gives NaN; it never clamps and
     * never throws.
     */
    double at(OperatingPoint point);
}
