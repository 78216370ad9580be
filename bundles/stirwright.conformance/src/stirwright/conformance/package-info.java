/**
 * The checks that every contribution passes, written once: the build runs them over every installed
 * bundle, a contributor runs them over a jar. Start at {@link
 * stirwright.conformance.ConformanceSuite}; for a jar at {@link stirwright.conformance.JarCheck}.
 *
 * <p>Not for code from outside, which relies on {@code stirwright.correlation} alone.
 */
@Version("1.1.0")
package stirwright.conformance;

import org.osgi.annotation.versioning.Version;
