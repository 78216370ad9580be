package stirwright.study;

import java.util.List;
import java.util.Objects;

/** Makes and reads measured flow curves. */
public final class Curves {

    private Curves() {}

    /**
     * A new curve that belongs to nothing yet and is used in fits.
     *
     * @param rates shear rates in 1/s
     * @param stresses shear stresses in Pa, as many
     * @throws IllegalArgumentException when there are not as many of each, or one is not finite: no file could hold it
     */
    public static Curve of(String label, double[] rates, double[] stresses) {
        if (rates.length != stresses.length) {
            throw new IllegalArgumentException("curve " + label + ": " + rates.length + " rates and " + stresses.length
                    + " stresses; give as many of each");
        }
        MeasuredPoint[] points = new MeasuredPoint[rates.length];
        for (int i = 0; i < rates.length; i++) {
            if (!Double.isFinite(rates[i]) || !Double.isFinite(stresses[i])) {
                throw new IllegalArgumentException("curve " + label + ", point " + (i + 1) + ": " + rates[i] + " 1/s and "
                        + stresses[i] + " Pa are not both finite numbers");
            }
            points[i] = new MeasuredPoint(rates[i], stresses[i]);
        }
        Curve curve = StudyFactory.eINSTANCE.createCurve();
        curve.setLabel(label);
        curve.getPoints().addAll(List.of(points));
        return curve;
    }

    /** The shear rates in 1/s, in the order of the file. */
    public static double[] rates(Curve curve) {
        return curve.getPoints().stream().mapToDouble(MeasuredPoint::rate).toArray();
    }

    /** The shear stresses in Pa, in the order of the file. */
    public static double[] stresses(Curve curve) {
        return curve.getPoints().stream().mapToDouble(MeasuredPoint::stress).toArray();
    }

    /** In degrees Celsius; NaN where it is not known. */
    public static double temperature(Curve curve) {
        return curve.isSetTemperature() ? curve.getTemperature() : Double.NaN;
    }

    /** The label, or the label with the first number behind it that makes it one of its own among a fluid's curves. */
    public static String freeLabel(Fluid fluid, String label) {
        String free = label;
        for (int count = 2; has(fluid, free); count++) {
            free = label + " " + count;
        }
        return free;
    }

    private static boolean has(Fluid fluid, String label) {
        return fluid.getCurves().stream().anyMatch(c -> Objects.equals(c.getLabel(), label));
    }
}
