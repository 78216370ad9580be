package stirwright.rheology;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** What is doubtful about a fit, in sentences. The thresholds are our choice; no source, unless one is named. */
final class FitWarnings {

	private static final int FEW_POINTS = 6;
	private static final double MOST_FACTOR = 10;
	private static final double PLATEAU_REACHED = 0.9;
	private static final double HARDLY_APART = 0.99;
	private static final int ENOUGH_FOR_RUNS = 10;
	private static final int ENOUGH_FOR_ROBUST = 15;

	/** Of a standard normal variable; one in forty falls below by chance. */
	private static final double FEW_RUNS = -1.96;

	private FitWarnings() {
	}

	static boolean given(Estimate estimate) {
		if (!estimate.interval().known()) {
			return false;
		}
		String name = estimate.parameter().name();
		if (name.equals("flow_index")) {
			return !estimate.atLimit();
		}
		boolean mayBeZero = name.equals("yield_stress") || name.equals("infinite_shear_viscosity");
		return mayBeZero || estimate.interval().high() <= MOST_FACTOR * estimate.interval().low();
	}

	static boolean fewPoints(ModelFit fit) {
		return fit.points() < FEW_POINTS || fit.curve().window().max() < 10 * fit.curve().window().min();
	}

	static List<String> of(ModelFit fit) {
		List<String> warnings = new ArrayList<>();
		data(fit, warnings);
		limits(fit, warnings);
		plateaus(fit, warnings);
		correlations(fit, warnings);
		runs(fit, warnings);
		return List.copyOf(warnings);
	}

	private static void data(ModelFit fit, List<String> warnings) {
		MeasuredWindow window = fit.curve().window();
		if (fit.points() < FEW_POINTS) {
			warnings.add("only " + fit.points() + " points; at least " + FEW_POINTS + " are wanted");
		}
		if (window.max() < 10 * window.min()) {
			warnings.add("the shear rates span less than one decade");
		}
		if (fit.points() <= fit.estimates().size()) {
			warnings.add("as many parameters as points: no interval can be given");
		}
		if (!fit.describes()) {
			warnings.add(String.format(Locale.ROOT, "misses the points by %.0f %% (root mean square)", 100 * fit.rmsRelative()));
		}
		if (fit.options().robust() && fit.points() < ENOUGH_FOR_ROBUST) {
			warnings.add("robust intervals of fewer than " + ENOUGH_FOR_ROBUST + " points are too narrow");
		}
	}

	private static void limits(ModelFit fit, List<String> warnings) {
		List<String> notGiven = new ArrayList<>();
		for (Estimate estimate : fit.estimates()) {
			boolean index = estimate.parameter().name().equals("flow_index");
			if (estimate.parameter().name().equals("yield_stress") && estimate.interval().low() == 0) {
				warnings.add("the yield stress is not told apart from 0 by these points");
			} else if (estimate.parameter().name().equals("infinite_shear_viscosity") && estimate.interval().low() == 0) {
				warnings.add("no plateau at high shear rates is told apart from 0 by these points");
			} else if (index && estimate.atLimit()) {
				warnings.add("the flow index is at its limit: the points want it beyond what the model allows");
			} else if (fit.points() > fit.estimates().size() && !given(estimate)) {
				notGiven.add(estimate.parameter().title());
			}
		}
		if (!notGiven.isEmpty()) {
			warnings.add("not given by these points: " + String.join(", ", notGiven));
		}
	}

	private static void plateaus(ModelFit fit, List<String> warnings) {
		MeasuredWindow window = fit.curve().window();
		double[] p = ModelKind.values(fit.model());
		if (fit.kind() == ModelKind.CROSS || fit.kind() == ModelKind.CARREAU) {
			double share = (fit.model().apparentViscosity(window.min()) - p[1]) / (p[0] - p[1]);
			if (share < PLATEAU_REACHED) {
				warnings.add(String.format(Locale.ROOT,
						"the zero-shear plateau lies below the measured shear rates: at the lowest, %.0f %% of it are reached",
						100 * share));
			}
		}
	}

	private static void correlations(ModelFit fit, List<String> warnings) {
		for (int i = 0; i < fit.estimates().size(); i++) {
			for (int j = i + 1; j < fit.estimates().size(); j++) {
				double correlation = fit.correlation(i, j);
				if (Math.abs(correlation) > HARDLY_APART && fit.determined()) {
					warnings.add(String.format(Locale.ROOT, "%s and %s are hardly told apart (correlation %.3f)",
							fit.estimates().get(i).parameter().title(), fit.estimates().get(j).parameter().title(), correlation));
				}
			}
		}
	}

	/**
	 * Too few changes of sign along the curve: A. Wald and J. Wolfowitz, Annals of Mathematical Statistics 11 (1940) 147, in the
	 * normal approximation; citation from memory.
	 */
	private static void runs(ModelFit fit, List<String> warnings) {
		double[] residuals = fit.logResiduals();
		double above = 0;
		int runs = 1;
		for (int i = 0; i < residuals.length; i++) {
			above += residuals[i] > 0 ? 1 : 0;
			runs += i > 0 && residuals[i] > 0 != residuals[i - 1] > 0 ? 1 : 0;
		}
		double n = residuals.length;
		double both = 2 * above * (n - above);
		double expected = both / n + 1;
		double deviation = Math.sqrt(both * (both - n) / (n * n * (n - 1)));
		if (n >= ENOUGH_FOR_RUNS && (runs - expected) / deviation < FEW_RUNS && fit.rmsRelative() > 1e-6) {
			warnings.add("the residuals follow a trend (" + runs + " runs of one sign in " + residuals.length
					+ " points): the model misses something, and its intervals are too narrow");
		}
	}
}
