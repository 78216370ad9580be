package stirwright.workbench.internal.flow;

import java.util.List;
import java.util.Objects;
import java.util.stream.IntStream;
import stirwright.study.Curve;
import stirwright.study.Curves;

/**
 * A measured curve of the fluid as it was when it was asked about, so that another thread may read it.
 *
 * @param label unique in the fluid
 * @param ramp up, down or empty
 * @param replicate from 1; 0 where it is not known
 * @param temperature deg C; NaN where it is not known
 * @param used whether models are fitted to it
 * @param style of its marks
 * @param rates 1/s, as many as stresses; never changed
 * @param stresses Pa
 */
public record CurveData(
        String label, String source, String sha256, String block, String ramp, int replicate, double temperature, boolean used,
        int style, double[] rates, double[] stresses, List<String> dropped, List<String> readAs) {

    /** The word for a ramp that goes to higher rates. */
    static final String UP = "up";
    /** The word for a ramp that comes back from them. */
    static final String DOWN = "down";

    public CurveData {
        dropped = List.copyOf(dropped);
        readAs = List.copyOf(readAs);
    }

    /** @param before what was taken from the same curve earlier; its arrays are kept when the points are the same. May be null */
    static CurveData of(Curve curve, int style, CurveData before) {
        boolean same = before != null && samePoints(curve, before);
        return new CurveData(word(curve.getLabel()), word(curve.getSource()), word(curve.getSha256()), word(curve.getBlock()),
                word(curve.getRamp()), curve.getReplicate(), Curves.temperature(curve), curve.isUsed(), style,
                same ? before.rates : Curves.rates(curve), same ? before.stresses : Curves.stresses(curve), curve.getDropped(),
                curve.getReadAs());
    }

    private static boolean samePoints(Curve curve, CurveData before) {
        return curve.getPoints().size() == before.rates.length && IntStream.range(0, before.rates.length).allMatch(i ->
                curve.getPoints().get(i).rate() == before.rates[i] && curve.getPoints().get(i).stress() == before.stresses[i]);
    }

    private static String word(String text) {
        return Objects.requireNonNullElse(text, "");
    }

    /** How many points it has that a fit can use: rate and stress above 0. */
    int usable() {
        return (int) IntStream.range(0, rates.length).filter(i -> rates[i] > 0 && stresses[i] > 0).count();
    }
}
