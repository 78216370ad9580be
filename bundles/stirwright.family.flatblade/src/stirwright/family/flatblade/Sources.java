package stirwright.family.flatblade;

import stirwright.correlation.Citation;

/** The works behind several of this bundle's numbers. */
final class Sources {

    /** Baffles of T/12 and T/10, with the slack of rounded drawings. */
    static final double NARROW_BAFFLE = 0.0813;
    static final double WIDE_BAFFLE = 0.1025;

    private Sources() {}

    static Citation mccabeTable() {
        return Citation.of("W. L. McCabe, J. C. Smith and P. Harriott, Unit Operations of Chemical Engineering, 5th ed., "
                + "McGraw-Hill (1993)", "chapter 9, table of K_L and K_T, headed: four baffles a tenth of the vessel wide (from memory)");
    }
}
