package invented.contract.sample;

import java.util.List;
import java.util.stream.Stream;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;

/** An impeller that nobody builds and numbers that nobody measured. */
public final class SampleContribution implements Contribution {

    @Override
    public List<Family> families() {
        return List.of(SampleFamily.describe());
    }

    @Override
    public List<Correlation> correlations() {
        return Stream.of(PowerNumbers.all(), Modifiers.all(), ShearRateConstants.all(), Others.all())
                .flatMap(List::stream).toList();
    }
}
