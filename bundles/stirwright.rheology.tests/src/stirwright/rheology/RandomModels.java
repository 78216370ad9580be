package stirwright.rheology;

import java.util.Random;
import java.util.function.Supplier;
import java.util.stream.Stream;

/** Models of every kind with parameters drawn over several decades; the same ones for the same seed. */
final class RandomModels {

	private final Random random;

	RandomModels(long seed) {
		this.random = new Random(seed);
	}

	/** Of each kind in turn, {@code count} models. */
	Stream<FluidModel> each(int count) {
		Stream<Supplier<FluidModel>> kinds = Stream.of(
				() -> new Newtonian(between(1e-3, 1e3)),
				() -> new PowerLaw(between(1e-2, 1e2), between(0.05, 2)),
				() -> new Bingham(between(1e-2, 1e3), between(1e-3, 1e1)),
				() -> new HerschelBulkley(between(1e-2, 1e3), between(1e-2, 1e2), between(0.05, 2)),
				() -> new Casson(between(1e-2, 1e3), between(1e-3, 1e1)),
				() -> new Sisko(between(1e-4, 1), between(1e-2, 1e2), between(0.05, 1)),
				() -> new Cross(between(1, 1e4), between(1e-4, 1), between(1e-4, 1e4), between(0.05, 1)),
				() -> new Carreau(between(1, 1e4), between(1e-4, 1), between(1e-4, 1e4), between(0.05, 1)));
		return kinds.flatMap(kind -> Stream.generate(kind).limit(count));
	}

	/** A value whose logarithm is evenly distributed. */
	double between(double low, double high) {
		return low * Math.pow(high / low, random.nextDouble());
	}

	/** A factor around 1, normally distributed. */
	double noise(double relativeDeviation) {
		return 1 + relativeDeviation * random.nextGaussian();
	}
}
