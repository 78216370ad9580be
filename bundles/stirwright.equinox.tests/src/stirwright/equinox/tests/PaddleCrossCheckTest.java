package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashMap;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import stirwright.core.Catalogue;
import stirwright.core.Point;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Variable;

/**
 * Relations for paddles and pitched blades that share neither coefficients nor authors, held against
 * each other as installed, and the identities between them.
 */
class PaddleCrossCheckTest {
    private static final String NAGATA = "general.np.nagata-flatblade-unbaffled";
    private static final String KAMEI = "general.np.kamei-hiraoka-flatblade-unbaffled";
    private static final String KAMEI_PITCHED = "general.np.kamei-hiraoka-pitchedblade-unbaffled";
    private static final String MEDEK = "pitchedblade.np.medek-1980";
    private static final String HIRAOKA = "general.np.hiraoka-1997-fully-baffled";

    /** The printed numbers have three digits. */
    private static final double ROUNDING = 0.005;

    private final Catalogue installed = Framework.catalogue();

    /**
     * Two blades without baffles, H = T. Expected values: both sets of equations worked in a script that
     * shares no code with the product. Bands: how near the two are in that table: 3 to 7 % at Re 1, up
     * to 3 % at Re 10; from Re 100 on Nagata (1975) is from 30 % below to 6 % above Kamei and Hiraoka (1995).
     */
    @ParameterizedTest
    @CsvSource({
        "0.30, 0.06, 1, 30.2, 31.6, 0.07", "0.33, 0.10, 1, 39.3, 40.4, 0.07", "0.50, 0.10, 1, 34.4, 36.4, 0.07",
        "0.50, 0.20, 1, 54.7, 56.8, 0.07", "0.60, 0.10, 1, 33.4, 35.9, 0.07", "0.70, 0.20, 1, 53.7, 56.9, 0.07",
        "0.30, 0.06, 10, 4.38, 4.31, 0.03", "0.33, 0.10, 10, 5.64, 5.63, 0.03", "0.50, 0.10, 10, 4.53, 4.45, 0.03",
        "0.50, 0.20, 10, 7.54, 7.38, 0.03", "0.60, 0.10, 10, 4.18, 4.16, 0.03", "0.70, 0.20, 10, 6.60, 6.63, 0.03",
        "0.30, 0.06, 1e3, 1.28, 1.79, 0.31", "0.50, 0.20, 1e3, 1.79, 1.84, 0.31", "0.33, 0.10, 1e4, 1.01, 1.35, 0.31",
        "0.70, 0.20, 1e4, 0.622, 0.591, 0.31", "0.30, 0.06, 1e5, 0.582, 0.831, 0.31", "0.60, 0.10, 1e5, 0.301, 0.316, 0.31",
    })
    void nagataAndKameiAgreeWithinTheirBands(
            double dOverT, double wOverT, double re, double nagata, double kamei, double band) {
        Map<String, Double> vessel = vessel(dOverT, 2, wOverT / dOverT, 0);
        double first = value(NAGATA, "flatblade", vessel, re);
        double second = value(KAMEI, "flatblade", vessel, re);
        within(ROUNDING, nagata, first, "Nagata");
        within(ROUNDING, kamei, second, "Kamei and Hiraoka");
        within(band, second, first, "Nagata against Kamei and Hiraoka");
    }

    /** Both fully baffled, D/T 1/3, C/D 1, H = T. Medek (1980), Hiraoka et al. (1997): 4 % apart as worked by hand. */
    @ParameterizedTest
    @CsvSource({"4, 1.298, 1.348", "6, 1.725, 1.791"})
    void medekMeetsThePlateauOfPitchedPaddles(int blades, double medek, double plateau) {
        Map<String, Double> vessel = pitched(vessel(1.0 / 3, blades, 0.2, 4), 45);
        vessel.put("clearance", vessel.get("impeller_diameter"));
        double first = value(MEDEK, "pitchedblade", vessel, 1e5);
        double second = value(HIRAOKA, "pitchedblade", vessel, 1e5);
        within(ROUNDING, medek, first, "Medek");
        within(ROUNDING, plateau, second, "Hiraoka et al.");
        within(0.05, first, second, "Hiraoka et al. against Medek");
    }

    /** nB^0.701 (Medek) against nB^0.7 (Hiraoka et al.): one part in a thousand from 3 to 8 blades. */
    @Test
    void twoSourcesGiveTheBladeCountOneTrend() {
        double[] rise = new double[2];
        String[] ids = {MEDEK, HIRAOKA};
        for (int i = 0; i < ids.length; i++) {
            rise[i] = value(ids[i], "pitchedblade", pitched(vessel(1.0 / 3, 8, 0.2, 4), 45), 1e5)
                    / value(ids[i], "pitchedblade", pitched(vessel(1.0 / 3, 3, 0.2, 4), 45), 1e5);
        }
        within(ROUNDING, rise[0], rise[1], "blade count 3 to 8");
        assertEquals(1.987, rise[1], 1e-3, "(8/3)^0.7 by hand");
    }

    /**
     * Tables of Np Re against the friction-factor equations of Kamei and Hiraoka at creeping flow. Bands:
     * two blades 36.5 (McCabe) and 35.9; four pitched 44.5 (McCabe) and 47.0; six flat 70 (tables) and 69.1;
     * six pitched 70 (Rushton's fan turbine) and 64.8, 69.9.
     */
    @ParameterizedTest
    @CsvSource({
        "flatblade.np.mccabe-laminar, 36.5, flatblade, 0.5, 2, 0.02",
        "flatblade.np.six-blades-laminar, 70, flatblade, 0.33333, 6, 0.02",
        "pitchedblade.np.mccabe-laminar, 44.5, pitchedblade, 0.33333, 4, 0.06",
        "pitchedblade.np.rushton-1950-fan-laminar, 70, pitchedblade, 0.33333, 6, 0.09",
        "pitchedblade.np.rushton-1950-fan-laminar, 70, pitchedblade, 0.5, 6, 0.01",
    })
    void laminarTablesMeetTheFrictionFactor(
            String table, double printed, String family, double dOverT, int blades, double band) {
        double creeping = 1e-3;
        Map<String, Double> vessel = vessel(dOverT, blades, 0.2, 0);
        double entry = creeping * value(table, family, vessel, creeping);
        double equations = creeping * value(family.equals("flatblade") ? KAMEI : KAMEI_PITCHED, family, vessel, creeping);
        within(1e-12, printed, entry, table);
        within(band, entry, equations, "Kamei and Hiraoka against " + table);
    }

    /** A pitched paddle whose blades stand upright is a flat paddle. */
    @ParameterizedTest
    @ValueSource(doubles = {0.1, 10, 300, 1e4, 1e5})
    void uprightPitchedBladesAreFlatBlades(double re) {
        Map<String, Double> vessel = vessel(0.45, 2, 0.3, 0);
        for (String authors : new String[] {"nagata", "kamei-hiraoka"}) {
            within(1e-12, value("general.np." + authors + "-flatblade-unbaffled", "flatblade", vessel, re),
                    value("general.np." + authors + "-pitchedblade-unbaffled", "pitchedblade", pitched(vessel, 90), re), authors);
        }
    }

    /** More baffles never lower the power number; it stays below the plateau and nears it (Kamei and Hiraoka). */
    @Test
    void bafflesLiftThePowerToThePlateau() {
        String family = "flatblade";
        double before = value(KAMEI, family, vessel(0.4, 4, 0.2, 0), 1e5);
        double plateau = value("general.np.kamei-hiraoka-flatblade-fully-baffled", family, vessel(0.4, 4, 0.2, 16), 1e5);
        for (int baffles : new int[] {1, 2, 4, 8, 16}) {
            double np = value("general.np.kamei-hiraoka-flatblade-baffled", family, vessel(0.4, 4, 0.2, baffles), 1e5);
            assertTrue(np > before && np < plateau, baffles + " baffles: " + np + " after " + before + ", plateau " + plateau);
            before = np;
        }
        within(0.02, plateau, before, "16 baffles of T/10");
    }

    /** 1 m vessel diameter and liquid height; baffles of T/10. */
    private static Map<String, Double> vessel(double dOverT, int blades, double wOverD, int baffles) {
        Map<String, Double> vessel = new HashMap<>(Map.of("vessel_diameter", 1.0, "liquid_height", 1.0));
        vessel.put("impeller_diameter", dOverT);
        vessel.put("blade_count", (double) blades);
        vessel.put("blade_width", wOverD * dOverT);
        vessel.put("baffle_count", (double) baffles);
        return vessel;
    }

    private static Map<String, Double> pitched(Map<String, Double> vessel, double degrees) {
        Map<String, Double> pitched = new HashMap<>(vessel);
        pitched.put("blade_angle", Math.toRadians(degrees));
        return pitched;
    }

    private double value(String correlation, String family, Map<String, Double> vessel, double re) {
        return installed.entry(correlation).orElseThrow(() -> new AssertionError(correlation + " is not installed"))
                .correlation().bind(VesselGeometry.resolve(installed.family(family).orElseThrow(), vessel))
                .at(new Point().set(Variable.REYNOLDS, re));
    }

    private static void within(double band, double expected, double found, String what) {
        assertEquals(expected, found, band * expected, what);
    }
}
