package stirwright.workbench.internal.importing;

import java.util.Optional;
import stirwright.exchange.CurveImport;

/**
 * What came out of reading a source once.
 *
 * @param found empty when nothing of it can be shown
 * @param problem why nothing can be shown; empty otherwise
 */
record Reading(Optional<CurveImport> found, String problem) { }
