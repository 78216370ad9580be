package stirwright.exchange.internal.curves;

import static stirwright.exchange.CurveQuantity.POINT_NUMBER;
import static stirwright.exchange.CurveQuantity.SAMPLE;
import static stirwright.exchange.CurveQuantity.SEGMENT_AND_POINT;
import static stirwright.exchange.CurveQuantity.SEGMENT_NUMBER;
import static stirwright.exchange.CurveQuantity.SHEAR_RATE;
import static stirwright.exchange.CurveQuantity.SHEAR_STRESS;
import static stirwright.exchange.CurveQuantity.SPEED;
import static stirwright.exchange.CurveQuantity.STATUS;
import static stirwright.exchange.CurveQuantity.TEMPERATURE;
import static stirwright.exchange.CurveQuantity.TIME;
import static stirwright.exchange.CurveQuantity.TORQUE;
import static stirwright.exchange.CurveQuantity.TORQUE_PERCENT;
import static stirwright.exchange.CurveQuantity.VISCOSITY;

import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import stirwright.exchange.CurveQuantity;

/**
 * Words for quantities in English, German, French, Spanish, Italian, Portuguese and Dutch, folded: small letters without
 * accents, one space between words.
 */
final class HeaderWords {

    /** Words that stand for a quantity wherever they occur in a header, between spaces. */
    private static final Map<String, CurveQuantity> PHRASES = new HashMap<>();
    /** The same between spaces, the longest first, so that "vitesse de cisaillement" is no "vitesse". */
    static final List<Map.Entry<String, CurveQuantity>> BY_LENGTH;
    /** Words that do so only when a header begins with them and a unit or nothing follows. */
    static final Map<String, List<CurveQuantity>> SHORT = new HashMap<>();
    /** A header with one of these is something else: a normal stress, a set value, a standard deviation; between spaces. */
    static final List<String> OTHER_THINGS = Stream.of("normal", "yield", "modulus", "complex", "kinematic", "intrinsic", "inherent",
            "relative", "deviation", "error", "sd", "std", "stdev", "set", "setpoint", "target", "soll", "sollwert", "consigne",
            "consigna", "modul", "normalspannung", "fliessgrenze", "komplexe", "abweichung", "ecart", "desviacion", "log", "ln").map(HeaderWords::between).toList();

    static {
        phrases(SHEAR_RATE, "shear rate", "shearrate", "rate of shear", "shear strain rate", "gamma dot", "gammadot", "gamma punkt",
                "scherrate", "schergeschwindigkeit", "schergefalle", "geschwindigkeitsgefalle", "deformationsgeschwindigkeit",
                "vitesse de cisaillement", "taux de cisaillement", "gradient de cisaillement", "gradient de vitesse",
                "velocidad de corte", "velocidad de cizalla", "velocidad de cizallamiento", "velocidad de cizalladura",
                "gradiente de velocidad", "tasa de corte", "tasa de cizalla", "velocidad de deformacion", "gradiente di velocita",
                "velocita di taglio", "taxa de cisalhamento", "taxa de corte", "afschuifsnelheid");
        phrases(SHEAR_STRESS, "shear stress", "shearstress", "stress", "schubspannung", "scherspannung", "contrainte",
                "contrainte de cisaillement", "contrainte tangentielle", "esfuerzo", "esfuerzo de corte", "esfuerzo cortante",
                "tension de corte", "tension de cizalla", "tension cortante", "sforzo di taglio", "tensao de cisalhamento",
                "schuifspanning", "tau", "\u03C4");
        phrases(VISCOSITY, "viscosity", "viskositat", "scherviskositat", "viscosite", "viscosidad", "viscosita", "viscosidade",
                "viscositeit", "eta", "\u03B7");
        phrases(TEMPERATURE, "temperature", "temperatur", "temperatura", "probentemperatur", "temperatuur", "temp");
        phrases(TIME, "time", "zeit", "messzeit", "versuchszeit", "abschnittszeit", "temps", "tiempo", "tempo", "tijd");
        phrases(TORQUE, "torque", "drehmoment", "couple", "coppia", "momento", "par de torsion", "par torsor", "koppel");
        phrases(SPEED, "rotational speed", "drehzahl", "vitesse de rotation", "velocidad de giro", "velocidad de rotacion",
                "toerental", "speed");
        phrases(STATUS, "status", "messstatus", "zustand", "estado", "etat");
        phrases(SEGMENT_AND_POINT, "segment point", "seg pt", "segment pt", "step point", "abschnitt punkt", "intervall punkt",
                "segment punkt", "etape point", "tramo punto", "interval point");
        phrases(POINT_NUMBER, "data point", "point no", "point number", "messpunkt", "punkt nr", "meas pts", "point de mesure",
                "punto de medida");
        BY_LENGTH = PHRASES.entrySet().stream()
                .sorted(Comparator.comparingInt((Map.Entry<String, CurveQuantity> e) -> -e.getKey().length())
                        .thenComparing(Map.Entry::getKey)).toList();
        shorts(List.of(SHEAR_RATE), "rate", "d", "g", "\u03B3");
        shorts(List.of(TIME, TEMPERATURE), "t");
        shorts(List.of(TORQUE, TORQUE_PERCENT), "m", "moment", "par");
        shorts(List.of(SPEED, POINT_NUMBER), "n");
        shorts(List.of(SPEED), "rpm", "vitesse", "velocidad");
        shorts(List.of(POINT_NUMBER), "point", "points", "pt", "pts", "no", "nr", "number", "nummer", "punkt", "punto", "mp", "#");
        shorts(List.of(SEGMENT_NUMBER), "segment", "seg", "interval", "step", "section", "abschnitt", "intervall", "schritt",
                "intervalle", "etape", "paso", "intervalo", "tramo", "block");
        shorts(List.of(SAMPLE), "sample", "probe", "echantillon", "muestra", "batch", "charge", "lot", "product", "produkt", "fluid");
    }

    private HeaderWords() {}

    private static String between(String words) {
        return " " + words + " ";
    }

    private static void phrases(CurveQuantity quantity, String... words) {
        for (String word : words) {
            if (PHRASES.put(between(word), quantity) != null) {
                throw new IllegalStateException(word + " has two meanings");
            }
        }
    }

    private static void shorts(List<CurveQuantity> quantities, String... words) {
        for (String word : words) {
            SHORT.put(word, quantities);
        }
    }
}
