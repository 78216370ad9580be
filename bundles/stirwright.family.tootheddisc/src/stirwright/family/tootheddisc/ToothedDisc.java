package stirwright.family.tootheddisc;

import java.util.List;
import org.osgi.service.component.annotations.Component;
import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;

/** The toothed high-speed disc. Nothing is recommended for it: one number is unsure, the other a lower limit. */
@Component
public final class ToothedDisc implements Contribution {

    private static final String ID = "tootheddisc";

    @Override
    public List<Family> families() {
        return List.of(Family.of(ID, "toothed high-speed disc")
                .description("A flat disc with teeth bent up and down in turn along its rim, run fast to disperse rather than "
                        + "to pump.")
                .parameter(Dimensions.BAFFLE_COUNT.usually("0", vessel -> 0))
                .regimes(RegimeLimits.IN_GENERAL)
                .build());
    }

    @Override
    public List<Correlation> correlations() {
        return List.of(thinDisc(), turbulent());
    }

    private static Correlation thinDisc() {
        return Correlation.of("tootheddisc.npmin.thin-disc", Quantity.POWER_NUMBER_FLOOR, "smooth thin disc, laminar lower limit")
                .families(ID)
                .cite(Citation.withoutLocator("torque 32/3 mu a^3 omega on a thin disc of radius a that spins in its plane in "
                        + "unbounded liquid without inertia: G. B. Jeffery, Proc. London Math. Soc. 14 (1915)"))
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .atMost(Measure.REYNOLDS, RegimeLimits.IN_GENERAL.laminarUpTo())
                .notStated(Classifier.BAFFLING, "exact for unbounded liquid, which has no vessel")
                .notStated(Measure.D_OVER_T, "exact for unbounded liquid; walls raise it")
                .newtonianData()
                .overReynolds("KL", 16 * Math.PI * Math.PI / 3)
                .remark("A lower limit and no estimate: teeth and walls only add to it. The constant is 16 pi^2/3.")
                .remark("Checked with the torque on a flattened spheroid, integrated numerically down to an axis ratio of "
                        + "1:10 000. The Reynolds limit is the family's.")
                .build();
    }

    private static Correlation turbulent() {
        return Correlation.of("tootheddisc.np.turbulent-recalled", Quantity.POWER_NUMBER, "turbulent, recalled")
                .families(ID)
                .cite(Citation.withoutLocator(
                        "compilations of power numbers; which of them prints the number is not checked"))
                .transcription(Transcription.UNSURE)
                .scatter(0.33)
                .turbulent()
                .notStated(Classifier.BAFFLING, "recalled without it")
                .range(Measure.D_OVER_T, 0.2, 0.4)
                .newtonianData()
                .value("Np", 0.3)
                .remark("0.2 to 0.4 are recalled, by the shape of the teeth; this is the middle.")
                .remark("Conflict: the Handbook of Industrial Mixing is recalled with 0.45.")
                .build();
    }
}
