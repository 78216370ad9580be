/**
 * Cards: one page of HTML for each installed correlation and family, and an index of all. Made from the catalogue and the
 * reference rows at the moment of asking, so bundles that were dropped in have cards too. Needs no display.
 */
@Version("1.0.0")
package stirwright.cards;

import org.osgi.annotation.versioning.Version;
