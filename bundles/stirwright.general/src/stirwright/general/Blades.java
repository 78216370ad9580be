package stirwright.general;

import stirwright.correlation.Dimensions;
import stirwright.correlation.Geometry;

/** How the blades stand; upright ones drop every term of the angle from the equations. */
enum Blades {
    /** On a disc: of the plateau with baffles its middle branch alone. */
    UPRIGHT,
    /** Upright on a hub: with all branches of the plateau. */
    PADDLE,
    /** At the family's blade angle. */
    PITCHED,
    /** The upright arms of an anchor: blades as high as the impeller. */
    ARMS;

    /** Height of the blade along itself. */
    double width(Geometry vessel) {
        return vessel.get(this == ARMS ? Dimensions.IMPELLER_HEIGHT : Dimensions.BLADE_WIDTH);
    }

    /** {@link #width} in a formula. */
    String widthSymbol() {
        return (this == ARMS ? Dimensions.IMPELLER_HEIGHT : Dimensions.BLADE_WIDTH).symbol();
    }

    /** Of the angle to the horizontal. */
    double sine(Geometry vessel) {
        return this == PITCHED ? Math.sin(vessel.get(Dimensions.BLADE_ANGLE)) : 1;
    }

    /** The angle to the horizontal as a share of the right angle. */
    double uprightness(Geometry vessel) {
        return this == PITCHED ? vessel.get(Dimensions.BLADE_ANGLE) / (Math.PI / 2) : 1;
    }

    /** A part of a formula that upright blades do not have. */
    String onlyPitched(String text) {
        return this == PITCHED ? text : "";
    }
}
