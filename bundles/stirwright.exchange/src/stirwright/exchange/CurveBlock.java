package stirwright.exchange;

import java.util.List;

/**
 * Points that belong together: an interval, a step, a ramp.
 *
 * @param number from 1, over the whole source
 * @param name what the source calls it; may be empty
 * @param sample from 1; above 1 only where several samples stand side by side
 * @param found what it seems to be
 * @param use what it is taken for: as found, or as the choice says
 * @param taken whether it becomes a curve
 * @param reason why it seems to be that, and why it is taken or not
 * @param replicate from 1; 0 for a block that is not taken
 * @param temperature mean in deg C; NaN when not known
 * @param points in the order of the source, dropped ones included
 * @param warnings what speaks against using it unseen, a sentence each
 */
public record CurveBlock(
        int number, String name, String sheet, int sample, BlockUse found, BlockUse use, boolean taken, String reason,
        int replicate, double temperature, List<CurveColumn> columns, List<CurvePoint> points, List<String> warnings) {

    public CurveBlock {
        columns = List.copyOf(columns);
        points = List.copyOf(points);
        warnings = List.copyOf(warnings);
    }

    /** How many of its points can be used. */
    public int usable() {
        return (int) points.stream().filter(CurvePoint::taken).count();
    }
}
