package stirwright.general;

import stirwright.correlation.Citation;

/** The works behind several of this bundle's numbers. */
final class Sources {

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
