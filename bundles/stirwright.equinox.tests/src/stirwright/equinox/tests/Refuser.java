package stirwright.equinox.tests;

import java.util.List;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;

/** A contribution that fails when it is asked. */
public final class Refuser implements Contribution {

    @Override
    public List<Correlation> correlations() {
        throw new UnsupportedOperationException("not today");
    }
}
