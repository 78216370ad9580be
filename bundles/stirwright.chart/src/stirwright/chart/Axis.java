package stirwright.chart;

/**
 * One axis of a picture.
 *
 * @param title what it shows, with its definition, for instance "Power number, P/(ρN³D⁵)"
 * @param unit the unit of its values; empty for none
 * @param log true for a logarithmic axis
 * @param least the lower end, in {@code unit}
 * @param most the upper end, in {@code unit}. Ends that span nothing are replaced by what the curves need
 */
public record Axis(String title, String unit, boolean log, double least, double most) {
    /** Whether a zoom on the other axis still means the same on this one. */
    public boolean sameKind(Axis other) {
        return title.equals(other.title) && unit.equals(other.unit) && log == other.log;
    }

    /** The title as it is written beside the axis. */
    public String words() {
        return unit.isBlank() ? title : title + " (" + unit + ")";
    }
}
