package stirwright.family.pitchedblade;

import stirwright.correlation.Citation;

/** The works behind several of this bundle's numbers. */
final class Sources {

    /** Where the turbulent regime of this impeller begins (Ludwig, p. 300). */
    static final double TURBULENT_FROM = 1000;

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
