package stirwright.correlation;

import org.osgi.annotation.versioning.ConsumerType;

/** The formula of a correlation, as code. Stateless: it may be called from several threads at once. */
@FunctionalInterface
@ConsumerType
public interface Relation {

    /**
     * Binds the formula to a geometry; what depends on the geometry alone is best computed here, once.
     *
     * @param constants the correlation's named constants; take every coefficient from here, so that
     *     the printed formula and the computed number cannot differ
     */
    BoundCorrelation bind(Geometry geometry, Constants constants);
}
