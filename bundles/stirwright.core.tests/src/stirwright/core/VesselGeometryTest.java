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
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;

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
