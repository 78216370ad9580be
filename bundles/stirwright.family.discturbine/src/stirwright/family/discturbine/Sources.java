package stirwright.family.discturbine;

import stirwright.correlation.Citation;

/** The works behind several of this bundle's numbers, and words that several cards share. */
final class Sources {

    /** Where the turbulent regime begins (Steffe, p. 188), for sources that say it in words only. */
    static final double TURBULENT_FROM = 1e4;

    static final String NEWTONIAN_DATA =
            "Newtonian data; other fluids enter through Metzner and Otto's apparent viscosity";

    static final String TURBULENT_IN_WORDS =
            "The source says turbulent; the number 10000 is Steffe's (p. 188).";

    /** Baffles of T/12 and T/10, with the slack of rounded drawings. */
    static final double NARROW_BAFFLE = 0.0813;
    static final double WIDE_BAFFLE = 0.1025;

    static final String MCCABE_HEADING = "The table is headed: four baffles a tenth of the vessel wide (from memory).";

    private Sources() {}

    static Citation mccabe(String locator) {
        return Citation.of("W. L. McCabe, J. C. Smith and P. Harriott, Unit Operations of Chemical "
                + "Engineering, 5th ed., McGraw-Hill (1993)", locator);
    }

    static Citation steffe(String locator) {
        return Citation.of("J. F. Steffe, Rheological Methods in Food Process Engineering, 2nd ed., "
                + "Freeman Press (1996)", locator);
    }

    static Citation rushton(String locator) {
        return Citation.of("J. H. Rushton, E. W. Costich and H. J. Everett, Chem. Eng. Prog. 46 (1950) "
                + "395-404 and 467-476", locator);
    }
}
