package stirwright.workbench.internal;

/** Units as the window writes them, in fields, figures and sentences alike. */
public final class Units {

    private Units() {}

    /** In the plain letters that people type; empty for a pure number. */
    public static String brief(String unit) {
        return unit.equals("-") ? "" : unit.replace("revolution", "rev");
    }

    /** With raised exponents; empty for a pure number. */
    public static String show(String unit) {
        return brief(unit).replace("^n", "\u207F").replaceAll("(?<=m)2\\b", "\u00B2").replaceAll("(?<=m)3\\b", "\u00B3");
    }
}
