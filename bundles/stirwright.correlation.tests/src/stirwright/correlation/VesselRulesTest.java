package stirwright.correlation;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Each common rule is broken by one dimension just beyond it and met by one just within. */
class VesselRulesTest {
    private static final Family FAMILY = Family.of("invented", "invented").description("invented for a test")
            .regimes(RegimeLimits.IN_GENERAL)
            .parameter(Dimensions.BLADE_WIDTH).parameter(Dimensions.BLADE_ANGLE).parameter(Dimensions.BLADE_THICKNESS)
            .build();

    /** T = H = 1 m, D 0.4, C 0.3, W 0.08 at 45 degrees, four baffles of 0.1, flat bottom. */
    private static Map<String, Double> vessel() {
        Map<String, Double> vessel = new HashMap<>(Map.of("vessel_diameter", 1.0, "liquid_height", 1.0,
                "impeller_diameter", 0.4, "clearance", 0.3, "baffle_count", 4.0, "baffle_width", 0.1,
                "impeller_count", 1.0, "impeller_spacing", 0.4, "liquid_volume", Math.PI / 4));
        vessel.putAll(Map.of("blade_width", 0.08, "blade_angle", Math.PI / 4, "blade_thickness", 0.004));
        return vessel;
    }

    @ParameterizedTest
    @CsvSource({
        // two impellers: 0.3 + 0.4 = 0.7 m, three: 1.1 m above the bottom, the surface at 1 m
        "impeller_count, 2, ''", "impeller_count, 3, impeller_count",
        "impeller_spacing, 9, ''",
        "baffle_width, 0.001, ''", "baffle_width, 0, baffle_width",
        // half of 0.08 sin 45 = 0.0283 m
        "clearance, 0.0284, ''", "clearance, 0.0282, clearance",
        "blade_thickness, 0.039, ''", "blade_thickness, 0.041, blade_thickness",
        // pi/4 = 0.7854 m3
        "liquid_volume, 0.158, ''", "liquid_volume, 0.157, liquid_volume",
        "liquid_volume, 0.863, ''", "liquid_volume, 0.865, liquid_volume",
    })
    void breaksJustBeyondAndNotJustWithin(String dimension, double value, String broken) {
        Map<String, Double> vessel = vessel();
        vessel.put(dimension, value);
        Geometry geometry = p -> vessel.getOrDefault(p.id(), Double.NaN);
        List<String> found = FAMILY.rules().stream().filter(r -> !r.holds(geometry)).map(r -> r.named().id()).toList();
        assertEquals(broken.isEmpty() ? List.of() : List.of(broken), found);
    }

    @ParameterizedTest
    @CsvSource({"0", "0.1"})
    void withoutBafflesTheirWidthDoesNotMatter(double width) {
        Map<String, Double> vessel = vessel();
        vessel.put("baffle_count", 0.0);
        vessel.put("baffle_width", width);
        Geometry geometry = p -> vessel.getOrDefault(p.id(), Double.NaN);
        assertEquals(List.of(), FAMILY.rules().stream().filter(r -> !r.holds(geometry)).toList());
    }
}
