package stirwright.exchange.internal.units;

import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javax.measure.Unit;
import tech.units.indriya.AbstractUnit;

/**
 * Units as people write them: symbols with whole exponents, set side by side or joined by a dot, and at most one
 * symbol behind a slash. What a second slash or a product behind one means is not agreed upon (ISO 80000-1 asks for
 * brackets), so it is refused.
 */
final class UnitGrammar {
    private static final Pattern FACTOR = Pattern.compile("([A-Za-z\u00B0]+)(?:(\\^n)|\\^?(-?[1-9]))?");
    /** Pas and mPas are written for Pa s and mPa s. */
    private static final Pattern JOINED = Pattern.compile("(?<![A-Za-z])([mk]?)Pas(?![A-Za-z])");
    private static final Pattern GALLON = Pattern.compile("(?<![A-Za-z])(US|imp) +gal(?:lons?)?(?![A-Za-z])");
    private static final String RAISED = "\u2070\u00B9\u00B2\u00B3\u2074\u2075\u2076\u2077\u2078\u2079";

    private UnitGrammar() {}

    /**
     * @param kind what is expected, for the words of a refusal
     * @throws UnitRefusedException when it is no unit or can be read in two ways
     */
    static Unit<?> parse(String typed, UnitKind kind) throws UnitRefusedException {
        if (typed.equals(UnitKind.NUMBER.unit())) {
            return AbstractUnit.ONE;
        }
        String[] sides = plain(typed).split("/", -1);
        if (sides[0].isBlank()) {
            throw new UnitRefusedException("has a unit that begins with a slash; write a space and then 1/s, for instance");
        }
        Unit<?> over = sides[0].strip().equals("1") && sides.length > 1
                ? AbstractUnit.ONE : product(sides[0], typed, kind);
        if (sides.length == 1) {
            return over;
        }
        if (sides.length > 2 || sides[1].strip().contains(" ")) {
            throw new UnitRefusedException("has more than one symbol behind a slash, which can be read in two ways; write"
                    + " negative exponents, for instance kg m-1 s-1");
        }
        return over.divide(product(sides[1], typed, kind));
    }

    private static Unit<?> product(String side, String typed, UnitKind kind) throws UnitRefusedException {
        Unit<?> product = AbstractUnit.ONE;
        for (String text : side.strip().split(" +")) {
            Matcher factor = FACTOR.matcher(text);
            if (!factor.matches()) {
                throw unknown(text, typed, kind);
            }
            product = product.multiply(power(factor, typed, kind));
        }
        return product;
    }

    private static Unit<?> power(Matcher factor, String typed, UnitKind kind) throws UnitRefusedException {
        String symbol = factor.group(1);
        String doubt = UnitSymbols.DOUBTFUL.get(symbol);
        if (doubt != null) {
            throw new UnitRefusedException("is not clear: " + doubt);
        }
        if (factor.group(2) != null && symbol.equals("s")) {
            return UnitSymbols.SECOND_TO_N;
        }
        Unit<?> unit = UnitSymbols.BY_SYMBOL.get(symbol);
        if (unit == null || factor.group(2) != null) {
            throw unknown(factor.group(), typed, kind);
        }
        return factor.group(3) == null ? unit : unit.pow(Integer.parseInt(factor.group(3)));
    }

    private static UnitRefusedException unknown(String symbol, String typed, UnitKind kind) {
        return new UnitRefusedException("has the unit '" + (symbol.isEmpty() ? typed : symbol)
                + "', which is not known here; " + kind.expected());
    }

    /** One sign for each meaning: spaces between symbols, plain exponents. */
    private static String plain(String typed) {
        StringBuilder plain = new StringBuilder();
        for (char c : typed.toCharArray()) {
            int digit = RAISED.indexOf(c);
            plain.append(digit >= 0 ? String.valueOf(digit) : switch (c) {
                case '\u207B', '\u2212' -> "-";
                case '\u207F' -> "^n";
                case '\u00B5', '\u03BC' -> "u";
                case '.', '*', '\u00B7', '\u22C5', '\u2219', '\u00A0', '\u2009', '\u202F' -> " ";
                default -> String.valueOf(c);
            });
        }
        String joined = GALLON.matcher(plain).replaceAll("$1gal");
        return JOINED.matcher(joined).replaceAll("$1Pa s").replaceFirst("^per ", "1/").replaceFirst(" per ", "/");
    }
}
