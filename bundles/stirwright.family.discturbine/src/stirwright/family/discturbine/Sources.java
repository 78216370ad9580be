package stirwright.family.discturbine;

import stirwright.correlation.Citation;

/** The works behind several of this bundle's numbers. */
final class Sources {

    /** Baffles of T/12 and T/10, with the slack of rounded drawings. */
    static final double NARROW_BAFFLE = 0.0813;
    static final double WIDE_BAFFLE = 0.1025;

    static final String NO_WIDTH = "the table has no column for it; the figure beside it says 0.33, other accounts of the "
            + "same work 0.2";

    private Sources() {}

    static Citation mccabe(String locator) {
        return Citation.of("W. L. McCabe, J. C. Smith and P. Harriott, Unit Operations of Chemical "
                + "Engineering, 5th ed., McGraw-Hill (1993)", locator);
    }

    static Citation rushton(String locator) {
        return Citation.of("J. H. Rushton, E. W. Costich and H. J. Everett, Chem. Eng. Prog. 46 (1950) "
                + "395-404 and 467-476", locator);
    }

    static Citation metznerOtto() {
        return Citation.withoutLocator("A. B. Metzner and R. E. Otto, AIChE J. 3 (1957) 3-10");
    }

    /** The table of 1950 as far as it is public. */
    static Citation rushtonTable(String columns) {
        return rushton("p. 472 as printed in D. W. Hendricks, Fundamentals of Water Treatment Unit Processes, CRC Press, "
                + "Table 10.3, p. 258, " + columns);
    }

    static Citation bates() {
        return Citation.withoutLocator("R. L. Bates, P. L. Fondy and R. R. Corpstein, Ind. Eng. Chem. Process Des. Dev. 2 "
                + "(1963) 310-314");
    }
}
