package stirwright.exchange;

import java.util.List;
import stirwright.core.Arrival;
import stirwright.core.Catalogue;
import stirwright.core.CrossCheck;
import stirwright.correlation.Citation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Effect;
import stirwright.correlation.Family;
import stirwright.correlation.FlowKind;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.GeometryParameter.Kind;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.RegimeLimits;
import stirwright.correlation.Transcription;

/** Two invented families with round numbers for constants, so that results can be checked by hand. */
final class Invented {
    static final double POWER_NUMBER = 5;
    static final double SHEAR_RATE_CONSTANT = 10;
    static final double FLOW_NUMBER = 0.75;

    private static final Citation NOWHERE = Citation.withoutLocator("invented for tests");
    private static final GeometryParameter TWIST =
            GeometryParameter.of("twist", "twist", Kind.ANGLE, "w", "twist of a blade from hub to tip")
                    .usually("0", g -> 0).withLimits(0, Math.PI);

    static final Catalogue CATALOGUE = Catalogue.of(List.of(Arrival.of(new Blades(), "invented.blades 1.0.0")));
    static final CrossCheck CROSS_CHECK = new CrossCheck(CATALOGUE);

    private Invented() {}

    private static final class Blades implements Contribution {
        @Override
        public List<Family> families() {
            return List.of(
                    Family.of("blades", "invented blades").description("flat blades on a hub")
                            .parameter(Dimensions.BLADE_COUNT.usually("6", g -> 6))
                            .parameter(Dimensions.BLADE_ANGLE.usually("90", g -> Math.PI / 2))
                            .parameter(TWIST)
                            .regimes(RegimeLimits.of(10, 1e4, NOWHERE)).build(),
                    Family.of("plate", "invented plate").description("a plate without blades")
                            .regimes(RegimeLimits.of(10, 1e4, NOWHERE)).build());
        }

        @Override
        public List<Correlation> correlations() {
            return List.of(
                    constant("blades.np.firm", Quantity.POWER_NUMBER, POWER_NUMBER)
                            .range(Measure.REYNOLDS, 1, 1e9).oneOf(Measure.BLADE_COUNT, 6)
                            .inClass(Classifier.BAFFLING, "baffled", "unbaffled").scatter(0.1)
                            .contains(Effect.BAFFLES, Effect.CLEARANCE).build(),
                    constant("blades.np.narrow", Quantity.POWER_NUMBER, 4)
                            .range(Measure.REYNOLDS, 1, 2).oneOf(Measure.BLADE_COUNT, 2)
                            .inClass(Classifier.BAFFLING, "baffled").build(),
                    constant("blades.ks.ten", Quantity.SHEAR_RATE_CONSTANT, SHEAR_RATE_CONSTANT)
                            .range(Measure.REYNOLDS, 1e-3, 1e9).oneOf(Measure.BLADE_COUNT, 6)
                            .inClass(Classifier.BAFFLING, "baffled", "unbaffled").build(),
                    constant("blades.nq.plain", Quantity.FLOW_NUMBER, FLOW_NUMBER).flow(FlowKind.DISCHARGE)
                            .range(Measure.REYNOLDS, 1, 1e9).oneOf(Measure.BLADE_COUNT, 6)
                            .inClass(Classifier.BAFFLING, "baffled", "unbaffled").build());
        }

        private static CorrelationBuilder constant(String id, Quantity quantity, double value) {
            return Correlation.of(id, quantity, "an invented constant").families("blades").cite(NOWHERE)
                    .transcription(Transcription.CHECKED_AGAINST_SOURCE)
                    .constant("c", value).formula(quantity.symbol() + " = {c}")
                    .relation((geometry, constants) -> {
                        double c = constants.get("c");
                        return point -> c;
                    });
        }
    }
}
