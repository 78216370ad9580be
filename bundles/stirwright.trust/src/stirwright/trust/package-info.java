/**
 * Which bundles in the folder {@code families} may run: those whose SHA-256 this user has approved, no others. Start at
 * {@link stirwright.trust.DropIns}, an OSGi service.
 *
 * <p>Not for code from outside, which relies on {@code stirwright.correlation} alone.
 */
@Version("1.0.0")
package stirwright.trust;

import org.osgi.annotation.versioning.Version;
