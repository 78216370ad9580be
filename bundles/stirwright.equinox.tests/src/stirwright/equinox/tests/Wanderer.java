package stirwright.equinox.tests;

import java.util.List;
import org.osgi.framework.BundleActivator;
import org.osgi.framework.BundleContext;
import stirwright.correlation.Citation;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;

/** A contribution that comes and goes, by either way of publishing; invented for a test. */
public final class Wanderer implements Contribution, BundleActivator {

    @Override
    public List<Family> families() {
        return List.of(Family.of("wanderer", "wanderer").description("Invented for a test.")
                .regimes(RegimeLimits.of(10, 1e4, Citation.commonPractice())).build());
    }

    @Override
    public List<Correlation> correlations() {
        return List.of(Correlation.of("wanderer.np.invented", Quantity.POWER_NUMBER, "invented for a test")
                .families("wanderer").cite(Citation.commonPractice()).transcription(Transcription.FROM_MEMORY)
                .constant("Np", 1).formula("Np = {Np}").relation((g, k) -> p -> k.get("Np")).build());
    }

    @Override
    public void start(BundleContext context) {
        context.registerService(Contribution.class, this, null);
    }

    @Override
    public void stop(BundleContext context) {
        // The framework withdraws the service.
    }
}
