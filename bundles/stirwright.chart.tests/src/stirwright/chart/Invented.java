package stirwright.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Invented curves in the shape of power numbers: constant over the Reynolds number, then a constant. No data stand behind them. */
final class Invented {
    static final Axis RE = new Axis("Reynolds number, Re = ρND²/μ", "", true, 1, 1e6);
    static final Axis NP = new Axis("Power number, P/(ρN³D⁵)", "", true, 0.1, 100);

    private Invented() { }

    static Picture few() {
        List<Curve> curves = List.of(powerLike("a", "Invented turbine, six blades", 70, 4.8, 0, false, 1, 1e6),
                powerLike("b", "Invented pitched blade", 50, 1.4, 1, true, 3, 3e5),
                powerLike("c", "Invented propeller", 41, 0.35, 2, false, 1, 1e6),
                powerLike("d", "Invented anchor with a rather long name that has to be cut", 200, 0.4, 3, false, 1, 1e4),
                powerLike("e", "Invented paddle", 60, 1.5, 4, false, 10, 1e5));
        return new Picture(RE, NP, curves, bands(), Optional.of(new Mark(830, 1.6, "Re 830", "Np 1.600")), "");
    }

    static Picture many(int count) {
        List<Curve> curves = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            curves.add(powerLike("c" + i, "Invented curve " + (i + 1), 30 + 9 * i, 0.3 * Math.pow(1.13, i), i, i == 9, 1, 1e6));
        }
        return new Picture(RE, NP, curves, bands(), Optional.of(new Mark(2.2e4, 1.1, "Re 22000", "Np 1.100")), "");
    }

    static Picture linear() {
        double[] x = new double[200];
        double[] y = new double[200];
        boolean[] inside = new boolean[200];
        for (int i = 0; i < 200; i++) {
            x[i] = i / 2.0;
            y[i] = i > 80 && i < 95 ? Double.NaN : 6 * Math.sqrt(x[i] + 2) - 8;
            inside[i] = i < 150;
        }
        Curve one = new Curve("y", "Yield-stress fluid", x, y, inside, 0, true);
        Curve other = new Curve("z", "Half of it", x, halved(y), inside, 5, false);
        return new Picture(new Axis("Shear rate", "1/s", false, 0, 100), new Axis("Shear stress", "Pa", false, -10, 60),
                List.of(one, other), List.of(), Optional.empty(), "");
    }

    static List<Band> bands() {
        return List.of(new Band("laminar", Double.NEGATIVE_INFINITY, 10), new Band("transitional", 10, 1e4),
                new Band("turbulent", 1e4, Double.POSITIVE_INFINITY));
    }

    static Curve powerLike(String id, String label, double laminar, double turbulent, int style, boolean pick, double from, double to) {
        int count = 400;
        double[] x = new double[count];
        double[] y = new double[count];
        boolean[] inside = new boolean[count];
        for (int i = 0; i < count; i++) {
            x[i] = Math.pow(10, 6.0 * i / (count - 1));
            y[i] = laminar / x[i] + turbulent * (1 - 0.5 / (1 + Math.pow(x[i] / 400, 1.2)));
            inside[i] = x[i] >= from && x[i] <= to;
        }
        return new Curve(id, label, x, y, inside, style, pick);
    }

    private static double[] halved(double[] values) {
        return java.util.Arrays.stream(values).map(value -> value / 2).toArray();
    }
}
