package stirwright.family.discturbine;

import java.util.List;
import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;

/** The disc turbine whose blades are hollow on the side that pushes the liquid. Nothing is at hand for laminar flow. */
final class ConcaveDisc {

    private static final String ID = "concavedisc";

    private ConcaveDisc() {}

    static Family family() {
        return Family.of(ID, "disc turbine with concave blades")
                .description("Blades bent to half a tube or deeper, as a rule six, on the rim of a flat disc, the hollow side "
                        + "ahead; the liquid leaves radially.")
                .parameter(Dimensions.BLADE_COUNT.assumedAs("6", vessel -> 6))
                .parameter(Dimensions.BLADE_WIDTH
                        .withMeaning("height of the blade's opening, along the shaft")
                        .assumedAs("D/5", vessel -> vessel.get(Dimensions.IMPELLER_DIAMETER) / 5))
                .regimes(RegimeLimits.IN_GENERAL)
                .build();
    }

    static List<Correlation> correlations() {
        return List.of(semicircular(), deep(), shearRate());
    }

    private static Correlation semicircular() {
        return power("concavedisc.np.semicircular", "semicircular blades, turbulent")
                .scatter(0.067)
                .value("Np", 3)
                .remark("2.8 to 3.2 are listed; this is the middle.")
                .remark("Conflict: deep, asymmetric blades take 2.3. The case does not tell the shape: where it is that, "
                        + "choose concavedisc.np.deep-asymmetric.")
                .build();
    }

    private static Correlation deep() {
        return power("concavedisc.np.deep-asymmetric", "deep asymmetric parabolic blades, turbulent")
                .value("Np", 2.3)
                .remark("Conflict: semicircular blades take 2.8 to 3.2. The case does not tell the shape.")
                .build();
    }

    private static CorrelationBuilder power(String id, String title) {
        return Correlation.of(id, Quantity.POWER_NUMBER, title)
                .families(ID)
                .cite(compilations())
                .transcription(Transcription.FROM_MEMORY)
                .turbulent()
                .baffled()
                .notStated(Measure.BAFFLE_COUNT, "listed for full baffling, four baffles of T/12 to T/10 as a rule")
                .oneOf(Measure.BLADE_COUNT, 6)
                .notStated(Measure.W_OVER_D, "recalled without it")
                .notStated(Measure.D_OVER_T, "listed for about 1/3, without a range")
                .newtonianData();
    }

    private static Correlation shearRate() {
        return Correlation.of("concavedisc.ks.recalled", Quantity.SHEAR_RATE_CONSTANT, "concave blades, recalled")
                .families(ID)
                .cite(compilations())
                .transcription(Transcription.UNSURE)
                .notStated(Measure.REYNOLDS, "recalled without a range")
                .notStated(Classifier.BAFFLING, "recalled without it")
                .notStated(Measure.BLADE_COUNT, "recalled without it")
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .notStated(Classifier.FLUID, "recalled without the kind of fluid")
                .value("ks", 7.5)
                .remark("Recalled as 7 to 8, unsure; flat blades have 11.5 to 13.")
                .build();
    }

    private static Citation compilations() {
        return Citation.withoutLocator("compilations for stirred vessels; which of them prints the number is not checked");
    }
}
