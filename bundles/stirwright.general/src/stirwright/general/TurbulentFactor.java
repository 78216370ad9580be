package stirwright.general;

import stirwright.correlation.BoundCorrelation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Figures;
import stirwright.correlation.Measure;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Variable;

/**
 * What factors have in common that were measured in turbulent flow. Below it nothing is known of
 * them, so that they are what they would be without the effect, and say so in their formula.
 */
final class TurbulentFactor {

    static final double FROM = RegimeLimits.IN_GENERAL.turbulentFrom();

    private TurbulentFactor() {}

    /** The words of a formula that ends below turbulent flow. */
    static String formula(String factor, String below) {
        return factor + " from Re " + Figures.show(FROM) + " on, " + below + " below";
    }

    static CorrelationBuilder declare(CorrelationBuilder card) {
        return card.reads(Variable.REYNOLDS)
                .notStated(Measure.REYNOLDS, "measured in turbulent flow; nothing is known of it below, and it does not act there")
                .newtonianData();
    }

    static BoundCorrelation of(double factor, double below) {
        return point -> point.reynolds() >= FROM ? factor : below;
    }
}
