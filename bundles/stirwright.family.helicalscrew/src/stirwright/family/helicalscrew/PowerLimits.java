package stirwright.family.helicalscrew;

import static stirwright.correlation.Dimensions.DRAFT_TUBE_DIAMETER;
import static stirwright.correlation.Dimensions.IMPELLER_DIAMETER;
import static stirwright.correlation.Dimensions.IMPELLER_HEIGHT;
import static stirwright.correlation.Dimensions.SHAFT_DIAMETER;
import static stirwright.correlation.Dimensions.VESSEL_DIAMETER;

import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.FluidClass;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;

/**
 * Between which power numbers a screw's must lie in laminar flow. In creeping flow a body takes at
 * least the power of every body inside it that turns alike, and at most that of one around it: here
 * the shaft, and the full cylinder of the flight's diameter.
 */
final class PowerLimits {

    private static final Quantity MOST = Quantity.of("power-number-ceiling", "greatest power number", "Npmax", "-");

    private static final Measure HEIGHT = Measure.ratio(IMPELLER_HEIGHT, IMPELLER_DIAMETER);

    private PowerLimits() {}

    static Correlation least() {
        return limit("helicalscrew.npmin.shaft-alone", Quantity.POWER_NUMBER_FLOOR, "the shaft alone", "ds", SHAFT_DIAMETER)
                .notStated(Measure.ratio(SHAFT_DIAMETER, IMPELLER_DIAMETER), "exact for every shaft")
                .notStated(HelicalScrew.SURROUNDINGS, "with the vessel's wall in place of the tube's for a free screw")
                .remark("Without the ends, whose drag would add to it, so it stays a floor.")
                .build();
    }

    static Correlation most() {
        return limit("helicalscrew.npmax.full-cylinder", MOST, "a full cylinder in the tube", "D", IMPELLER_DIAMETER)
                .inClass(HelicalScrew.SURROUNDINGS, HelicalScrew.IN_A_TUBE)
                .remark("Without the ends, so it is a ceiling for screws that are long against their gap.")
                .build();
    }

    private static CorrelationBuilder limit(
            String id, Quantity quantity, String title, String symbol, GeometryParameter inner) {
        return Correlation.of(id, quantity, title + ", laminar")
                .families(HelicalScrew.ID)
                .cite(Citation.withoutLocator("exact flow between a turning and a resting cylinder, and the least dissipation of "
                        + "creeping flow (Helmholtz), worked here"))
                .transcription(Transcription.CHECKED_NUMERICALLY)
                .atMost(Measure.REYNOLDS, RegimeLimits.IN_GENERAL.laminarUpTo())
                .notStated(Classifier.BAFFLING, "in laminar flow baffles do not act")
                .notStated(Measure.D_OVER_T, "exact for every vessel")
                .notStated(Measure.ratio(DRAFT_TUBE_DIAMETER, IMPELLER_DIAMETER), "exact for every tube")
                .notStated(HEIGHT, "exact without the ends")
                .fluids(FluidClass.NEWTONIAN)
                .reads(Variable.REYNOLDS)
                .laminarLimit()
                .formula(quantity.symbol() + " = 4 pi^3 (h/D)/(Re (" + (symbol.equals("D") ? "1" : "(D/" + symbol + ")^2")
                        + " - (D/Dt)^2)); T for Dt without a tube")
                .relation((vessel, k) -> {
                    double kp = laminarPower(vessel, vessel.get(inner));
                    return point -> kp / point.reynolds();
                });
    }

    private static double laminarPower(Geometry vessel, double inner) {
        double tube = vessel.get(DRAFT_TUBE_DIAMETER);
        double toInner = vessel.get(IMPELLER_DIAMETER) / inner;
        double toOuter = vessel.get(IMPELLER_DIAMETER) / (tube > 0 ? tube : vessel.get(VESSEL_DIAMETER));
        return 4 * Math.pow(Math.PI, 3) * vessel.ratio(IMPELLER_HEIGHT, IMPELLER_DIAMETER)
                / (toInner * toInner - toOuter * toOuter);
    }
}
