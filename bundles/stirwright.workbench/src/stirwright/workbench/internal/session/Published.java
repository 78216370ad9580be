package stirwright.workbench.internal.session;

import java.util.List;
import java.util.Optional;
import stirwright.core.Catalogue;
import stirwright.core.Choices;
import stirwright.core.Entry;
import stirwright.correlation.Correlation;
import stirwright.study.Case;
import stirwright.study.Constant;

/** Finds the installed correlation behind a candidate. */
public final class Published {

    private Published() {}

    /** That of the selected candidate; of one whose constants the case changed that which it was made from. */
    public static Optional<Correlation> ofSelected(Session session) {
        Catalogue installed = session.catalogue();
        return session.selected().filter(r -> r.correlation().isPresent()).map(Row::correlationId)
                .flatMap(id -> installed.entry(id).or(() -> changed(session).stream()
                        .filter(base -> Choices.changed(base).equals(id)).findFirst().flatMap(installed::entry)))
                .map(Entry::correlation);
    }

    private static List<String> changed(Session session) {
        return session.current().map(Case::getConstants).stream().flatMap(List::stream).map(Constant::getCorrelation)
                .filter(id -> id != null).toList();
    }
}
