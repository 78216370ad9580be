package stirwright.exchange;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import stirwright.core.Status;
import stirwright.rheology.Fit;
import stirwright.rheology.Fits;
import stirwright.rheology.FlowCurve;
import stirwright.rheology.ModelKind;
import stirwright.rheology.Objective;
import stirwright.rheology.ParameterException;

/**
 * The models that were fitted to one curve by relative deviation, best first, and those that could
 * not be.
 */
public record CurveFits(MeasuredCurve curve, List<Attempt> attempts) {

    /** Residuals that differ by less are equal: no measurement tells them apart. */
    private static final double EQUAL = 1e-9;

    private static final String RANKING =
            "ranked by rms_relative alone, which no parameter more can make worse; intervals are not computed yet";

    public CurveFits {
        attempts = List.copyOf(attempts);
    }

    /**
     * A model and how it did.
     *
     * @param fit empty when the model does not describe the curve
     * @param rank from 1; 0 without a fit
     */
    public record Attempt(ModelKind model, Optional<Fit> fit, int rank, List<String> notes) {}

    /** Fits every model for which there is a fit. */
    public static CurveFits of(MeasuredCurve curve) {
        List<Attempt> attempts = new ArrayList<>();
        attempts.add(attempt(ModelKind.POWER_LAW, curve, c -> Fits.powerLaw(c, Objective.RELATIVE)));
        attempts.add(attempt(ModelKind.HERSCHEL_BULKLEY, curve, c -> Fits.herschelBulkley(c, Objective.RELATIVE)));
        return new CurveFits(curve, ranked(attempts));
    }

    private static Attempt attempt(ModelKind model, MeasuredCurve curve, Function<FlowCurve, Fit> method) {
        try {
            Fit fit = method.apply(curve.points());
            List<String> notes = new ArrayList<>(List.of(RANKING));
            if (model == ModelKind.HERSCHEL_BULKLEY && fit.model().yieldStress() == 0) {
                notes.add("the yield stress is at its limit of 0: the power law fits as well");
            }
            return new Attempt(model, Optional.of(fit), 0, notes);
        } catch (ParameterException beyond) {
            return new Attempt(model, Optional.empty(), 0,
                    List.of("does not describe this curve: the best " + beyond.getMessage()));
        } catch (IllegalArgumentException tooFew) {
            return new Attempt(model, Optional.empty(), 0, List.of(tooFew.getMessage()));
        }
    }

    /** Fitted ones by residual; of equal ones the model with fewer parameters first. */
    private static List<Attempt> ranked(List<Attempt> attempts) {
        double least = attempts.stream().flatMap(a -> a.fit().stream()).mapToDouble(Fit::rmsRelative).min().orElse(0);
        List<Attempt> order = attempts.stream()
                .sorted(Comparator.<Attempt>comparingDouble(a -> a.fit().map(Fit::rmsRelative)
                                .map(r -> r <= least + EQUAL ? least : r).orElse(Double.MAX_VALUE))
                        .thenComparingInt(a -> a.model().parameters().size()))
                .toList();
        List<Attempt> ranked = new ArrayList<>();
        for (Attempt attempt : order) {
            ranked.add(new Attempt(attempt.model(), attempt.fit(),
                    attempt.fit().isPresent() ? ranked.size() + 1 : 0, attempt.notes()));
        }
        return ranked;
    }

    /** Refused when no model fits, flagged when some model does not. */
    public Status status() {
        long fitted = attempts.stream().filter(a -> a.fit().isPresent()).count();
        return fitted == 0 ? Status.REFUSED : fitted < attempts.size() ? Status.FLAGGED : Status.OK;
    }
}
