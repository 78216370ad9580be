package stirwright.exchange.internal.units;

import static javax.measure.MetricPrefix.CENTI;
import static javax.measure.MetricPrefix.DECI;
import static javax.measure.MetricPrefix.HECTO;
import static javax.measure.MetricPrefix.KILO;
import static javax.measure.MetricPrefix.MEGA;
import static javax.measure.MetricPrefix.MICRO;
import static javax.measure.MetricPrefix.MILLI;
import static tech.units.indriya.unit.Units.GRAM;
import static tech.units.indriya.unit.Units.HOUR;
import static tech.units.indriya.unit.Units.KILOGRAM;
import static tech.units.indriya.unit.Units.LITRE;
import static tech.units.indriya.unit.Units.METRE;
import static tech.units.indriya.unit.Units.MINUTE;
import static tech.units.indriya.unit.Units.NEWTON;
import static tech.units.indriya.unit.Units.PASCAL;
import static tech.units.indriya.unit.Units.SECOND;
import static tech.units.indriya.unit.Units.WATT;

import java.util.HashMap;
import java.util.Map;
import javax.measure.Unit;
import javax.measure.quantity.Dimensionless;
import tech.units.indriya.function.MultiplyConverter;
import tech.units.indriya.unit.BaseUnit;
import tech.units.indriya.unit.UnitDimension;

/**
 * The symbols that are known. Case matters: mPa is not MPa. SI units and prefixes, litre, minute and hour are the
 * library's; the others are defined here, each with its source.
 */
final class UnitSymbols {
    /** A dimension of its own keeps turns apart from mere numbers: 85 rpm is no shear rate, 10 rad/s are not 10 turns. */
    static final Unit<Dimensionless> REVOLUTION = new BaseUnit<>("rev", "revolution", UnitDimension.parse('R'));

    /** The s^n in the unit of a consistency, of a dimension of its own, since n is not known. */
    static final Unit<Dimensionless> SECOND_TO_N = new BaseUnit<>("s^n", "second to the flow index", UnitDimension.parse('n'));

    /** A full turn is 2 pi rad and 360 degrees (SI Brochure, 9th edition, tables 4 and 8). */
    private static final Unit<?> RADIAN = REVOLUTION.divide(2).transform(MultiplyConverter.ofPiExponent(-1));
    private static final Unit<?> DEGREE = REVOLUTION.divide(360);

    /** 25.4 mm; a foot is 0.3048 m, a pound 0.45359237 kg: international yard and pound agreement, 1959. */
    private static final Unit<?> INCH = METRE.multiply(254).divide(10_000);
    private static final Unit<?> FOOT = METRE.multiply(3048).divide(10_000);
    private static final Unit<?> POUND = KILOGRAM.multiply(45_359_237).divide(100_000_000);

    /** The weight of a pound under standard gravity, 9.80665 m/s2 (3rd CGPM, 1901). */
    private static final Unit<?> POUND_FORCE = POUND.multiply(METRE).divide(SECOND.pow(2)).multiply(980_665).divide(100_000);

    /** 231 cubic inches (NIST Handbook 44, appendix C). */
    private static final Unit<?> US_GALLON = INCH.pow(3).multiply(231);

    /** 4.54609 L (United Kingdom, Units of Measurement Regulations 1995). */
    private static final Unit<?> IMPERIAL_GALLON = LITRE.multiply(454_609).divide(100_000);

    /**
     * Dyne 1e-5 N, poise 0.1 Pa s, stokes 1e-4 m2/s, bar 1e5 Pa, tonne 1000 kg (SI Brochure, 8th edition, tables 6, 8
     * and 9).
     */
    private static final Unit<?> DYNE = NEWTON.divide(100_000);
    private static final Unit<?> POISE = PASCAL.multiply(SECOND).divide(10);
    private static final Unit<?> STOKES = METRE.pow(2).divide(SECOND).divide(10_000);
    private static final Unit<?> BAR = PASCAL.multiply(100_000);
    private static final Unit<?> TONNE = KILOGRAM.multiply(1000);

    /** By every spelling that means it and nothing else. */
    static final Map<String, Unit<?>> BY_SYMBOL = symbols();

    /** Spellings that mean more than one unit, and what to write instead. */
    static final Map<String, String> DOUBTFUL = doubtful();

    private UnitSymbols() {}

    private static Map<String, Unit<?>> symbols() {
        Map<String, Unit<?>> all = new HashMap<>();
        put(all, METRE, "m");
        put(all, DECI(METRE), "dm");
        put(all, CENTI(METRE), "cm");
        put(all, MILLI(METRE), "mm");
        put(all, MICRO(METRE), "um");
        put(all, INCH, "in", "inch", "inches");
        put(all, FOOT, "ft", "foot", "feet");
        put(all, LITRE, "L", "l");
        put(all, HECTO(LITRE), "hL", "hl");
        put(all, MILLI(LITRE), "mL", "ml");
        put(all, US_GALLON, "USgal");
        put(all, IMPERIAL_GALLON, "impgal");
        put(all, REVOLUTION, "rev", "r", "revolution", "revolutions");
        put(all, REVOLUTION.divide(MINUTE), "rpm", "RPM");
        put(all, RADIAN, "rad");
        put(all, DEGREE, "deg", "\u00B0", "degrees");
        put(all, SECOND, "s");
        put(all, MILLI(SECOND), "ms");
        put(all, MINUTE, "min");
        put(all, HOUR, "h");
        put(all, KILOGRAM, "kg");
        put(all, GRAM, "g");
        put(all, MILLI(GRAM), "mg");
        put(all, TONNE, "t");
        put(all, POUND, "lb", "lbs");
        put(all, NEWTON, "N");
        put(all, KILO(NEWTON), "kN");
        put(all, MILLI(NEWTON), "mN");
        put(all, DYNE, "dyn", "dyne", "dynes");
        put(all, POUND_FORCE, "lbf");
        put(all, PASCAL, "Pa");
        put(all, MILLI(PASCAL), "mPa");
        put(all, HECTO(PASCAL), "hPa");
        put(all, KILO(PASCAL), "kPa");
        put(all, MEGA(PASCAL), "MPa");
        put(all, BAR, "bar");
        put(all, BAR.divide(1000), "mbar");
        put(all, POUND_FORCE.divide(INCH.pow(2)), "psi");
        put(all, POISE, "P");
        put(all, POISE.divide(100), "cP");
        put(all, STOKES, "St");
        put(all, STOKES.divide(100), "cSt");
        put(all, WATT, "W");
        put(all, MILLI(WATT), "mW");
        put(all, KILO(WATT), "kW");
        put(all, MEGA(WATT), "MW");
        return Map.copyOf(all);
    }

    private static Map<String, String> doubtful() {
        Map<String, String> all = new HashMap<>();
        put(all, "a US and an imperial gallon differ by a fifth; write US gal or imp gal", "gal", "gallon", "gallons");
        put(all, "cps stands for centipoise and for cycles per second; write cP or rev/s", "cps", "CPS");
        put(all, "Hz may be the frequency of an inverter instead of the shaft's; write rev/s or rpm", "Hz");
        put(all, "mechanical and metric horsepower differ; write kW", "hp", "HP", "PS");
        put(all, "short, long and metric tons differ; write t (1000 kg) or lb", "ton", "tons");
        return Map.copyOf(all);
    }

    private static <V> void put(Map<String, V> all, V value, String... spellings) {
        for (String spelling : spellings) {
            if (all.put(spelling, value) != null) {
                throw new IllegalStateException(spelling + " has two meanings");
            }
        }
    }
}
