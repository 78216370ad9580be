package stirwright.core;

/** What the installed bundles contribute at this moment. Families arrive and leave at run time. */
public interface Library {

    /** An immutable snapshot; ask again to see what has come or gone. */
    Catalogue catalogue();
}
