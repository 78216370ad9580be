package stirwright.exchange;

/**
 * A row of a block after conversion; NaN where the source has nothing or nothing that can be read.
 *
 * @param shearRate 1/s
 * @param shearStress Pa, measured or shear rate times viscosity
 * @param viscosity Pa s
 * @param temperature deg C
 * @param time s
 * @param torquePercent of full scale
 * @param status as it stands there
 * @param dropped why it is not taken; empty for a point that is
 */
public record CurvePoint(
        PointPlace place, double shearRate, double shearStress, double viscosity, double temperature, double time,
        double torquePercent, String status, String dropped) {

    public boolean taken() {
        return dropped.isEmpty();
    }
}
