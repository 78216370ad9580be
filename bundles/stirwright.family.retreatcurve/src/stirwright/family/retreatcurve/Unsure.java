package stirwright.family.retreatcurve;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;

/** Flow number and shear-rate constant: shown, so that a reader can judge them, never recommended. */
final class Unsure {

    private Unsure() {}

    static Correlation flowNumber() {
        return recalled("retreatcurve.nq.tables", Quantity.FLOW_NUMBER, "handbook tables, turbulent")
                .flow(FlowKind.DISCHARGE)
                .turbulent()
                .newtonianData()
                .value("Nq", 0.3)
                .remark("That it counts discharge is assumed, as the tables do for other impellers.")
                .build();
    }

    static Correlation shearRateConstant() {
        return recalled("retreatcurve.ks.compilations", Quantity.SHEAR_RATE_CONSTANT, "later compilations")
                .scatter(0.083)
                .atMost(Measure.REYNOLDS, RegimeLimits.IN_GENERAL.turbulentFrom())
                .notStated(Classifier.FLUID, "recalled for non-Newtonian fluids, not of which kind")
                .value("ks", 12)
                .remark("Recalled as 11 to 13; the middle and the scatter are ours.")
                .build();
    }

    private static CorrelationBuilder recalled(String id, Quantity quantity, String title) {
        return Correlation.of(id, quantity, title)
                .families(RetreatCurve.ID)
                .cite(Citation.withoutLocator("tables in handbooks; which of them is not recalled"))
                .transcription(Transcription.UNSURE)
                .notStated(Classifier.BAFFLING, "recalled without it")
                .notStated(Measure.BLADE_COUNT, "recalled without it")
                .notStated(Measure.D_OVER_T, "recalled without a range");
    }
}
