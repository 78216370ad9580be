package stirwright.workbench.internal.session;

import java.util.List;
import stirwright.core.Catalogue;
import stirwright.exchange.CaseEntry;

/**
 * What is to be computed, taken from the study on the user interface's thread.
 *
 * @param entries the case with its own family first, then with those compared
 */
record Request(Catalogue catalogue, List<Entry> entries, View view) {

    record Entry(String familyId, CaseEntry input) {}
}
