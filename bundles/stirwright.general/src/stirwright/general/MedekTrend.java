package stirwright.general;

import java.util.function.ToDoubleFunction;
import stirwright.correlation.Citation;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Geometry;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;

/** One ratio of Medek's power number of pitched-blade turbines as a factor on other sources' numbers. */
final class MedekTrend {

    /** T/D 6 to 2.4. */
    private static final double LEAST_D_OVER_T = 0.166;
    private static final double MOST_D_OVER_T = 0.417;

    private static final double LEAST_DEGREES = 15;
    private static final double MOST_DEGREES = 45;

    /** As far from the standard vessel a drawing is rounded: no factor is called for. Common practice, no source. */
    private static final double ROUNDED = 0.025;

    private static final double HAIR = 1e-9;

    private MedekTrend() {}

    /**
     * @param when in words, what makes it act in a vessel of the kind that Medek measured
     * @param overStandard the dimension over what it is in the standard vessel
     */
    static CorrelationBuilder declare(
            String id, Effect effect, String title, String when, ToDoubleFunction<Geometry> overStandard) {
        return TurbulentFactor.declare(Correlation.modifier(id, Quantity.POWER_NUMBER, effect, title))
                .families("pitchedblade")
                .appliesWhen(when + "; baffles, 15 to 45 degrees, T/D 2.4 to 6", vessel -> measured(vessel)
                        && Math.abs(overStandard.applyAsDouble(vessel) - 1) > ROUNDED)
                .cite(Citation.of("J. Medek, Int. Chem. Eng. 20 (1980)", "p. 664"))
                .transcription(Transcription.FROM_MEMORY)
                .baffled()
                .range(Measure.BLADE_ANGLE, LEAST_DEGREES, MOST_DEGREES)
                .range(Measure.D_OVER_T, LEAST_D_OVER_T, MOST_D_OVER_T)
                .remark("The same exponent as in pitchedblade.np.medek-1980, which contains the effect. The checks of that "
                        + "formula were at C/D 1 and H/T 1, where this exponent does not weigh.")
                .remark("Measured with blades of D/5 and four baffles of T/10.");
    }

    static boolean oneBaffled(Geometry vessel) {
        return vessel.get(Dimensions.IMPELLER_COUNT) == 1 && vessel.get(Dimensions.BAFFLE_COUNT) > 0;
    }

    /** A vessel of the kind in which the trend was measured; elsewhere it has nothing to say. */
    private static boolean measured(Geometry vessel) {
        double degrees = Math.toDegrees(vessel.get(Dimensions.BLADE_ANGLE));
        double dOverT = vessel.ratio(Dimensions.IMPELLER_DIAMETER, Dimensions.VESSEL_DIAMETER);
        return oneBaffled(vessel)
                && degrees >= LEAST_DEGREES - HAIR && degrees <= MOST_DEGREES + HAIR
                && dOverT >= LEAST_D_OVER_T && dOverT <= MOST_D_OVER_T;
    }
}
