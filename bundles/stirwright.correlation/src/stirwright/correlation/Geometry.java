package stirwright.correlation;

import org.osgi.annotation.versioning.ProviderType;

/** A vessel and its impeller: one value for every parameter of the family. */
@ProviderType
public interface Geometry {

    /**
     * The value of a parameter in its SI unit (angles in rad).
     *
     * @return NaN when the family does not have this parameter, or while a {@link Fallback} is
     *     computed from what is known so far
     */
    double get(GeometryParameter parameter);

    /** One parameter over another, for instance D/T. */
    default double ratio(GeometryParameter over, GeometryParameter under) {
        return get(over) / get(under);
    }
}
