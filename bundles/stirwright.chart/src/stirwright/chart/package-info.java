/** The one chart view: numbers in, pixels out. */
@Version("1.0.0")
package stirwright.chart;

import org.osgi.annotation.versioning.Version;
