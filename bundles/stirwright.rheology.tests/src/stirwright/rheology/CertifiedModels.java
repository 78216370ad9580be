package stirwright.rheology;

import java.util.Arrays;
import java.util.Map;
import java.util.function.BiFunction;
import java.util.stream.IntStream;

import org.apache.commons.math3.analysis.differentiation.DerivativeStructure;

import stirwright.rheology.internal.LeastSquares;

/** The models of NIST's certified sets, as {@code nist-sets.csv} writes them, with exact derivatives. */
final class CertifiedModels {

	/** A model's value at x (one or two numbers) as a function of its parameters, the first being b[1]. */
	private interface Model extends BiFunction<DerivativeStructure[], double[], DerivativeStructure> {
	}

	private static final Model DECAY_OVER_LINE = (b, x) -> b[1].multiply(-x[0]).exp().divide(b[3].multiply(x[0]).add(b[2]));
	private static final Model THREE_DECAYS = (b, x) -> decay(b[1], b[2], x[0]).add(decay(b[3], b[4], x[0]))
			.add(decay(b[5], b[6], x[0]));
	private static final Model TWO_PEAKS = (b, x) -> decay(b[1], b[2], x[0]).add(peak(b[3], b[4], b[5], x[0]))
			.add(peak(b[6], b[7], b[8], x[0]));
	private static final Model CUBICS = (b, x) -> polynomial(x[0], b[1], b[2], b[3], b[4])
			.divide(polynomial(x[0], one(b), b[5], b[6], b[7]));
	private static final Model SATURATION = (b, x) -> b[1].multiply(decay(one(b), b[2], x[0]).negate().add(1));

	private static final Map<String, Model> MODELS = Map.ofEntries(
			Map.entry("Misra1a", SATURATION),
			Map.entry("BoxBOD", SATURATION),
			Map.entry("Misra1b", (b, x) -> b[1].multiply(b[2].multiply(x[0] / 2).add(1).pow(-2).negate().add(1))),
			Map.entry("Misra1c", (b, x) -> b[1].multiply(b[2].multiply(2 * x[0]).add(1).pow(-0.5).negate().add(1))),
			Map.entry("Misra1d", (b, x) -> b[1].multiply(b[2]).multiply(x[0]).divide(b[2].multiply(x[0]).add(1))),
			Map.entry("Chwirut1", DECAY_OVER_LINE),
			Map.entry("Chwirut2", DECAY_OVER_LINE),
			Map.entry("Lanczos1", THREE_DECAYS),
			Map.entry("Lanczos2", THREE_DECAYS),
			Map.entry("Lanczos3", THREE_DECAYS),
			Map.entry("Gauss1", TWO_PEAKS),
			Map.entry("Gauss2", TWO_PEAKS),
			Map.entry("Gauss3", TWO_PEAKS),
			Map.entry("DanWood", (b, x) -> b[1].multiply(b[2].multiply(Math.log(x[0])).exp())),
			Map.entry("Kirby2", (b, x) -> polynomial(x[0], b[1], b[2], b[3]).divide(polynomial(x[0], one(b), b[4], b[5]))),
			Map.entry("Hahn1", CUBICS),
			Map.entry("Thurber", CUBICS),
			Map.entry("Nelson", (b, x) -> b[1].subtract(decay(b[2], b[3], x[1]).multiply(x[0]))),
			Map.entry("MGH17", (b, x) -> b[1].add(decay(b[2], b[4], x[0])).add(decay(b[3], b[5], x[0]))),
			Map.entry("Roszman1", (b, x) -> b[1].subtract(b[2].multiply(x[0]))
					.subtract(b[3].divide(b[4].negate().add(x[0])).atan().divide(Math.PI))),
			Map.entry("ENSO", (b, x) -> b[1].add(b[2].multiply(Math.cos(2 * Math.PI * x[0] / 12)))
					.add(b[3].multiply(Math.sin(2 * Math.PI * x[0] / 12)))
					.add(wave(b[5], b[6], b[4], x[0])).add(wave(b[8], b[9], b[7], x[0]))),
			Map.entry("MGH09", (b, x) -> b[1].multiply(b[2].multiply(x[0]).add(x[0] * x[0]))
					.divide(b[3].multiply(x[0]).add(b[4]).add(x[0] * x[0]))),
			Map.entry("Rat42", (b, x) -> b[1].divide(b[2].subtract(b[3].multiply(x[0])).exp().add(1))),
			Map.entry("Rat43", (b, x) -> b[1].divide(b[2].subtract(b[3].multiply(x[0])).exp().add(1).log().divide(b[4]).exp())),
			Map.entry("MGH10", (b, x) -> b[1].multiply(b[2].divide(b[3].add(x[0])).exp())),
			Map.entry("Eckerle4", (b, x) -> b[1].divide(b[2])
					.multiply(b[3].negate().add(x[0]).divide(b[2]).pow(2).multiply(-0.5).exp())),
			Map.entry("Bennett5", (b, x) -> b[1].multiply(b[2].add(x[0]).log().divide(b[3]).negate().exp())));

	private CertifiedModels() {
	}

	private static DerivativeStructure one(DerivativeStructure[] b) {
		return new DerivativeStructure(b[1].getFreeParameters(), 1, 1);
	}

	private static DerivativeStructure decay(DerivativeStructure height, DerivativeStructure speed, double x) {
		return height.multiply(speed.multiply(-x).exp());
	}

	private static DerivativeStructure peak(DerivativeStructure height, DerivativeStructure at, DerivativeStructure width,
			double x) {
		return height.multiply(at.negate().add(x).divide(width).pow(2).negate().exp());
	}

	private static DerivativeStructure wave(DerivativeStructure cosine, DerivativeStructure sine, DerivativeStructure period,
			double x) {
		DerivativeStructure angle = period.reciprocal().multiply(2 * Math.PI * x);
		return cosine.multiply(angle.cos()).add(sine.multiply(angle.sin()));
	}

	private static DerivativeStructure polynomial(double x, DerivativeStructure... coefficients) {
		DerivativeStructure sum = coefficients[coefficients.length - 1];
		for (int i = coefficients.length - 2; i >= 0; i--) {
			sum = sum.multiply(x).add(coefficients[i]);
		}
		return sum;
	}

	/** @param points of each: y, then x; the least squares of Nelson are of the logarithm of y */
	static LeastSquares.Deviations deviations(String set, double[][] points) {
		Model model = MODELS.get(set);
		return new LeastSquares.Deviations() {
			@Override
			public int size() {
				return points.length;
			}

			@Override
			public void evaluate(double[] at, double[] deviations, double[][] jacobian) {
				DerivativeStructure[] b = IntStream.rangeClosed(0, at.length)
						.mapToObj(j -> j == 0 ? null : new DerivativeStructure(at.length, 1, j - 1, at[j - 1]))
						.toArray(DerivativeStructure[]::new);
				for (int i = 0; i < points.length; i++) {
					DerivativeStructure value = model.apply(b, Arrays.copyOfRange(points[i], 1, points[i].length));
					double y = set.equals("Nelson") ? Math.log(points[i][0]) : points[i][0];
					deviations[i] = value.getValue() - y;
					System.arraycopy(value.getAllDerivatives(), 1, jacobian[i], 0, at.length);
				}
			}
		};
	}
}
