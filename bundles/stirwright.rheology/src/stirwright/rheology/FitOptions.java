package stirwright.rheology;

import java.util.Locale;
import java.util.Objects;

/**
 * How models are fitted.
 *
 * @param objective what is made small
 * @param robust    whether points far off count less (Huber's estimate), instead of all alike
 */
public record FitOptions(Objective objective, boolean robust) {

	/** Relative deviations, every point counting alike. */
	public static final FitOptions DEFAULT = new FitOptions(Objective.RELATIVE, false);

	public FitOptions {
		Objects.requireNonNull(objective, "objective");
	}

	/** What was done, for reading: "relative error" or "relative error, robust". */
	public String words() {
		return objective.name().toLowerCase(Locale.ROOT).replace('_', ' ') + " error" + (robust ? ", robust" : "");
	}
}
