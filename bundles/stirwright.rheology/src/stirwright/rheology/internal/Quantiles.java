package stirwright.rheology.internal;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

import org.apache.commons.math3.distribution.FDistribution;
import org.apache.commons.math3.distribution.TDistribution;

/** Quantiles for intervals of 95 %, each computed once. */
public final class Quantiles {

	private static final double CONFIDENCE = 0.95;

	private final Map<Integer, Double> single = new ConcurrentHashMap<>();
	private final Map<Long, Double> joint = new ConcurrentHashMap<>();

	/** How many standard errors to each side hold one parameter: Student's t. */
	public double single(int degreesOfFreedom) {
		return single.computeIfAbsent(degreesOfFreedom,
				d -> new TDistribution(null, d).inverseCumulativeProbability((1 + CONFIDENCE) / 2));
	}

	/** How many standard errors to each side hold so many parameters at once (Scheffé): the root of count times Fisher's F. */
	public double joint(int count, int degreesOfFreedom) {
		return joint.computeIfAbsent((long) count << 32 | degreesOfFreedom,
				k -> Math.sqrt(count * new FDistribution(null, count, degreesOfFreedom).inverseCumulativeProbability(CONFIDENCE)));
	}
}
