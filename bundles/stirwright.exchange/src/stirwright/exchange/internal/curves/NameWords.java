package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.regex.Pattern;

/**
 * A name of a sample, a sheet or a head without what belongs elsewhere: its temperature, ramp, run and step.
 *
 * @param sample what is left; may be empty
 * @param numberAlone whether there was nothing but a number, which may be a replicate or a sample
 */
record NameWords(String sample, boolean numberAlone) {
    private static final Pattern BETWEEN = Pattern.compile("[\\s_,;:()\\[\\]/\u2013-]+");
    private static final Set<String> RUN = Set.of("run", "replicate", "rep", "repeat", "repetition", "wiederholung", "repeticion",
            "measurement", "messung", "mesure", "medicion", "step", "schritt", "etape", "paso", "segment", "interval", "intervall",
            "section", "abschnitt", "cycle", "zyklus", "loop", "ramp", "rampe", "rampa", "no", "nr", "#");
    private static final Set<String> RAMP = Set.of("up", "upward", "upwards", "upsweep", "ascending", "rising", "increasing", "aufwarts",
            "steigend", "montee", "montante", "croissant", "subida", "ascendente", "down", "downward", "downwards", "downsweep",
            "descending", "falling", "decreasing", "abwarts", "fallend", "descente", "descendante", "decroissant", "bajada",
            "descendente");
    private static final Set<String> PROCEDURE = Set.of("flow", "sweep", "curve", "fliesskurve", "kurve", "courbe", "curva", "rotation",
            "shear", "rate", "stress", "viscosity", "stepped", "steady", "state", "conditioning", "preshear", "pre", "at", "bei",
            "temperature", "t");
    private static final Pattern NUMBERED = Pattern.compile("(run|rep|replicate|step|segment|ramp|cycle|loop)[0-9]{1,3}");
    private static final Pattern NUMBER = Pattern.compile("#?[0-9]{1,3}");

    static NameWords of(String name) {
        String cool = TemperatureInName.without(name);
        List<String> kept = new ArrayList<>();
        boolean dropped = !cool.equals(name);
        boolean after = false;
        for (String word : BETWEEN.split(cool)) {
            String folded = Folded.of(word).words();
            boolean counts = RUN.contains(folded) || RAMP.contains(folded) || PROCEDURE.contains(folded)
                    || NUMBERED.matcher(folded).matches();
            boolean gone = Set.of("Auf", "auf", "Ab", "ab").contains(word) || folded.isEmpty() && !word.chars().anyMatch(Character::isLetterOrDigit) || folded.equals("=") || counts
                    || after && NUMBER.matcher(folded).matches();
            dropped |= gone && !word.isEmpty();
            after = counts || after && gone;
            if (!gone) {
                kept.add(word);
            }
        }
        boolean alone = kept.size() == 1 && NUMBER.matcher(kept.get(0)).matches();
        return alone ? new NameWords("", !dropped) : new NameWords(dropped ? String.join(" ", kept) : name, false);
    }

    /** Whether a name holds a temperature and nothing else. */
    static boolean temperatureAlone(String name) {
        return !Double.isNaN(TemperatureInName.of(name)) && of(name).sample().isEmpty();
    }
}
