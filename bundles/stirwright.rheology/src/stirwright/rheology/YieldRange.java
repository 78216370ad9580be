package stirwright.rheology;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The yield stress as a range: by every model that has one, on every curve, and as it was measured statically. One number
 * would hide that models disagree on it more than on anything else.
 *
 * @param low     Pa, 0 or greater
 * @param high    Pa
 * @param sources what the range was taken from, and what was left out
 */
public record YieldRange(double low, double high, List<Source> sources) {

	/** The name of a source that is no fit. */
	public static final String STATIC = "static";

	public YieldRange {
		sources = List.copyOf(sources);
	}

	/**
	 * One yield stress.
	 *
	 * @param name     of the model and the curve, or how it was measured
	 * @param value    Pa
	 * @param interval Pa, of 95 %
	 * @param counted  whether the range reaches over it
	 * @param why      not, when it is not counted; else empty
	 */
	public record Source(String name, double value, Interval interval, boolean counted, String why) {
	}

	/**
	 * @param fits        by the name of the curve
	 * @param staticYield Pa, for instance from a vane
	 * @return empty when no model with a yield stress describes a curve and none was measured statically
	 */
	public static Optional<YieldRange> of(Map<String, RankedFits> fits, OptionalDouble staticYield) {
		List<Source> sources = new ArrayList<>();
		fits.forEach((name, ranked) -> ranked.attempts().stream().flatMap(a -> a.fit().stream())
				.filter(YieldRange::hasYieldStress).forEach(fit -> sources.add(source(name, fit))));
		staticYield.ifPresent(value -> sources.add(new Source(STATIC, value, Interval.NONE, true, "")));
		List<Source> counted = sources.stream().filter(Source::counted).toList();
		if (counted.isEmpty()) {
			return Optional.empty();
		}
		double low = counted.stream().mapToDouble(s -> or(s.interval().low(), s.value())).min().getAsDouble();
		double high = counted.stream().mapToDouble(s -> or(s.interval().high(), s.value())).max().getAsDouble();
		return Optional.of(new YieldRange(low, high, sources));
	}

	private static boolean hasYieldStress(ModelFit fit) {
		return fit.kind().parameters().contains(ModelParameters.YIELD_STRESS);
	}

	private static Source source(String curve, ModelFit fit) {
		Estimate estimate = fit.estimate(ModelParameters.YIELD_STRESS.name());
		boolean counted = fit.describes();
		String why = counted ? "" : String.format(Locale.ROOT, "misses the curve by %.0f %% (root mean square)", 100 * fit.rmsRelative());
		return new Source(fit.kind().id() + ", " + curve, estimate.value(), estimate.interval(), counted, why);
	}

	private static double or(double end, double value) {
		return Double.isNaN(end) ? value : end;
	}
}
