package stirwright.exchange.internal.curves;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;
import stirwright.exchange.CurveQuantity;

/** Row by row, stress against shear rate times viscosity: a constant power of ten is a unit that is not the header's. */
final class RowCheck {
    private static final int LEAST_ROWS = 3;
    /** Of the decimal logarithm: rounding of printed values stays within it. */
    private static final double NEAR = 0.03;
    /** Of the rows that have to agree. */
    private static final double MOST = 0.8;

    private RowCheck() {}

    /** One sentence; empty when the columns agree or there is nothing to compare. */
    static Optional<String> of(Part part) {
        Column stress = part.stretch().group.column(CurveQuantity.SHEAR_STRESS);
        Column viscosity = part.stretch().group.column(CurveQuantity.VISCOSITY);
        if (stress == null || viscosity == null) {
            return Optional.empty();
        }
        double[] logs = part.points().stream().filter(ReadPoint::taken).map(ReadPoint::point)
                .filter(p -> p.viscosity() > 0 && Double.isFinite(p.viscosity()))
                .mapToDouble(p -> Math.log10(p.viscosity()) - Math.log10(p.shearStress() / p.shearRate()))
                .filter(Double::isFinite).sorted().toArray();
        if (logs.length < LEAST_ROWS) {
            return Optional.empty();
        }
        double median = logs[logs.length / 2];
        int power = (int) Math.round(median);
        long near = Arrays.stream(logs).filter(l -> Math.abs(l - power) < NEAR).count();
        if (near < MOST * logs.length) {
            return Math.abs(median) < NEAR ? Optional.empty() : Optional.of(String.format(Locale.ROOT,
                    "viscosity differs from stress over rate by a factor of %.3g in the middle, and not by the same one in all rows;"
                            + " check the columns and their units", Math.pow(10, median)));
        }
        return power == 0 || Math.abs(power) > 3 ? Optional.empty() : Optional.of(slip(power, viscosity, stress));
    }

    private static String slip(int power, Column viscosity, Column stress) {
        String size = (int) Math.pow(10, Math.abs(power)) + " times " + (power > 0 ? "larger" : "smaller");
        String told = UnitWords.other(CurveQuantity.VISCOSITY, viscosity.scale(), -power)
                .map(u -> viscosity.name() + " says " + viscosity.scale().unit() + " and may hold " + u).orElse("");
        String or = UnitWords.other(CurveQuantity.SHEAR_STRESS, stress.scale(), power)
                .map(u -> stress.name() + " says " + stress.scale().unit() + " and may hold " + u).orElse("");
        String both = told + (told.isEmpty() || or.isEmpty() ? "" : ", or ") + or;
        return "viscosity is " + size + " than stress over rate: " + (both.isEmpty() ? "a unit in the header is not the one of its column" : both)
                + ". Nothing is corrected; choose the right unit of the column";
    }
}
