package stirwright.family.discturbine;

import stirwright.correlation.ChartCurve;
import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** Flow numbers of the turbulent regime. Discharge and circulation differ by a factor of two and more. */
final class FlowNumbers {

    /** Discharge in turbulent flow. */
    private static final double TURBULENT = 0.72;

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
                .value("Nq", TURBULENT)
                .remark("Tables have up to 0.75, and 0.65 to 0.95 by where the flow is counted.")
                .build();
    }

    static Correlation transition() {
        return Correlation.of("discturbine.nq.transition", Quantity.FLOW_NUMBER, "fall below turbulent flow, recalled")
                .families(DiscTurbine.ID)
                .cite(Citation.withoutLocator("chart after R. W. Hicks, J. R. Morton and J. G. Fenic, Chem. Eng., 26 April "
                        + "1976; the level by Hemrajani and Tatterson (2004)"))
                .transcription(Transcription.UNSURE)
                .flow(FlowKind.DISCHARGE)
                .range(Measure.REYNOLDS, 75, 1e5)
                .notStated(Classifier.BAFFLING, "recalled without it")
                .oneOf(Measure.BLADE_COUNT, 6)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .newtonianData()
                .reads(Variable.REYNOLDS)
                .constant("Nq", TURBULENT)
                .curve("share", 75, 0.25, 250, 0.45, 1000, 0.65, 7000, 1, 1e5, 1)
                .formula("Nq = {Nq} times a share over Re {share}")
                .relation((vessel, k) -> {
                    double turbulent = k.get("Nq");
                    ChartCurve share = k.curve("share");
                    return point -> turbulent * share.at(point.reynolds());
                })
                .remark("Shares are recalled as 0.2 to 0.3 at Re 50 to 100, 0.4 to 0.5 at 200 to 300, 0.6 to 0.7 at 1000 and 1 "
                        + "from 5000 to 10 000 on, for pitched-blade and disc turbines alike; the middles are taken.")
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
