package stirwright.family.pitchedblade;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Discharge flow numbers of the turbulent regime. */
final class FlowNumbers {

    private FlowNumbers() {}

    static Correlation hemrajani() {
        return Correlation.of("pitchedblade.nq.hemrajani-tatterson-2004", Quantity.FLOW_NUMBER,
                        "Hemrajani and Tatterson, turbulent")
                .families(PitchedBlade.ID)
                .cite(Citation.withoutLocator("R. R. Hemrajani and G. B. Tatterson in E. L. Paul, V. A. "
                        + "Atiemo-Obeng and S. M. Kresta (eds.), Handbook of Industrial Mixing, Wiley (2004), chapter 6"))
                .transcription(Transcription.FROM_MEMORY)
                .flow(FlowKind.DISCHARGE)
                .turbulent()
                .notStated(Classifier.BAFFLING, "recalled without it")
                .oneOf(Measure.BLADE_COUNT, 4)
                .nominal(Measure.BLADE_ANGLE, 45)
                .notStated(Measure.D_OVER_T, "recalled for about 1/3, without a range")
                .newtonianData()
                .value("Nq", 0.79)
                .remark("Values from 0.68 to 0.88 are reported, falling as D/T rises.")
                .build();
    }

    static Correlation mccabe() {
        return Correlation.of("pitchedblade.nq.mccabe", Quantity.FLOW_NUMBER, "McCabe, Smith and Harriott")
                .families(PitchedBlade.ID)
                .cite(Sources.mccabe("chapter 9, list of flow numbers"))
                .transcription(Transcription.FROM_MEMORY)
                .flow(FlowKind.DISCHARGE)
                .turbulent()
                .notStated(Classifier.BAFFLING, "recalled without it")
                .notStated(Measure.BLADE_COUNT, "recalled without it")
                .nominal(Measure.BLADE_ANGLE, 45)
                .nominal(Measure.W_OVER_D, 0.2)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData()
                .value("Nq", 0.87)
                .remark("Conflict: Hemrajani and Tatterson have 0.79 for four blades.")
                .build();
    }
}
