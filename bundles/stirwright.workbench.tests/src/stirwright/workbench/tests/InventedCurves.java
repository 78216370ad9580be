package stirwright.workbench.tests;

import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import stirwright.rheology.FluidModel;
import stirwright.rheology.HerschelBulkley;
import stirwright.study.Curve;
import stirwright.study.Curves;

/** Invented flow curves: a Herschel-Bulkley fluid with 2 % noise, an up ramp and a down ramp that lies lower. */
final class InventedCurves {
    static final FluidModel UP = new HerschelBulkley(12, 3.2, 0.44);
    static final FluidModel DOWN = new HerschelBulkley(9, 3, 0.45);
    static final double LEAST = 0.1;
    static final double MOST = 200;
    private static final int POINTS = 21;

    private InventedCurves() {}

    static List<Curve> ramps() {
        return List.of(curve("glaze slip up", "up", UP, 25, 1), curve("glaze slip down", "down", DOWN, 25, 2));
    }

    static Curve curve(String label, String ramp, FluidModel model, double temperature, long seed) {
        Random random = new Random(seed);
        double[] rates = IntStream.range(0, POINTS).mapToDouble(i -> LEAST * Math.pow(MOST / LEAST, i / (POINTS - 1.0))).toArray();
        double[] stresses = IntStream.range(0, POINTS).mapToDouble(i -> model.stress(rates[i]) * (1 + 0.02 * random.nextGaussian())).toArray();
        Curve curve = Curves.of(label, rates, stresses);
        curve.setSource("glaze-slip-invented.csv");
        curve.setSha256("0123456789abcdef".repeat(4));
        curve.setBlock(ramp.equals("up") ? "1 ramp up" : "2 ramp down");
        curve.setRamp(ramp);
        curve.setReplicate(1);
        curve.setTemperature(temperature);
        curve.getDropped().add("line 9: shear stress -0.2 Pa is not above 0");
        curve.getReadAs().add("column: viscosity in mPa s (from its header)");
        return curve;
    }
}
