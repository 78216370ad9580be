package stirwright.exchange.internal.curves;

import java.util.Arrays;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import stirwright.exchange.CurveQuantity;

/**
 * Spellings of units in the headers of flow curves, by quantity: there C is a temperature and P a viscosity, which the
 * grammar for typed numbers could not know. Factors: SI Brochure, 8th edition, tables 6, 8 and 9 (dyne, poise); pound,
 * foot and inch of 1959 under standard gravity.
 */
final class UnitWords {
    private static final double POUND_FORCE = 0.45359237 * 9.80665;
    private static final double FOOT = 0.3048;
    private static final Map<CurveQuantity, Map<String, UnitScale>> ALL = all();
    /** Named instead of taken unless it is known as written: mega where milli is meant. */
    private static final Pattern DOUBTFUL = Pattern.compile("(?:MPa|\u041C\u041F\u0430).*");
    /** "10^-3 Pa s", in each way to write it; never 100 or 10 alone. */
    private static final Pattern POWER = Pattern.compile("(?:10\\s*\\^\\s*([-\u2212]?[0-9]{1,2})|10(\u207B?[\u2070\u00B9\u00B2\u00B3\u2074-\u2079]{1,2})"
            + "|1[eE]([-\u2212]?[0-9]{1,2}))\\s*[\u00B7*x\u00D7]?\\s*(\\p{L}.*)");
    private static final Map<CurveQuantity, Set<String>> TELLING = Map.of(CurveQuantity.SHEAR_RATE, Set.of("1/s"),
            CurveQuantity.SHEAR_STRESS, Set.of("Pa", "kPa", "mPa", "dyn/cm2"),
            CurveQuantity.VISCOSITY, Set.of("Pa s", "kPa s", "mPa s", "cP"));

    private UnitWords() {}

    /** The unit under which values are given here. */
    static UnitScale own(CurveQuantity quantity) {
        return UnitScale.ten(quantity.unit(), 0);
    }

    /** The quantity that alone has this unit in a table of a flow curve; empty where several do, or none. */
    static Optional<CurveQuantity> telling(String unit) {
        if (unit.isEmpty()) {
            return Optional.empty();
        }
        return TELLING.entrySet().stream().filter(e -> find(e.getKey(), unit).filter(u -> e.getValue().contains(u.unit())).isPresent())
                .map(Map.Entry::getKey).findFirst();
    }

    /** Empty when it is unknown, or known only in another case and then with two meanings. */
    static Optional<UnitScale> find(CurveQuantity quantity, String text) {
        Matcher power = POWER.matcher(text.strip());
        if (power.matches()) {
            String exponent = plain(Stream.of(1, 2, 3).map(power::group).filter(Objects::nonNull).findFirst().orElseThrow());
            return find(quantity, power.group(4)).filter(u -> u.factor() == 1 && u.offset() == 0)
                    .map(u -> UnitScale.ten(text.strip(), u.power() + Integer.parseInt(exponent)));
        }
        Map<String, UnitScale> known = ALL.getOrDefault(quantity, Map.of());
        String plain = plain(text);
        if (known.containsKey(plain) || DOUBTFUL.matcher(plain).matches()) {
            return Optional.ofNullable(known.get(plain));
        }
        UnitScale found = null;
        for (Map.Entry<String, UnitScale> entry : known.entrySet()) {
            if (entry.getKey().equalsIgnoreCase(plain)) {
                if (found != null && !found.same(entry.getValue())) {
                    return Optional.empty();
                }
                found = entry.getValue();
            }
        }
        return Optional.ofNullable(found);
    }

    /** One unit that is this power of ten times another of the same quantity, for the words of a slip; empty without. */
    static Optional<String> other(CurveQuantity quantity, UnitScale than, int power) {
        return than.factor() != 1 ? Optional.empty() : ALL.get(quantity).values().stream()
                .filter(u -> u.factor() == 1 && u.offset() == 0 && u.power() == than.power() + power)
                .map(UnitScale::unit)
                .min(Comparator.comparing((String u) -> !u.contains("Pa")).thenComparing(Comparator.naturalOrder()));
    }

    /** Without spaces, dots between symbols and carets; superscripts as digits. */
    private static String plain(String text) {
        StringBuilder plain = new StringBuilder();
        for (char c : text.toCharArray()) {
            int digit = "\u2070\u00B9\u00B2\u00B3\u2074\u2075\u2076\u2077\u2078\u2079".indexOf(c);
            if (digit >= 0) {
                plain.append(digit);
            } else if (c == '\u207B' || c == '\u2212' || c == '\u2013') {
                plain.append('-');
            } else if (c == '\u00B5' || c == '\u03BC') {
                plain.append('u');
            } else if (c == '\u00BA' || c == '\u02DA') {
                plain.append('\u00B0');
            } else if (" .^*_\u00B7\u22C5\u2219\u2022\u00A0\u2009\u202F".indexOf(c) < 0) {
                plain.append(c);
            }
        }
        return plain.toString();
    }

    private static Map<CurveQuantity, Map<String, UnitScale>> all() {
        Map<CurveQuantity, Map<String, UnitScale>> all = new EnumMap<>(CurveQuantity.class);
        Arrays.stream(CurveQuantity.values()).forEach(q -> all.put(q, new HashMap<>()));
        put(all.get(CurveQuantity.SHEAR_RATE), UnitScale.ten("1/s", 0), "1/s", "s-1", "/s", "1/sec", "sec-1", "/sec",
                "reciprocalseconds", "reciprocalsecond", "reciprocalsec", "1s", "1/\u0441", "\u0441-1");
        put(all.get(CurveQuantity.SHEAR_RATE), UnitScale.times("1/min", 1 / 60.0), "1/min", "min-1", "/min");
        stresses(all.get(CurveQuantity.SHEAR_STRESS));
        viscosities(all.get(CurveQuantity.VISCOSITY));
        Map<String, UnitScale> temperatures = all.get(CurveQuantity.TEMPERATURE);
        put(temperatures, UnitScale.ten("deg C", 0), "degC", "\u00B0C", "C", "oC", "Celsius", "gradC", "GradCelsius", "degreesC");
        put(temperatures, new UnitScale("K", 0, 1, -273.15), "K", "Kelvin");
        put(temperatures, new UnitScale("deg F", 0, 1 / 1.8, -32 / 1.8), "degF", "\u00B0F", "F", "oF", "Fahrenheit");
        Map<String, UnitScale> times = all.get(CurveQuantity.TIME);
        put(times, UnitScale.ten("s", 0), "s", "sec", "seconds", "Sekunden", "secondes", "segundos");
        put(times, UnitScale.ten("ms", -3), "ms");
        put(times, UnitScale.times("min", 60), "min", "minutes", "Minuten", "minutos");
        put(times, UnitScale.times("h", 3600), "h", "hr", "hours", "Stunden");
        Map<String, UnitScale> torques = all.get(CurveQuantity.TORQUE);
        put(torques, UnitScale.ten("N m", 0), "Nm");
        put(torques, UnitScale.ten("mN m", -3), "mNm");
        put(torques, UnitScale.ten("uN m", -6), "uNm");
        put(torques, UnitScale.ten("nN m", -9), "nNm");
        put(torques, UnitScale.ten("N cm", -2), "Ncm");
        put(torques, UnitScale.ten("dyn cm", -7), "dyncm", "dynecm");
        put(all.get(CurveQuantity.TORQUE_PERCENT), UnitScale.ten("%", 0), "%", "percent", "Prozent", "%FS");
        Map<String, UnitScale> speeds = all.get(CurveQuantity.SPEED);
        put(speeds, UnitScale.ten("rpm", 0), "rpm", "1/min", "min-1", "rev/min", "r/min", "U/min", "tr/min", "/min");
        put(speeds, UnitScale.times("rev/s", 60), "rev/s", "rps", "1/s", "s-1");
        put(speeds, UnitScale.times("rad/s", 30 / Math.PI), "rad/s", "rads-1");
        return all;
    }

    private static void stresses(Map<String, UnitScale> into) {
        put(into, UnitScale.ten("Pa", 0), "Pa", "N/m2", "Nm-2", "Pascal", "Pascals", "\u041F\u0430");
        put(into, UnitScale.ten("kPa", 3), "kPa", "kilopascal", "kilopascals");
        put(into, UnitScale.ten("hPa", 2), "hPa", "mbar");
        put(into, UnitScale.ten("mPa", -3), "mPa");
        put(into, UnitScale.ten("uPa", -6), "uPa");
        put(into, UnitScale.ten("MPa", 6), "MPa", "N/mm2", "Nmm-2");
        put(into, UnitScale.ten("bar", 5), "bar");
        put(into, UnitScale.ten("dyn/cm2", -1), "dyn/cm2", "dyne/cm2", "dynes/cm2", "dyncm-2", "dynecm-2", "dyncm2", "dynecm2", "D/cm2",
                "dina/cm2", "dinas/cm2");
        put(into, UnitScale.times("psi", POUND_FORCE / (FOOT / 12 * FOOT / 12)), "psi", "lbf/in2");
        put(into, UnitScale.times("lbf/ft2", POUND_FORCE / (FOOT * FOOT)), "lbf/ft2", "lb/ft2", "psf");
        put(into, UnitScale.times("lbf/100ft2", POUND_FORCE / (100 * FOOT * FOOT)), "lbf/100ft2", "lb/100ft2");
    }

    private static void viscosities(Map<String, UnitScale> into) {
        put(into, UnitScale.ten("Pa s", 0), "Pas", "Pa-s", "Pasec", "Paxs", "Pascalsecond", "Pascalseconds", "\u041F\u0430\u0441", "Ns/m2", "Nsm-2", "kg/(ms)", "Pa/s-1");
        put(into, UnitScale.ten("kPa s", 3), "kPas");
        put(into, UnitScale.ten("mPa s", -3), "mPas", "mPa-s", "mPasec", "mPaxs", "millipascalsecond",
                "millipascalseconds", "millipascalsec", "\u043C\u041F\u0430\u0441");
        put(into, UnitScale.ten("uPa s", -6), "uPas");
        put(into, UnitScale.ten("P", -1), "P", "Poise", "dyns/cm2", "g/(cms)");
        put(into, UnitScale.ten("cP", -3), "cP", "centipoise", "centipoises", "cps", "cPoise");
    }

    private static void put(Map<String, UnitScale> into, UnitScale scale, String... spellings) {
        for (String spelling : spellings) {
            if (into.put(spelling, scale) != null) {
                throw new IllegalStateException(spelling + " has two meanings");
            }
        }
    }
}
