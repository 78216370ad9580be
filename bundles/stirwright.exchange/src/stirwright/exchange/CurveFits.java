package stirwright.exchange;

import stirwright.core.Status;
import stirwright.rheology.FitOptions;
import stirwright.rheology.ModelFit;
import stirwright.rheology.RankedFits;

/** A measured curve with every model fitted to it. */
public record CurveFits(MeasuredCurve curve, RankedFits fits) {

    /** Fits every model. */
    public static CurveFits of(MeasuredCurve curve, FitOptions options) {
        return new CurveFits(curve, RankedFits.of(curve.points(), options));
    }

    /** Of one model: refused without a fit, flagged when nothing should hang on it. */
    public static Status status(RankedFits.Attempt attempt) {
        return attempt.fit().map(fit -> fit.doubtful() ? Status.FLAGGED : Status.OK).orElse(Status.REFUSED);
    }

    /** Of the recommended model, and of the curve itself: flagged when its measurement was. */
    public Status status() {
        Status model = fits.recommended().map(ModelFit::doubtful).map(doubt -> doubt ? Status.FLAGGED : Status.OK)
                .orElse(Status.REFUSED);
        return curve.measurement().warnings().isEmpty() ? model : model.worseOf(Status.FLAGGED);
    }
}
