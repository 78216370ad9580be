/** The one chart view: numbers in, pixels out. Not for code from outside, which relies on {@code stirwright.correlation} alone. */
@Version("1.0.0")
package stirwright.chart;

import org.osgi.annotation.versioning.Version;
