package stirwright.exchange;

/** What a column of a flow-curve file holds, in the units that points are given in here. */
public enum CurveQuantity {
    SHEAR_RATE("shear rate", "1/s"),
    SHEAR_STRESS("shear stress", "Pa"),
    VISCOSITY("viscosity", "Pa s"),
    TEMPERATURE("temperature", "deg C"),
    TIME("time", "s"),
    TORQUE("torque", "N m"),
    /** Of the instrument's full scale. */
    TORQUE_PERCENT("torque", "%"),
    SPEED("speed", "rpm"),
    /** A word that the instrument puts beside a point. */
    STATUS("status", ""),
    POINT_NUMBER("point number", ""),
    SEGMENT_NUMBER("segment number", ""),
    /** Both in one cell, for instance 2|13. */
    SEGMENT_AND_POINT("segment and point number", ""),
    /** The name of the sample that a row belongs to. */
    SAMPLE("sample", "");

    private final String words;
    private final String unit;

    CurveQuantity(String words, String unit) {
        this.words = words;
        this.unit = unit;
    }

    public String words() {
        return words;
    }

    /** The unit of values after conversion; empty for numbers that count and for words. */
    public String unit() {
        return unit;
    }

    /** Whether a column of this kind has a unit. */
    public boolean measured() {
        return !unit.isEmpty();
    }
}
