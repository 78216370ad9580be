package stirwright.rheology.internal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Looks for the valleys of stress = first * f + second * rate^n over n. */
final class ExponentScan {

	private static final double STEP = 0.1;

	/** Makes coordinates of an exponent and its two terms; the rates were divided by exp(reference). */
	interface Coordinates {
		double[] of(double n, TwoTerms terms, double reference);
	}

	private record Place(double n, TwoTerms terms) {
	}

	private ExponentScan() {
	}

	/** The lowest place of each valley that has a second term, the lowest valley first. */
	static List<double[]> starts(Points points, double[] f, double lowest, double highest, Coordinates coordinates) {
		double reference = points.logRates()[points.size() / 2];
		List<Place> places = new ArrayList<>();
		double[] g = new double[points.size()];
		for (double n = lowest; n <= highest; n += STEP) {
			for (int i = 0; i < g.length; i++) {
				g[i] = Math.exp(n * (points.logRates()[i] - reference));
			}
			places.add(new Place(n, TwoTerms.of(points, f, g)));
		}
		List<Place> valleys = new ArrayList<>();
		for (int i = 0; i < places.size(); i++) {
			double here = residual(places, i);
			if (places.get(i).terms().second() > 0 && here <= residual(places, i - 1) && here <= residual(places, i + 1)) {
				valleys.add(places.get(i));
			}
		}
		return valleys.stream().sorted(Comparator.comparingDouble(p -> p.terms().residual()))
				.map(p -> coordinates.of(p.n(), p.terms(), reference)).toList();
	}

	private static double residual(List<Place> places, int i) {
		return i < 0 || i >= places.size() ? Double.POSITIVE_INFINITY : places.get(i).terms().residual();
	}
}
