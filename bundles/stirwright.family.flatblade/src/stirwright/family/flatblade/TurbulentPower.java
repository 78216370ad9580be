package stirwright.family.flatblade;

import stirwright.correlation.Citation;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** Power numbers of the turbulent regime with four baffles: independent of the Reynolds number. */
final class TurbulentPower {

    private TurbulentPower() {}

    static Correlation twoBlades() {
        return card("flatblade.np.mccabe-turbulent", "McCabe, Smith and Harriott, two-blade paddle, turbulent", 2, 0.2)
                .cite(Sources.mccabeTable())
                .baffled(4, 0.1)
                .value("KT", 1.70)
                .remark("Conflict: Kamei and Hiraoka's equations give 2.1 with these baffles.")
                .build();
    }

    static Correlation fourBlades() {
        return tabled(card("flatblade.np.handbook-four-blades", "handbook, four open blades, turbulent", 4, 0.2))
                .cite(Citation.withoutLocator("E. L. Paul, V. A. Atiemo-Obeng and S. M. Kresta (eds.), Handbook of Industrial "
                        + "Mixing, Wiley (2004)"))
                .scatter(0.032)
                .value("Npt", 3.1)
                .remark("The middle of 3.0 to 3.2, whose ends are the scatter.")
                .remark("Pitched blades lead to it: 1.27 (McCabe) at 45 degrees and the sine to 2.6 (Bates et al.) make 3.13.")
                .remark("Conflict: Kamei and Hiraoka's equations give 3.5 to 3.8 with these baffles.")
                .build();
    }

    static Correlation sixBlades() {
        return tabled(card("flatblade.np.bates-1963-six-blades", "Bates et al., six open blades, turbulent", 6, 0.125))
                .cite(Citation.withoutLocator("R. L. Bates, P. L. Fondy and R. R. Corpstein, Ind. Eng. Chem. Process Des. Dev. 2 "
                        + "(1963) 310-314"))
                .scatter(0.072)
                .value("Npt", 2.8)
                .remark("The middle of 2.6 to 3.0, whose ends are the scatter.")
                .remark("The same work has the power number rise with the blade count to 0.8 (three to six blades) and with W/D to "
                        + "1.0 to 1.25: from 3.1 for four blades of D/5 that makes 2.4 to 2.7.")
                .remark("Kamei and Hiraoka's equations give 2.9 to 3.0 with these baffles.")
                .build();
    }

    private static CorrelationBuilder card(String id, String title, int blades, double widthOverDiameter) {
        return Correlation.of(id, Quantity.POWER_NUMBER, title)
                .families(FlatBlade.ID)
                .transcription(Transcription.FROM_MEMORY)
                .atLeast(Measure.REYNOLDS, 1e4)
                .oneOf(Measure.BLADE_COUNT, blades)
                .nominal(Measure.W_OVER_D, widthOverDiameter)
                .notStated(Measure.D_OVER_T, "recalled for about 1/3, without a range")
                .newtonianData();
    }

    /** The baffles of most tables. */
    private static CorrelationBuilder tabled(CorrelationBuilder card) {
        return card.baffled()
                .oneOf(Measure.BAFFLE_COUNT, 4)
                .range(Measure.B_OVER_T, Sources.NARROW_BAFFLE, Sources.WIDE_BAFFLE, "T/12 to T/10");
    }
}
