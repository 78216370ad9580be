package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.GeometryParameter.Default;
import stirwright.correlation.RegimeLimits;

class VesselGeometryTest {

    @Test
    void blanksTakeTheStandardGeometry() {
        VesselGeometry g = VesselGeometry.resolve(Invented.DISC, Map.of("impeller_diameter", 0.4, "baffle_count", 4.0));
        assertEquals(1.2, g.get(Dimensions.VESSEL_DIAMETER), 1e-15);
        assertEquals(1.2, g.get(Dimensions.LIQUID_HEIGHT), 1e-15);
        assertEquals(0.08, g.get(Dimensions.BLADE_WIDTH), 1e-15);
        assertEquals(0.12, g.get(Dimensions.BAFFLE_WIDTH), 1e-15);
        assertEquals(0.4, g.get(Dimensions.WALL_GAP), 1e-15);
        assertEquals(Math.PI / 4 * 1.2 * 1.2 * 1.2, g.get(Dimensions.LIQUID_VOLUME), 1e-15);
        assertTrue(g.defaulted().contains(Dimensions.LIQUID_HEIGHT));
        assertEquals("blade_width_m = 0.08 (D/5)", g.defaultInWords(Dimensions.BLADE_WIDTH));
        assertTrue(Double.isNaN(g.get(Dimensions.BLADE_ANGLE)), "this family has no angle");
    }

    @Test
    void readingADefaultIsRecordedAndAGivenValueIsNot() {
        VesselGeometry g = VesselGeometry.resolve(Invented.DISC, Map.of("impeller_diameter", 0.4, "baffle_count", 4.0));
        Set<GeometryParameter> read = new LinkedHashSet<>();
        Geometry recording = g.recordingDefaults(read);
        recording.get(Dimensions.IMPELLER_DIAMETER);
        recording.get(Dimensions.BLADE_ANGLE);
        assertEquals(Set.of(), read, "given, or not a dimension of this family");
        recording.get(Dimensions.BLADE_WIDTH);
        recording.get(Dimensions.IMPELLER_COUNT);
        assertEquals(Set.of(Dimensions.BLADE_WIDTH, Dimensions.IMPELLER_COUNT), read);
    }

    @Test
    void theVesselFollowsFromTheGapWhereThatIsGiven() {
        VesselGeometry g = VesselGeometry.resolve(Invented.DISC,
                Map.of("impeller_diameter", 0.9, "wall_gap", 0.05, "baffle_count", 0.0));
        assertEquals(1.0, g.get(Dimensions.VESSEL_DIAMETER), 1e-15);
        assertEquals(Default.DERIVED, g.defaultKind(Dimensions.VESSEL_DIAMETER));
        assertEquals("vessel_diameter_m = 1 (D + 2 c)", g.defaultInWords(Dimensions.VESSEL_DIAMETER));
        assertEquals("baffle_width_m = 0", g.defaultInWords(Dimensions.BAFFLE_WIDTH));
        assertEquals(Default.DERIVED, g.defaultKind(Dimensions.BAFFLE_WIDTH));
        assertEquals(Default.NONE, g.defaultKind(Dimensions.WALL_GAP));
        assertEquals(Default.ASSUMED, g.defaultKind(Dimensions.LIQUID_HEIGHT));
        assertEquals(Default.USUAL, g.defaultKind(Dimensions.IMPELLER_COUNT));
        assertEquals(Default.NONE, g.defaultKind(Dimensions.BLADE_ANGLE));
    }

    @Test
    void withoutTheGapTheVesselIsAssumedAndTheGapRestsOnThat() {
        VesselGeometry g = VesselGeometry.resolve(Invented.DISC, Map.of("impeller_diameter", 0.4, "baffle_count", 4.0));
        assertEquals(Default.ASSUMED, g.defaultKind(Dimensions.VESSEL_DIAMETER));
        assertEquals("vessel_diameter_m = 1.2 (3 D)", g.defaultInWords(Dimensions.VESSEL_DIAMETER));
        assertEquals(Default.DERIVED, g.defaultKind(Dimensions.WALL_GAP));
        Set<GeometryParameter> read = new LinkedHashSet<>();
        g.recordingDefaults(read).get(Dimensions.WALL_GAP);
        assertEquals(Set.of(Dimensions.WALL_GAP, Dimensions.VESSEL_DIAMETER), read);
    }

    @Test
    void aBlankThatNothingFollowsForIsRefused() {
        GeometryParameter slit = GeometryParameter.of("slit", "slit", GeometryParameter.Kind.LENGTH, "s", "invented")
                .derivedAs("L/2", v -> v.get(Dimensions.BLADE_LENGTH) / 2)
                .derivedAs("1 over nothing", v -> 1 / 0.0);
        Family family = Family.of("slits", "slits").description("invented for a test").parameter(slit)
                .parameter(Dimensions.BLADE_LENGTH.assumedAs("D/4", v -> v.get(Dimensions.IMPELLER_DIAMETER) / 4))
                .regimes(RegimeLimits.IN_GENERAL).build();
        Map<String, Double> given = new HashMap<>(Map.of("impeller_diameter", 0.4, "baffle_count", 0.0));
        Refusal refusal = assertThrows(CaseRefusedException.class, () -> VesselGeometry.resolve(family, given)).refusal();
        assertEquals("slit_m", refusal.field());
        assertTrue(refusal.words().contains("follows from what was given"), refusal.words());
        given.put("blade_length", 0.2);
        assertEquals(0.1, VesselGeometry.resolve(family, given).get(slit), 1e-15, "listed later, but given");
    }

    @Test
    void aFamilysOwnLimitsAreKept() {
        Family family = Family.of("close", "close").description("invented for a test")
                .below(Dimensions.WALL_GAP, Dimensions.VESSEL_DIAMETER, 0.1)
                .rule(Dimensions.LIQUID_HEIGHT, "above T/2",
                        v -> v.get(Dimensions.LIQUID_HEIGHT) > v.get(Dimensions.VESSEL_DIAMETER) / 2)
                .regimes(RegimeLimits.IN_GENERAL).build();
        Map<String, Double> given = new HashMap<>(
                Map.of("impeller_diameter", 0.9, "vessel_diameter", 1.0, "baffle_count", 0.0, "clearance", 0.1));
        assertEquals(1, VesselGeometry.resolve(family, given).get(Dimensions.LIQUID_HEIGHT));
        given.put("liquid_height", 0.4);
        assertEquals("liquid_height_m 0.4 is not above T/2", refused(family, given));
        given.put("liquid_height", 1.0);
        given.put("impeller_diameter", 0.7);
        assertEquals("wall_gap_m 0.15 (nobody gave it: wall_gap_m = 0.15 ((T - D)/2)) is not below 0.1 times vessel_diameter_m 1", refused(family, given));
    }

    private static String refused(Family family, Map<String, Double> given) {
        return assertThrows(CaseRefusedException.class, () -> VesselGeometry.resolve(family, given)).refusal().words();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "impeller_diameter | 0 | impeller_diameter_m | above 0",
        "impeller_diameter | -0.5 | impeller_diameter_m | above 0",
        "impeller_diameter | 1.5 | impeller_diameter_m | not below vessel_diameter_m",
        "impeller_diameter | 1.6 | impeller_diameter_m | not below vessel_diameter_m",
        "vessel_diameter | 1500 | vessel_diameter_m | in mm",
        "liquid_height | 0.4 | clearance_m | not below liquid_height_m",
        "baffle_count | 3.5 | baffle_count | whole number",
        "baffle_count | -1 | baffle_count | from 0",
        "baffle_width | 0.8 | baffle_width_m | 0.5 times vessel_diameter_m",
        "blade_width | 0.5 | blade_width_m | not below impeller_diameter_m",
        "blade_count | 0 | blade_count | from 1",
        "wall_gap | 0.53 | wall_gap_m | contradicts",
        "impeller_count | 0 | impeller_count | from 1",
        "liquid_volume | 0 | liquid_volume_m3 | above 0",
        "liquid_volume | 2650 | liquid_volume_m3 | 0.2 to 1.1 times",
        "baffle_width | 0 | baffle_width_m | above 0 while baffle_count is",
        "impeller_count | 3 | impeller_count | few enough for the liquid",
        "clearance | 0.04 | clearance_m | half the height of the blades",
    })
    void hardLimitsNameColumnAndReason(String parameter, double value, String column, String words) {
        Map<String, Double> given = new HashMap<>(Invented.vessel());
        given.put(parameter, value);
        Refusal refusal = assertThrows(CaseRefusedException.class,
                () -> VesselGeometry.resolve(Invented.DISC, given)).refusal();
        assertEquals(column, refusal.field());
        assertTrue(refusal.words().contains(words), refusal.words());
    }

    @Test
    void wallGapWithinOnePercentOfTheVesselIsAccepted() {
        Map<String, Double> given = new HashMap<>(Invented.vessel());
        given.put("wall_gap", 0.514);
        assertEquals(0.514, VesselGeometry.resolve(Invented.DISC, given).get(Dimensions.WALL_GAP));
    }

    @Test
    void blankBaffleCountIsRefused() {
        Refusal refusal = assertThrows(CaseRefusedException.class,
                () -> VesselGeometry.resolve(Invented.DISC, Map.of("impeller_diameter", 0.4))).refusal();
        assertEquals("baffle_count", refusal.field());
        assertTrue(refusal.words().contains("is blank"), refusal.words());
    }
}
