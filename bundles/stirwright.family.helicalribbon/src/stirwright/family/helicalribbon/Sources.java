package stirwright.family.helicalribbon;

import stirwright.correlation.Citation;
import stirwright.correlation.Correlation;
import stirwright.correlation.CorrelationBuilder;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;

/** The works behind several of this bundle's numbers, and what their bounds speak of. */
final class Sources {

    /** Dickey, section 12.8. */
    static final double LAMINAR_UP_TO = 60;
    static final double TURBULENT_FROM = 20_000;

    static final Measure GAP_OVER_D = Measure.ratio(Dimensions.WALL_GAP, Dimensions.IMPELLER_DIAMETER);
    static final Measure HEIGHT_OVER_D = Measure.ratio(Dimensions.IMPELLER_HEIGHT, Dimensions.IMPELLER_DIAMETER);
    static final Measure RIBBON_OVER_D = Measure.ratio(Dimensions.RIBBON_WIDTH, Dimensions.IMPELLER_DIAMETER);
    static final Measure PITCH_RATIO = Measure.of(Dimensions.PITCH_RATIO);
    static final Measure RIBBON_COUNT = Measure.of(Dimensions.RIBBON_COUNT);

    private Sources() {}

    static Citation dickey() {
        return Citation.of("D. S. Dickey in Handbook of Chemical Engineering Calculations, McGraw-Hill",
                "section 12.8, p. 12.22");
    }

    /** What all sources share: a vessel whose wall the ribbon sweeps, and laminar flow. */
    static CorrelationBuilder laminar(String id, Quantity quantity, String title) {
        return Correlation.of(id, quantity, title)
                .families(HelicalRibbon.ID)
                .range(Measure.REYNOLDS, Double.NEGATIVE_INFINITY, LAMINAR_UP_TO,
                        "laminar in words; the end of it is the family's limit")
                .noRoomForBaffles();
    }
}
