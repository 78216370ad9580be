package stirwright.family.pitchedblade;

import stirwright.correlation.ChartCurve;
import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/** Flow numbers, of the discharge unless said. Most are of the turbulent regime. */
final class FlowNumbers {

    /** Discharge of four blades at 45 degrees in turbulent flow, as tabled by Hemrajani and Tatterson. */
    private static final double FOUR_BLADES = 0.79;

    private static final String HANDBOOKS = "handbooks and reviews; which of them prints it is not at hand";

    private FlowNumbers() {}

    static Correlation hemrajani() {
        return discharge("pitchedblade.nq.hemrajani-tatterson-2004", "Hemrajani and Tatterson, turbulent")
                .cite(Citation.withoutLocator("R. R. Hemrajani and G. B. Tatterson in E. L. Paul, V. A. "
                        + "Atiemo-Obeng and S. M. Kresta (eds.), Handbook of Industrial Mixing, Wiley (2004), chapter 6"))
                .transcription(Transcription.FROM_MEMORY)
                .turbulent()
                .oneOf(Measure.BLADE_COUNT, 4)
                .notStated(Measure.D_OVER_T, "recalled for about 1/3, without a range")
                .value("Nq", FOUR_BLADES)
                .remark("Values from 0.68 to 0.88 are reported, falling as D/T rises.")
                .build();
    }

    static Correlation mccabe() {
        return discharge("pitchedblade.nq.mccabe", "McCabe, Smith and Harriott")
                .cite(Sources.mccabe("chapter 9, list of flow numbers"))
                .transcription(Transcription.FROM_MEMORY)
                .turbulent()
                .notStated(Measure.BLADE_COUNT, "recalled without it")
                .nominal(Measure.W_OVER_D, 0.2)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .value("Nq", 0.87)
                .remark("Conflict: Hemrajani and Tatterson have 0.79 for four blades.")
                .build();
    }

    static Correlation sixBlades() {
        return discharge("pitchedblade.nq.six-blades", "tables, six blades, turbulent")
                .cite(Citation.withoutLocator("tables of pumping numbers in " + HANDBOOKS))
                .transcription(Transcription.FROM_MEMORY)
                .scatter(0.042)
                .turbulent()
                .oneOf(Measure.BLADE_COUNT, 6)
                .notStated(Measure.D_OVER_T, "recalled for about 1/3, without a range")
                .value("Nq", 0.835)
                .remark("The middle of 0.80 to 0.87, whose ends are the scatter.")
                .build();
    }

    static Correlation overDiameterRatio() {
        return discharge("pitchedblade.nq.over-diameter-ratio", "falling with D/T, turbulent")
                .cite(Citation.withoutLocator(HANDBOOKS))
                .transcription(Transcription.UNSURE)
                .turbulent()
                .notStated(Measure.BLADE_COUNT, "recalled without it")
                .range(Measure.D_OVER_T, 0.25, 0.5)
                .contains(Effect.DIAMETER_RATIO)
                .curve("Nq", 0.25, 0.88, 0.5, 0.65)
                .formula("Nq over D/T {Nq}")
                .relation((vessel, k) -> {
                    double nq = k.curve("Nq").at(vessel.ratio(Dimensions.IMPELLER_DIAMETER, Dimensions.VESSEL_DIAMETER));
                    return point -> nq;
                })
                .remark("0.88 at D/T 0.25 is recalled, and 0.6 to 0.7 at 0.5, of which the middle stands here; the straight line "
                        + "between them is ours.")
                .build();
    }

    static Correlation overReynolds() {
        return discharge("pitchedblade.nq.over-reynolds", "falling with the Reynolds number")
                .cite(Citation.withoutLocator("shares recalled from the chart of R. W. Hicks, J. R. Morton and J. G. Fenic, Chem. "
                        + "Eng., 26 April 1976; the turbulent level from Hemrajani and Tatterson (2004)"))
                .transcription(Transcription.UNSURE)
                .atLeast(Measure.REYNOLDS, 50)
                .oneOf(Measure.BLADE_COUNT, 4)
                .notStated(Measure.D_OVER_T, "recalled for about 1/3, without a range")
                .reads(Variable.REYNOLDS)
                .constant("Nqt", FOUR_BLADES)
                .curve("share", 75, 0.25, 250, 0.45, 1000, 0.65, 7000, 1, 1e4, 1)
                .formula("Nq = {Nqt} times a share over Re {share}, level beyond")
                .relation((vessel, k) -> {
                    double turbulent = k.get("Nqt");
                    ChartCurve share = k.curve("share");
                    return point -> turbulent * share.at(point.reynolds());
                })
                .remark("The middles of recalled ranges: shares of 0.2 to 0.3 at Re 50 to 100, 0.4 to 0.5 at 200 to 300, 0.6 to "
                        + "0.7 at 1000, and 1 from 5000 to 1e4 on.")
                .build();
    }

    static Correlation circulation() {
        return card("pitchedblade.nq.circulation", "circulation from the discharge, turbulent")
                .cite(Citation.withoutLocator("the factor from " + HANDBOOKS + "; the discharge from Hemrajani and Tatterson (2004)"))
                .transcription(Transcription.UNSURE)
                .flow(FlowKind.CIRCULATION)
                .turbulent()
                .oneOf(Measure.BLADE_COUNT, 4)
                .notStated(Measure.D_OVER_T, "recalled without a range")
                .constant("r", 1.73)
                .constant("Nqt", FOUR_BLADES)
                .formula("Nq = {r} times {Nqt}")
                .relation((vessel, k) -> {
                    double nq = k.get("r") * k.get("Nqt");
                    return point -> nq;
                })
                .remark("Conflict: for axial impellers in general 1.8 to 3 times the discharge is reported.")
                .build();
    }

    private static CorrelationBuilder discharge(String id, String title) {
        return card(id, title).flow(FlowKind.DISCHARGE);
    }

    private static CorrelationBuilder card(String id, String title) {
        return Correlation.of(id, Quantity.FLOW_NUMBER, title)
                .families(PitchedBlade.ID)
                .notStated(Classifier.BAFFLING, "recalled without it")
                .nominal(Measure.BLADE_ANGLE, 45)
                .newtonianData();
    }
}
