package stirwright.correlation;

import java.util.List;
import stirwright.correlation.GeometryParameter.Kind;

/**
 * The dimensions that many families share, so that one name means one thing everywhere. A family
 * has those of {@link #VESSEL}, takes of the others what it needs, and may give each its own default.
 */
public final class Dimensions {

    public static final GeometryParameter IMPELLER_DIAMETER = GeometryParameter.of(
            "impeller_diameter", "impeller diameter", Kind.LENGTH, "D", "diameter swept by the blade tips");

    /** Follows from the wall gap where that was given; else three impeller diameters are assumed. */
    public static final GeometryParameter VESSEL_DIAMETER = GeometryParameter.of(
                    "vessel_diameter", "vessel diameter", Kind.LENGTH, "T", "inner diameter of the vessel")
            .derivedAs("D + 2 c", g -> g.get(IMPELLER_DIAMETER) + 2 * g.get(Dimensions.WALL_GAP))
            .assumedAs("3 D", g -> 3 * g.get(IMPELLER_DIAMETER));

    public static final GeometryParameter LIQUID_HEIGHT = GeometryParameter.of(
                    "liquid_height", "liquid height", Kind.LENGTH, "H", "liquid height at rest above the bottom")
            .derivedAs("V/(pi/4 T^2), flat bottom", g -> g.get(Dimensions.LIQUID_VOLUME)
                    / (Math.PI / 4 * g.get(VESSEL_DIAMETER) * g.get(VESSEL_DIAMETER)))
            .assumedAs("T", g -> g.get(VESSEL_DIAMETER));

    public static final GeometryParameter CLEARANCE = GeometryParameter.of(
                    "clearance", "clearance", Kind.LENGTH, "C", "impeller centre above the bottom")
            .assumedAs("T/3", g -> g.get(VESSEL_DIAMETER) / 3);

    public static final GeometryParameter LIQUID_VOLUME = GeometryParameter.of(
                    "liquid_volume", "liquid volume", Kind.VOLUME, "V", "liquid in the vessel")
            .usually("flat bottom, pi/4 T^2 H",
                    g -> Math.PI / 4 * g.get(VESSEL_DIAMETER) * g.get(VESSEL_DIAMETER) * g.get(LIQUID_HEIGHT));

    public static final GeometryParameter WALL_GAP = GeometryParameter.of(
                    "wall_gap", "wall gap", Kind.LENGTH, "c", "blade tip to vessel wall, on one side")
            .derivedAs("(T - D)/2", g -> (g.get(VESSEL_DIAMETER) - g.get(IMPELLER_DIAMETER)) / 2);

    /** No default: a blank is refused, since baffles change the power of most families. */
    public static final GeometryParameter BAFFLE_COUNT = GeometryParameter.of(
                    "baffle_count", "baffle count", Kind.COUNT, "nb", "number of wall baffles; 0: unbaffled")
            .withLimits(0, 16);

    /** Zero when there is no baffle. */
    public static final GeometryParameter BAFFLE_WIDTH = GeometryParameter.of(
                    "baffle_width", "baffle width", Kind.LENGTH, "B", "radial width of one baffle")
            .withLimits(0, Double.MAX_VALUE)
            .derivedAs("0", g -> g.get(BAFFLE_COUNT) == 0 ? 0 : Double.NaN)
            .assumedAs("T/10", g -> g.get(VESSEL_DIAMETER) / 10);

    public static final GeometryParameter IMPELLER_COUNT = GeometryParameter.of(
                    "impeller_count", "impeller count", Kind.COUNT, "ni", "equal impellers on one shaft")
            .withLimits(1, 12)
            .usually("1", g -> 1);

    public static final GeometryParameter IMPELLER_SPACING = GeometryParameter.of(
                    "impeller_spacing", "impeller spacing", Kind.LENGTH, "S", "centre to centre of neighbouring impellers")
            .assumedAs("D", g -> g.get(IMPELLER_DIAMETER));

    public static final GeometryParameter BLADE_COUNT = GeometryParameter.of(
                    "blade_count", "blade count", Kind.COUNT, "nB", "blades of one impeller")
            .withLimits(1, 24);

    public static final GeometryParameter BLADE_WIDTH = GeometryParameter.of(
            "blade_width", "blade width", Kind.LENGTH, "W", "width of the blade along the blade, not projected");

    public static final GeometryParameter BLADE_ANGLE = GeometryParameter.of(
                    "blade_angle", "blade angle", Kind.ANGLE, "angle", "blade to the horizontal")
            .withLimits(Math.toRadians(1), Math.PI / 2);

    public static final GeometryParameter BLADE_THICKNESS = GeometryParameter.of(
            "blade_thickness", "blade thickness", Kind.LENGTH, "t", "thickness of the blade, and of the disc if there is one");

    public static final GeometryParameter BLADE_LENGTH = GeometryParameter.of(
            "blade_length", "blade length", Kind.LENGTH, "L", "radial length of one blade");

    public static final GeometryParameter PITCH_RATIO = GeometryParameter.of("pitch_ratio", "pitch ratio", Kind.RATIO, "p/D",
            "axial advance of the blade in one turn over the impeller diameter");

    public static final GeometryParameter IMPELLER_HEIGHT = GeometryParameter.of(
            "impeller_height", "impeller height", Kind.LENGTH, "h", "lower to upper edge of the impeller");

    public static final GeometryParameter RIBBON_WIDTH = GeometryParameter.of(
            "ribbon_width", "ribbon width", Kind.LENGTH, "w", "radial width of one ribbon");

    public static final GeometryParameter RIBBON_COUNT = GeometryParameter.of(
                    "ribbon_count", "ribbon count", Kind.COUNT, "nr", "ribbons, or starts of the helix")
            .withLimits(1, 6);

    public static final GeometryParameter SHAFT_DIAMETER = GeometryParameter.of(
            "shaft_diameter", "shaft diameter", Kind.LENGTH, "ds", "diameter of the shaft along the impeller");

    public static final GeometryParameter DRAFT_TUBE_DIAMETER = GeometryParameter.of(
            "draft_tube_diameter", "draft-tube diameter", Kind.LENGTH, "Dt", "inner diameter of the draft tube");

    /** What every vessel has, in the order in which blanks are filled. */
    public static final List<GeometryParameter> VESSEL = List.of(
            IMPELLER_DIAMETER, VESSEL_DIAMETER, LIQUID_HEIGHT, LIQUID_VOLUME, CLEARANCE, WALL_GAP,
            BAFFLE_COUNT, BAFFLE_WIDTH, IMPELLER_COUNT, IMPELLER_SPACING);

    private Dimensions() {}
}
