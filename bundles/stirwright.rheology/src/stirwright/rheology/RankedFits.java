package stirwright.rheology;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;

import stirwright.rheology.internal.Huber;
import stirwright.rheology.internal.Points;
import stirwright.rheology.internal.Quantiles;

/**
 * Every model fitted to one curve, in the order in which to consider them: first those whose parameters are all given by the
 * points, then the others; within each by Akaike's criterion, but of the models as well supported as the first the simplest
 * leads.
 *
 * @param curve    the measured points
 * @param options  how the models were fitted
 * @param attempts every kind of model, best first, those without a fit last
 */
public record RankedFits(FlowCurve curve, FitOptions options, List<Attempt> attempts) {

	/** A difference in the criterion from which on the better model has clear support, and essentially all: by the same source. */
	private static final double SOME = 2;
	private static final double ALL = 10;

	/** From so many points on it is worth its while to fit several models at the same time. */
	private static final int MANY = 2000;

	public RankedFits {
		attempts = List.copyOf(attempts);
	}

	/**
	 * A model and how it did.
	 *
	 * @param kind      of the model
	 * @param fit       empty when the model does not describe the curve
	 * @param rank      from 1; 0 without a fit
	 * @param deltaAicc by how much its criterion exceeds the least of all; NaN without one
	 * @param notes     what is doubtful, or why there is no fit
	 */
	public record Attempt(ModelKind kind, Optional<ModelFit> fit, int rank, double deltaAicc, List<String> notes) {
	}

	/** Fits every model. A robust fit finds out once, by the model with the least scatter, how much each point counts. */
	public static RankedFits of(FlowCurve curve, FitOptions options) {
		Points points = Fits.points(curve, options.objective());
		if (options.robust()) {
			points = robust(curve, options, points);
		}
		Quantiles quantiles = new Quantiles();
		Points weighted = points;
		Stream<ModelKind> kinds = Arrays.stream(ModelKind.values());
		return new RankedFits(curve, options, ranked((curve.size() > MANY ? kinds.parallel() : kinds)
				.map(kind -> attempt(kind, curve, options, weighted, quantiles)).toList()));
	}

	private static Points robust(FlowCurve curve, FitOptions options, Points points) {
		Huber least = null;
		for (ModelKind kind : ModelKind.values()) {
			if (curve.differentShearRates() > kind.parameters().size()) {
				Huber huber = Fits.robust(kind, points, options);
				least = huber != null && (least == null || huber.scatter() < least.scatter()) ? huber : least;
			}
		}
		return least == null ? points : points.with(least.factors());
	}

	private static Attempt attempt(ModelKind kind, FlowCurve curve, FitOptions options, Points points, Quantiles quantiles) {
		try {
			ModelFit fit = Fits.one(kind, curve, options, points, quantiles);
			return new Attempt(kind, Optional.of(fit), 0, Double.NaN, fit.warnings());
		} catch (ParameterException beyond) {
			return none(kind, "does not describe this curve: the best " + beyond.getMessage());
		} catch (IllegalArgumentException tooFew) {
			return none(kind, tooFew.getMessage());
		}
	}

	private static Attempt none(ModelKind kind, String why) {
		return new Attempt(kind, Optional.empty(), 0, Double.NaN, List.of(why));
	}

	private static List<Attempt> ranked(List<Attempt> attempts) {
		double least = attempts.stream().flatMap(a -> a.fit().stream()).mapToDouble(ModelFit::aicc)
				.filter(Double::isFinite).min().orElse(Double.NaN);
		List<Attempt> order = attempts.stream().sorted(Comparator
				.comparing((Attempt a) -> a.fit().isEmpty())
				.thenComparing(a -> a.fit().isPresent() && !a.fit().get().determined())
				// Double.compare puts NaN, for want of points, behind every number.
				.thenComparingDouble(a -> a.fit().map(ModelFit::aicc).orElse(Double.NaN))
				.thenComparingInt(a -> a.kind().parameters().size())
				.thenComparingDouble(a -> a.fit().map(ModelFit::rmsRelative).orElse(Double.NaN)))
				.collect(Collectors.toCollection(ArrayList::new));
		simplestFirst(order);
		List<Attempt> ranked = new ArrayList<>();
		for (Attempt attempt : order) {
			double delta = attempt.fit().map(f -> f.aicc() - least).orElse(Double.NaN);
			ranked.add(new Attempt(attempt.kind(), attempt.fit(), attempt.fit().isPresent() ? ranked.size() + 1 : 0, delta,
					attempt.notes()));
		}
		return ranked;
	}

	/** Of those as well supported as the first, the one with the fewest parameters goes to the front. */
	private static void simplestFirst(List<Attempt> order) {
		Attempt first = order.get(0);
		if (first.fit().isEmpty()) {
			return;
		}
		ModelFit lowest = first.fit().get();
		order.stream().filter(a -> a.fit().filter(f -> f.determined() == lowest.determined()
						&& f.aicc() - lowest.aicc() <= SOME).isPresent())
				.min(Comparator.comparingInt((Attempt a) -> a.kind().parameters().size())
						.thenComparingDouble(a -> a.fit().get().aicc()))
				.filter(simplest -> simplest.kind().parameters().size() < first.kind().parameters().size())
				.ifPresent(simplest -> {
					order.remove(simplest);
					order.add(0, simplest);
				});
	}

	/** The fit to take when nothing speaks for another; empty when no model describes the curve. */
	public Optional<ModelFit> recommended() {
		return attempts.get(0).fit();
	}

	/** The attempt with a model of that kind. */
	public Attempt attempt(ModelKind kind) {
		return attempts.stream().filter(a -> a.kind() == kind).findFirst().orElseThrow();
	}

	/** Why the recommended model is, in one sentence; what to do when there is none. */
	public String reason() {
		if (recommended().isEmpty()) {
			return "no model describes this curve; look at its points";
		}
		Attempt first = attempts.get(0);
		List<Attempt> rest = attempts.stream().skip(1).filter(a -> a.fit().isPresent()).toList();
		String name = first.kind().id();
		if (Double.isNaN(first.deltaAicc())) {
			return name + ": too few points for Akaike's criterion, so the fewest parameters";
		}
		String doubt = first.fit().get().determined() ? "" : ", though these points do not give all of its parameters";
		Optional<Attempt> better = rest.stream().filter(a -> a.deltaAicc() < first.deltaAicc()).findFirst();
		if (better.isPresent()) {
			double higher = first.deltaAicc() - better.get().deltaAicc();
			return higher <= SOME && better.get().fit().get().determined() == first.fit().get().determined()
					? String.format(Locale.ROOT, "%s: as well supported as %s (AICc %.1f higher), with fewer parameters%s",
							name, better.get().kind().id(), higher, doubt)
					: String.format(Locale.ROOT, "%s: the lowest criterion (AICc) of the models whose parameters these points give;"
							+ " %s is %.1f lower, but its parameters are not given", name, better.get().kind().id(), higher);
		}
		return rest.stream().filter(a -> !Double.isNaN(a.deltaAicc())).findFirst()
				.map(next -> String.format(Locale.ROOT, "%s: the lowest criterion (AICc)%s; the next, %s, is %.1f higher: %s",
						name, doubt, next.kind().id(), next.deltaAicc(), meaning(next.deltaAicc())))
				.orElse(name + ": the only model with a criterion" + doubt);
	}

	/** What a difference in the criterion means in words; Burnham and Anderson (2002), section 2.6, from memory. */
	public static String meaning(double deltaAicc) {
		return deltaAicc <= SOME ? "as well supported" : deltaAicc < ALL ? "less supported" : "essentially no support";
	}
}
