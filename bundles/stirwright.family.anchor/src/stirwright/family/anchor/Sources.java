package stirwright.family.anchor;

import stirwright.correlation.Citation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Measure;

/** The works behind several of this bundle's numbers, and what their bounds speak of. */
final class Sources {

    static final Measure GAP_OVER_D = Measure.ratio(Dimensions.WALL_GAP, Dimensions.IMPELLER_DIAMETER);
    static final Measure GAP_OVER_T = Measure.ratio(Dimensions.WALL_GAP, Dimensions.VESSEL_DIAMETER);

    private Sources() {}

    static Citation mccabe() {
        return Citation.of("W. L. McCabe, J. C. Smith and P. Harriott, Unit Operations of Chemical "
                + "Engineering, 5th ed., McGraw-Hill (1993)", "chapter 9, table of K_L and K_T");
    }

    static Citation becknerSmith() {
        return Citation.of("J. L. Beckner and J. M. Smith, Trans. Instn Chem. Engrs 44 (1966)", "p. T224");
    }
}
