package stirwright.family.pitchedblade;

import stirwright.correlation.Citation;

/** The works behind several of this bundle's numbers, and words that several cards share. */
final class Sources {

    /** Where the turbulent regime of this impeller begins (Ludwig, p. 300). */
    static final double LUDWIG_TURBULENT_FROM = 1000;

    /** Where it begins for impellers in general (Steffe, p. 188), for sources that say it in words only. */
    static final double TURBULENT_FROM = 1e4;

    static final String NEWTONIAN_DATA =
            "Newtonian data; other fluids enter through Metzner and Otto's apparent viscosity";

    static final String TURBULENT_IN_WORDS =
            "The source says turbulent; the number 10000 is from J. F. Steffe, Rheological Methods in Food Process "
            + "Engineering, 2nd ed. (1996), p. 188.";

    static final String MCCABE_HEADING = "The table is headed: four baffles a tenth of the vessel wide (from memory).";

    private Sources() {}

    static Citation mccabe(String locator) {
        return Citation.of("W. L. McCabe, J. C. Smith and P. Harriott, Unit Operations of Chemical "
                + "Engineering, 5th ed., McGraw-Hill (1993)", locator);
    }

    static Citation ludwig(String locator) {
        return Citation.of("E. E. Ludwig, Applied Process Design for Chemical and Petrochemical Plants, vol. 1, "
                + "3rd ed., Gulf (1995)", locator);
    }
}
