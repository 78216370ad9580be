package stirwright.workbench.internal.session;

import java.util.Optional;
import stirwright.core.Catalogue;
import stirwright.core.Choices;
import stirwright.core.Entry;
import stirwright.correlation.Correlation;

/** Finds the installed correlation behind a candidate. */
public final class Published {

    private Published() {}

    /** That of the selected candidate; of one whose constants the case changed that which it was made from. */
    public static Optional<Correlation> ofSelected(Session session) {
        Catalogue installed = session.catalogue();
        return session.selected().filter(r -> r.correlation().isPresent()).map(Row::correlationId)
                .flatMap(id -> installed.entry(id).or(() -> Choices.published(id).flatMap(installed::entry)))
                .map(Entry::correlation);
    }
}
