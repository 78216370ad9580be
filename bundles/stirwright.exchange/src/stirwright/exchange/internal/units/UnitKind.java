package stirwright.exchange.internal.units;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** What a unit measures, in words. Knows units as text alone, so that it costs nothing to ask. */
public enum UnitKind {
    NUMBER("a number without unit", "6 or 0.85", List.of("-"), ""),
    LENGTH("a length", "0.9 or 900 mm", List.of("m"), "m, mm, cm, in, ft"),
    VOLUME("a volume", "2.5 or 2500 L", List.of("m3"), "m3, L, mL, cm3, ft3, US gal, imp gal"),
    ANGLE("an angle", "45 or 45 deg", List.of("deg"), "deg, rad"),
    ROTATION("a speed of rotation", "85 rpm or 1.5 rev/s", List.of("rev/min", "rev/s"),
            "rev/min, rpm, 1/min, rev/s, 1/s, rad/s"),
    PER_TURN("a number per turn", "11.5", List.of("per revolution"), "per revolution, 1/rev"),
    SHEAR_RATE("a shear rate", "120 or 120 1/s", List.of("1/s"), "1/s, 1/min"),
    DENSITY("a density", "1350 or 1.35 g/cm3", List.of("kg/m3"), "kg/m3, g/cm3, g/L, lb/ft3"),
    VISCOSITY("a viscosity", "0.012 or 12 mPa s", List.of("Pa s"), "Pa s, mPa s, P, cP"),
    CONSISTENCY("a consistency", "4.5 or 4500 mPa s^n", List.of("Pa s^n"), "Pa s^n, mPa s^n"),
    STRESS("a stress", "0.45 or 4.5 dyn/cm2", List.of("Pa"), "Pa, mPa, kPa, dyn/cm2, psi"),
    TIME("a time", "0.3 or 300 ms", List.of("s"), "s, ms, min, h"),
    POWER_PER_VOLUME("a power per volume", "800 or 0.8 kW/m3", List.of("W/m3"), "W/m3, kW/m3, W/L"),
    VELOCITY("a velocity", "4.5 or 4.5 m/s", List.of("m/s"), "m/s, mm/s, ft/s, ft/min"),
    // No field has these; they are here to say what a wrong unit measures.
    AREA("an area", "", List.of("m2"), ""),
    MASS("a mass", "", List.of("kg"), ""),
    FORCE("a force", "", List.of("N"), ""),
    POWER("a power", "", List.of("W"), ""),
    FLOW("a flow", "", List.of("m3/s"), ""),
    KINEMATIC_VISCOSITY("a kinematic viscosity", "", List.of("m2/s"), "");

    private final String words;
    private final String example;
    private final List<String> shown;
    private final String accepted;

    UnitKind(String words, String example, List<String> shown, String accepted) {
        this.words = words;
        this.example = example;
        this.shown = shown;
        this.accepted = accepted;
    }

    /** The kind of a field that is shown in this unit; empty when no field is. */
    public static Optional<UnitKind> of(String shownUnit) {
        return Arrays.stream(values()).filter(k -> !k.example.isEmpty() && k.shown.contains(shownUnit)).findFirst();
    }

    /** With its article. */
    String words() {
        return words;
    }

    /** One unit of this kind. */
    String unit() {
        return shown.get(0);
    }

    /** What may be typed, to follow "for instance". */
    String example() {
        return example;
    }

    /** To follow what was wrong. */
    String expected() {
        return words + " is expected" + (accepted.isEmpty() ? "" : ": " + accepted);
    }
}
