/**
 * The contract between Stirwright and a bundle that contributes correlations.
 *
 * <p>Start at {@link stirwright.correlation.Contribution}: publish one as an OSGi service and the
 * workbench finds it. All values are in SI units, speeds in revolutions per second, shear-rate
 * constants per revolution, angles in radians; only a {@link stirwright.correlation.Measure} of a
 * dimension, and so a bound on it, is in the unit of the table's column (angles in degrees).
 *
 * <p>What is named by an id ({@link stirwright.correlation.Quantity}, {@link
 * stirwright.correlation.Variable}, {@link stirwright.correlation.Effect}, ...) is an open set: a
 * contribution may bring its own. What the workbench implements is marked as a provider type, what
 * a contributor implements as a consumer type; a jar compiled against one minor version of this
 * package runs with every later minor version.
 */
@Version("1.1.0")
package stirwright.correlation;

import org.osgi.annotation.versioning.Version;
