package stirwright.family.discturbine;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Flow numbers of the turbulent regime. Discharge and circulation differ by a factor of two and more. */
final class FlowNumbers {

    private FlowNumbers() {}

    static Correlation hemrajani() {
        return Correlation.of("discturbine.nq.hemrajani-tatterson-2004", Quantity.FLOW_NUMBER,
                        "Hemrajani and Tatterson, turbulent")
                .families(DiscTurbine.ID)
                .cite(Citation.withoutLocator("R. R. Hemrajani and G. B. Tatterson in E. L. Paul, V. A. "
                        + "Atiemo-Obeng and S. M. Kresta (eds.), Handbook of Industrial Mixing, Wiley (2004), chapter 6"))
                .transcription(Transcription.FROM_MEMORY)
                .flow(FlowKind.DISCHARGE)
                .turbulent()
                .notStated(Classifier.BAFFLING, "recalled without it")
                .oneOf(Measure.BLADE_COUNT, 6)
                .notStated(Measure.D_OVER_T, "recalled for about 1/3, without a range")
                .newtonianData()
                .value("Nq", 0.72)
                .remark("Tables have 0.72 to 0.75, and 0.65 to 0.95 by where the flow is counted.")
                .build();
    }

    static Correlation mccabe() {
        return Correlation.of("discturbine.nq.mccabe", Quantity.FLOW_NUMBER,
                        "McCabe, Smith and Harriott, entrained flow included")
                .families(DiscTurbine.ID)
                .cite(Sources.mccabe("chapter 9, list of flow numbers"))
                .transcription(Transcription.FROM_MEMORY)
                .flow(FlowKind.CIRCULATION)
                .turbulent()
                .notStated(Classifier.BAFFLING, "recalled without it")
                .oneOf(Measure.BLADE_COUNT, 6)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData()
                .value("Nq", 1.3)
                .remark("It counts entrained liquid, so it stands beside Cutter's number and not beside 0.72.")
                .build();
    }

    static Correlation cutter() {
        return Correlation.of("discturbine.nq.cutter-1966", Quantity.FLOW_NUMBER,
                        "Cutter, all flow out to the wall")
                .families(DiscTurbine.ID)
                .cite(Citation.of("L. A. Cutter, AIChE J. 12 (1966)", Citation.LOCATOR_NOT_AT_HAND
                        + "; recalled from McCabe, Smith and Harriott, chapter 9"))
                .transcription(Transcription.FROM_MEMORY)
                .flow(FlowKind.CIRCULATION)
                .turbulent()
                .notStated(Classifier.BAFFLING, "recalled without it")
                .oneOf(Measure.BLADE_COUNT, 6)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData()
                .contains(Effect.DIAMETER_RATIO)
                .constant("a", 0.92)
                .formula("Nq = {a} T/D")
                .relation((vessel, k) -> {
                    double nq = k.get("a") * vessel.ratio(Dimensions.VESSEL_DIAMETER, Dimensions.IMPELLER_DIAMETER);
                    return point -> nq;
                })
                .build();
    }
}
