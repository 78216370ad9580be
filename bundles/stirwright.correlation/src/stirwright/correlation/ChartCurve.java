package stirwright.correlation;

/**
 * A curve through points with both axes logarithmic: straight between the points, and beyond the
 * ends along the last segment. Points read off a chart or printed as a table.
 */
public final class ChartCurve {
    private final double[] lnX;
    private final double[] lnY;

    private ChartCurve(double[] lnX, double[] lnY) {
        this.lnX = lnX;
        this.lnY = lnY;
    }

    /**
     * @param xy x and y in turn, x ascending, all above zero, two points at least
     */
    public static ChartCurve through(double... xy) {
        if (xy.length < 4 || xy.length % 2 != 0) {
            throw new ContractException("a curve needs pairs of x and y, two at least; got " + xy.length + " numbers");
        }
        double[] lnX = new double[xy.length / 2];
        double[] lnY = new double[xy.length / 2];
        for (int i = 0; i < lnX.length; i++) {
            lnX[i] = Math.log(xy[2 * i]);
            lnY[i] = Math.log(xy[2 * i + 1]);
            if (!Double.isFinite(lnX[i]) || !Double.isFinite(lnY[i]) || i > 0 && lnX[i] <= lnX[i - 1]) {
                throw new ContractException("curve point (" + xy[2 * i] + ", " + xy[2 * i + 1]
                        + "): both must be above zero, x above the x before");
            }
        }
        return new ChartCurve(lnX, lnY);
    }

    public double at(double x) {
        double ln = Math.log(x);
        int i = 1;
        while (i < lnX.length - 1 && ln > lnX[i]) {
            i++;
        }
        double share = (ln - lnX[i - 1]) / (lnX[i] - lnX[i - 1]);
        return Math.exp(lnY[i - 1] + share * (lnY[i] - lnY[i - 1]));
    }

    /** The same curve with every y multiplied. */
    public ChartCurve scaled(double factor) {
        double[] y = lnY.clone();
        for (int i = 0; i < y.length; i++) {
            y[i] += Math.log(factor);
        }
        return new ChartCurve(lnX, y);
    }

    /** The points in words. */
    @Override
    public String toString() {
        StringBuilder words = new StringBuilder("through");
        for (int i = 0; i < lnX.length; i++) {
            words.append(i == 0 ? " (" : ", (").append(Figures.show(Math.exp(lnX[i])))
                    .append(", ").append(Figures.show(Math.exp(lnY[i]))).append(')');
        }
        return words.append(", both axes logarithmic").toString();
    }
}
