package stirwright.correlation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static stirwright.correlation.Dimensions.BLADE_WIDTH;
import static stirwright.correlation.Dimensions.IMPELLER_DIAMETER;
import static stirwright.correlation.Dimensions.VESSEL_DIAMETER;

import java.util.List;
import org.junit.jupiter.api.Test;
import stirwright.correlation.GeometryParameter.Default;
import stirwright.correlation.GeometryParameter.Kind;

class FamilyTest {
    /** D 0.5, W 0.5, volume and spacing unknown, everything else 1. */
    private static final Geometry SQUARE = p -> p.equals(IMPELLER_DIAMETER) || p.equals(BLADE_WIDTH) ? 0.5
            : p.equals(Dimensions.LIQUID_VOLUME) || p.equals(Dimensions.IMPELLER_SPACING) ? Double.NaN : 1;

    private static Family.Builder family() {
        return Family.of("invented", "invented").description("invented for a test").regimes(RegimeLimits.IN_GENERAL);
    }

    private static List<String> broken(Family family) {
        return family.rules().stream().filter(r -> !r.holds(SQUARE))
                .map(r -> r.named().id() + " is not " + r.words(SQUARE)).toList();
    }

    @Test
    void startsWithTheCommonLimitsOfWhatItHas() {
        assertEquals(List.of("impeller_diameter", "clearance", "baffle_width", "baffle_width", "impeller_count", "clearance",
                "liquid_volume"), family().build().rules().stream().map(r -> r.named().id()).toList(), "no blades");
        assertEquals(List.of("clearance is not below liquid_height_m 1",
                "baffle_width is not below 0.5 times vessel_diameter_m 1",
                "blade_width is not below impeller_diameter_m 0.5"),
                broken(family().parameter(BLADE_WIDTH).build()));
    }

    @Test
    void aFamilyNarrowsAndWidensThem() {
        Family family = family().parameter(BLADE_WIDTH)
                .below(Dimensions.CLEARANCE, Dimensions.LIQUID_HEIGHT, 2)
                .below(Dimensions.BAFFLE_WIDTH, VESSEL_DIAMETER, 1.1)
                .below(BLADE_WIDTH, IMPELLER_DIAMETER, Double.POSITIVE_INFINITY)
                .below(IMPELLER_DIAMETER, VESSEL_DIAMETER, 0.4)
                .rule(Dimensions.WALL_GAP, "a tenth of T", g -> g.get(Dimensions.WALL_GAP) < 0.2)
                .rule(Dimensions.BLADE_LENGTH, "there", g -> false)
                .build();
        assertEquals(List.of("impeller_diameter is not below 0.4 times vessel_diameter_m 1", "wall_gap is not a tenth of T"),
                broken(family));
        assertThrows(ContractException.class, () -> family().below(BLADE_WIDTH, IMPELLER_DIAMETER, 0));
    }

    @Test
    void usingTheBuilderFurtherChangesNothing() {
        Family.Builder builder = family();
        Family family = builder.build();
        builder.parameter(BLADE_WIDTH).rule(VESSEL_DIAMETER, "never", g -> false);
        assertEquals(Dimensions.VESSEL, family.parameters());
        assertTrue(family.rules().stream().allMatch(r -> !r.words(SQUARE).equals("never")));
        assertThrows(UnsupportedOperationException.class, () -> family.rules().clear());
    }

    @Test
    void whatIsDerivedComesBeforeTheLastResort() {
        GeometryParameter gap = GeometryParameter.of("slit", "slit", Kind.LENGTH, "s", "invented")
                .assumedAs("1", g -> 1).derivedAs("2", g -> 2).derivedAs("3", g -> 3);
        assertEquals(List.of("DERIVED 2", "DERIVED 3", "ASSUMED 1"), words(gap));
        assertEquals(List.of("DERIVED 2", "DERIVED 3", "USUAL 4"), words(gap.usually("4", g -> 4)));
        assertEquals(List.of("DERIVED 2", "DERIVED 3", "ASSUMED 5"),
                words(gap.usually("4", g -> 4).assumedAs("5", g -> 5).withLimits(0, 9).withMeaning("other")));
        assertEquals(3, gap.fallbacks().size(), "the first is unchanged");
        assertEquals(List.of(), words(IMPELLER_DIAMETER));
        assertEquals(List.of(Default.DERIVED, Default.ASSUMED),
                VESSEL_DIAMETER.fallbacks().stream().map(Fallback::kind).toList());
    }

    private static List<String> words(GeometryParameter parameter) {
        return parameter.fallbacks().stream().map(f -> f.kind() + " " + f.words()).toList();
    }
}
