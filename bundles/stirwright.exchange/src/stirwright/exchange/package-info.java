/**
 * Files in and out: {@link stirwright.exchange.CaseTable} and {@link stirwright.exchange.CurveImport}
 * read, {@link stirwright.exchange.Outputs} writes. The names of columns are a contract with
 * scripts. Units are converted here and nowhere further in.
 *
 * <p>Not for code from outside, which relies on {@code stirwright.correlation} alone.
 */
@Version("1.0.0")
package stirwright.exchange;

import org.osgi.annotation.versioning.Version;
