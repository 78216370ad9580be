package stirwright.family.propeller;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Discharge flow numbers of the turbulent regime, by pitch. */
final class FlowNumbers {

    private FlowNumbers() {}

    static Correlation square() {
        return Correlation.of("propeller.nq.mccabe-pitch-1", Quantity.FLOW_NUMBER,
                        "McCabe, Smith and Harriott, square pitch")
                .families(Propeller.ID)
                .cite(Citation.of("W. L. McCabe, J. C. Smith and P. Harriott, Unit Operations of Chemical Engineering, "
                        + "5th ed., McGraw-Hill (1993)", "chapter 9, list of flow numbers"))
                .transcription(Transcription.FROM_MEMORY)
                .flow(FlowKind.DISCHARGE)
                .turbulent()
                .notStated(Classifier.BAFFLING, "recalled without it")
                .notStated(Measure.BLADE_COUNT, "recalled without it")
                .nominal(Propeller.PITCH, 1)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData()
                .value("Nq", 0.5)
                .remark("Other tables have 0.40 to 0.55 for square pitch.")
                .build();
    }

    static Correlation oneAndAHalf() {
        return Correlation.of("propeller.nq.tables-pitch-1-5", Quantity.FLOW_NUMBER, "handbook tables, pitch 1.5")
                .families(Propeller.ID)
                .cite(Citation.withoutLocator("tables of flow numbers in handbooks; which of them is not recalled"))
                .transcription(Transcription.FROM_MEMORY)
                .scatter(0.077)
                .flow(FlowKind.DISCHARGE)
                .turbulent()
                .notStated(Classifier.BAFFLING, "recalled without it")
                .notStated(Measure.BLADE_COUNT, "recalled without it")
                .nominal(Propeller.PITCH, 1.5)
                .notStated(Measure.D_OVER_T, "recalled for about 1/3, without a range")
                .newtonianData()
                .value("Nq", 0.65)
                .remark("The tables have 0.6 to 0.7; its middle and the scatter are ours.")
                .build();
    }
}
