/**
 * Couples a fluid, a vessel and every correlation found at run time into results that can be
 * compared: start at {@link stirwright.core.CrossCheck}. SI units, speeds in rev/s.
 *
 * <p>Not for code from outside, which relies on {@code stirwright.correlation} alone.
 */
@Version("1.2.0")
package stirwright.core;

import org.osgi.annotation.versioning.Version;
