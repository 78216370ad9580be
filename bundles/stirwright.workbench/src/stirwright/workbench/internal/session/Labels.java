package stirwright.workbench.internal.session;

/** What a curve is called where it is drawn. */
final class Labels {

    private Labels() {}

    static String of(Row row, boolean severalFamilies) {
        return severalFamilies ? row.familyTitle() + ": " + row.title() : row.title();
    }
}
