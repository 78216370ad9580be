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
import java.util.Set;
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
            "consigna", "modul", "normalspannung", "fliessgrenze", "komplexe", "abweichung", "ecart", "desviacion", "log", "ln",
            "fitted", "fit", "model", "modell", "modele", "modelo", "predicted", "predicting", "prediction", "theoretical", "regression",
            "hb", "herschel", "bingham", "casson", "elastic", "specific", "extensional", "elongational", "average", "storage",
            "loss").map(HeaderWords::between).toList();

    /** Names whose unit may be one of a flow curve and that are nothing of it: a frequency, a pressure, a modulus as a letter. */
    static final List<String> NOT_BY_UNIT = Stream.of("frequency", "frequenz", "frequence", "frecuencia", "omega", "\u03C9", "angular", "pressure",
            "druck", "pression", "presion", "pressione", "g", "g1", "g2", "loss", "storage", "elastic", "viscous", "force", "gap").map(HeaderWords::between).toList();
    /** Words that a round bracket may hold beside a name without being a unit. */
    static final Set<String> REMARKS = Set.of("apparent", "app", "mean", "average", "avg", "measured", "meas", "corrected", "calculated",
            "calc", "actual", "true", "steady", "state", "dynamic", "dyn", "shear", "wall", "sample", "total", "elapsed", "raw", "the", "of",
            "up", "down", "upward", "downward", "scheinbar", "scheinbare", "gemessen", "mittel", "mittelwert", "korrigiert", "berechnet", "dynamisch", "probe",
            "auf", "ab", "apparente", "mesuree", "moyenne", "corrigee", "dynamique", "montee", "descente", "aparente", "medida",
            "media", "corregida", "dinamica", "subida", "bajada", "gamma", "dot", "punkt", "\u03B3", "tau", "\u03C4", "sigma", "\u03C3", "eta",
            "\u03B7", "d", "n", "t");

    static {
        phrases(SHEAR_RATE, "shear rate", "shearrate", "rate of shear", "shear strain rate", "gamma dot", "gammadot", "gamma punkt",
                "scherrate", "schergeschwindigkeit", "schergefalle", "geschwindigkeitsgefalle", "deformationsgeschwindigkeit",
                "vitesse de cisaillement", "taux de cisaillement", "gradient de cisaillement", "gradient de vitesse",
                "velocidad de corte", "velocidad de cizalla", "velocidad de cizallamiento", "velocidad de cizalladura",
                "gradiente de velocidad", "tasa de corte", "tasa de cizalla", "velocidad de deformacion", "gradiente di velocita",
                "velocita di taglio", "taxa de cisalhamento", "taxa de corte", "afschuifsnelheid", "gradiente de corte",
                "velocita di deformazione", "smykova rychlost", "forskydningshastighed", "leikkausnopeus", "szybkosc scinania",
                "skjuvhastighet", "kayma h\u0131z\u0131", "\u0441\u043A\u043E\u0440\u043E\u0441\u0442\u044C \u0441\u0434\u0432\u0438\u0433\u0430",
                "\u526A\u5207\u901F\u7387", "\u305B\u3093\u65AD\u901F\u5EA6");
        phrases(SHEAR_STRESS, "shear stress", "shearstress", "stress", "schubspannung", "scherspannung", "contrainte",
                "contrainte de cisaillement", "contrainte tangentielle", "esfuerzo", "esfuerzo de corte", "esfuerzo cortante",
                "tension de corte", "tension de cizalla", "tension cortante", "sforzo di taglio", "tensao de cisalhamento",
                "schuifspanning", "tau", "\u03C4", "sforzo", "smykove napeti",
                "forskydningssp\u00E6nding", "leikkausjannitys", "naprezenie scinajace", "naprezenie styczne", "skjuvspanning", "kayma gerilmesi",
                "\u043D\u0430\u043F\u0440\u044F\u0436\u0435\u043D\u0438\u0435 \u0441\u0434\u0432\u0438\u0433\u0430", "\u526A\u5207\u5E94\u529B", "\u305B\u3093\u65AD\u5FDC\u529B");
        phrases(VISCOSITY, "viscosity", "viskositat", "scherviskositat", "viscosite", "viscosidad", "viscosita", "viscosidade",
                "viscositeit", "eta", "\u03B7", "viskozita", "viskositet", "viskositeetti", "lepkosc", "viskozite",
                "\u0432\u044F\u0437\u043A\u043E\u0441\u0442\u044C", "\u7C98\u5EA6", "\u9ECF\u5EA6");
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
            if (PHRASES.put(between(Folded.of(word).words()), quantity) != null) {
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
