package stirwright.general;

import stirwright.correlation.Citation;

/** The works behind several of this bundle's numbers. */
final class Sources {

    /** Up to here Kamei and Hiraoka's equations were compared with Nagata's; the source says turbulent, no number. */
    static final double COMPARED_UP_TO = 1e5;

    /** The last part of a sentence in which the two stand against each other. */
    static final String XIE = "Xie et al., J. Chem. Eng. Japan 44 (2011) 840-844, say in their abstract that Nagata's "
            + "equations agree with their measurements in laminar flow alone, Kamei and Hiraoka's in every regime.";

    private Sources() {}

    static Citation kameiUnbaffled() {
        return Citation.withoutLocator("N. Kamei, S. Hiraoka et al., Kagaku Kogaku Ronbunshu 21 (1995) 41-48, and for "
                + "the angle S. Hiraoka, N. Kamei et al., Kagaku Kogaku Ronbunshu 23 (1997) 969-975");
    }

    static Citation kameiBaffled() {
        return Citation.withoutLocator("N. Kamei, S. Hiraoka et al., Kagaku Kogaku Ronbunshu 22 (1996) 249-256, and for "
                + "the angle S. Hiraoka, N. Kamei et al., Kagaku Kogaku Ronbunshu 23 (1997) 969-975");
    }
}
