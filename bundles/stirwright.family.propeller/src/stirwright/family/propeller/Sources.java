package stirwright.family.propeller;

import stirwright.correlation.Citation;

/** The works behind several of this bundle's numbers. */
final class Sources {

    private static final String HEADING = "four baffles a tenth of the vessel wide (heading from memory)";

    private Sources() {}

    /** The table of K_L and K_T. */
    static Citation mccabe(String locator) {
        return Citation.of("W. L. McCabe, J. C. Smith and P. Harriott, Unit Operations of Chemical "
                + "Engineering, 5th ed., McGraw-Hill (1993)", locator + ", headed: " + HEADING);
    }

    /** The same table where its editions differ. */
    static Citation mccabeSomeEdition() {
        return Citation.of("W. L. McCabe, J. C. Smith and P. Harriott, Unit Operations of Chemical Engineering, McGraw-Hill, "
                + "editions differ", "table of K_L and K_T, headed: " + HEADING);
    }

    static Citation earle(String locator) {
        return Citation.of("R. L. Earle, Unit Operations in Food Processing", locator);
    }

    /** Tables of Metzner-Otto constants. */
    static Citation metznerTables() {
        return Citation.of("A. H. P. Skelland, Non-Newtonian Flow and Heat Transfer, Wiley (1967), after A. B. Metzner, R. "
                + "H. Feehs, H. L. Ramos, R. E. Otto and J. D. Tuthill, AIChE J. 7 (1961) 3-9", "Table 9.1");
    }
}
