package stirwright.exchange;

import java.util.List;

/**
 * Where a curve comes from.
 *
 * @param source the file's name without its folder, or "clipboard"
 * @param sha256 of the source's bytes, in hexadecimal
 * @param block the number and name of its block
 * @param sample what tells it from other samples of the source; empty where there is but one
 * @param replicate from 1: curves of one sample, ramp and temperature are counted
 * @param temperature mean in deg C; NaN when not known
 * @param dropped points of this block that are not in the curve
 * @param warnings what speaks against using it unseen, a sentence each
 */
public record Measurement(
        String source, String sha256, String block, String sample, Ramp ramp, int replicate, double temperature,
        List<DroppedPoint> dropped, List<String> warnings) {

    /** In K: curves that are closer were measured at one temperature, others on purpose apart; common practice, no source. */
    public static final double SAME_TEMPERATURE = 2;

    public Measurement {
        dropped = List.copyOf(dropped);
        warnings = List.copyOf(warnings);
    }

    /** Whether two temperatures in deg C count as one; two that are not known do. */
    public static boolean sameTemperature(double one, double other) {
        return Double.isNaN(one) ? Double.isNaN(other) : Math.abs(one - other) <= SAME_TEMPERATURE;
    }
}
