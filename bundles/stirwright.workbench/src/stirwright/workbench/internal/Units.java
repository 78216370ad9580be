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

    /** A symbol of a formula with the letters that print has, where its plain form is not the same. */
    public static String symbol(String plain) {
        return switch (plain) {
            case "ty" -> "\u03C4y";
            case "mu" -> "\u03BC";
            case "mup" -> "\u03BCp";
            case "m0" -> "\u03BC0";
            case "mi" -> "\u03BC\u221E";
            default -> plain;
        };
    }
}
