package stirwright.workbench.tests;

import java.util.List;
import stirwright.correlation.Citation;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;

/** An invented third family, packed into a jar of its own by the tests. Its bundle tells in a system property that it ran. */
public final class DroppedFamily implements Contribution {
    static final String ID = "droppedpaddle";
    static final String TITLE = "dropped paddle";
    static final String RAN = "stirwright.test.dropped.ran";

    public DroppedFamily() {
        System.setProperty(RAN, "yes");
    }

    @Override
    public List<Family> families() {
        return List.of(Family.of(ID, TITLE).description("invented for a test").regimes(RegimeLimits.IN_GENERAL).build());
    }

    @Override
    public List<Correlation> correlations() {
        return List.of(constant("np", Quantity.POWER_NUMBER, 2.5), constant("ks", Quantity.SHEAR_RATE_CONSTANT, 12));
    }

    private static Correlation constant(String name, Quantity quantity, double value) {
        return Correlation.of(ID + "." + name + ".invented", quantity, "invented")
                .families(ID)
                .cite(Citation.of("invented for a test", "p. 1"))
                .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                .range(Measure.REYNOLDS, 1, 1e6)
                .notStated(Measure.D_OVER_T, "invented")
                .value("c", value)
                .build();
    }
}
