package stirwright.rheology.internal;

/**
 * Where the sum of squares reaches a threshold as one coordinate is moved and all others follow: the ends of a profile
 * interval (D. M. Bates and D. G. Watts, Nonlinear Regression Analysis and Its Applications (1988), section 6.1; citation
 * from memory). It does not depend on how the model is written, and it stays valid at a bound.
 */
public final class Profile {

	/** Of the distance from the best place, relative. */
	private static final double TOLERANCE = 2e-3;
	private static final int MOST_STEPS = 40;

	/** A coordinate that went this many first steps without an end has none. */
	private static final double FARTHEST = 1e4;

	private final Search search;
	private final Search.Place best;
	private final double[][] covariance;
	private final double unit;
	private Search.Place lower;

	/**
	 * @param covariance of all coordinates, held ones included; NaN where it is not known
	 * @param unit       the mean square deviation that one standard error of distance adds to the sum
	 */
	public Profile(Search search, Search.Place best, double[][] covariance, double unit) {
		this.search = search;
		this.best = best;
		this.covariance = covariance;
		this.unit = unit;
	}

	/** A place below the one that was called the best, if the walk came across it; else null. */
	public Search.Place lowerPlace() {
		return lower;
	}

	/**
	 * @param j     coordinate
	 * @param side  -1 for the lower end, 1 for the upper one
	 * @param level how many standard errors away the end is, in a model that is a straight line
	 * @return a coordinate; the bound where the threshold is not reached before it; infinite where it is never reached
	 */
	public double end(int j, int side, double level) {
		double bound = side < 0 ? search.lower(j) : search.upper(j);
		double centre = best.at()[j];
		if (centre == bound) {
			return bound;
		}
		double error = Math.sqrt(covariance[j][j]);
		double step = error > 0 ? level * error : 0.1 * Math.max(Math.abs(centre), 1);
		double near = 0;
		double nearHeight = 0;
		double far = Double.NaN;
		double farHeight = Double.NaN;
		double reach = step;
		double[] follow = best.at();
		for (int i = 0; i < MOST_STEPS; i++) {
			boolean atBound = side < 0 ? centre - reach <= bound : centre + reach >= bound;
			double distance = atBound ? Math.abs(bound - centre) : reach;
			Search.Place there = search.from(moved(follow, j, centre + side * distance, atBound ? bound : Double.NaN), j);
			if (there.sum() < best.sum() * (1 - 1e-9)) {
				lower = there;
				return Double.NaN;
			}
			double height = Math.sqrt(Math.max(0, there.sum() - best.sum()) / unit);
			if (Math.abs(height - level) <= TOLERANCE * level) {
				return centre + side * distance;
			}
			if (height < level) {
				if (atBound) {
					return bound;
				}
				if (distance > FARTHEST * step) {
					return side * Double.POSITIVE_INFINITY;
				}
				near = distance;
				nearHeight = height;
				// Only from here: beyond the end the others may have gone to where nothing leads back.
				follow = there.at();
			} else {
				far = distance;
				farHeight = height;
			}
			double bent = i == 0 && error > 0 ? bent(distance, height, error, level) : Double.NaN;
			reach = bent > near && !(bent >= far) ? bent : next(near, nearHeight, far, farHeight, level);
		}
		return Double.isNaN(far) ? side * Double.POSITIVE_INFINITY : centre + side * (near + far) / 2;
	}

	/** Where the parabola through the first place, with the slope of the linearised model where it starts, reaches the level. */
	private static double bent(double distance, double height, double error, double level) {
		double slope = 1 / error;
		double bend = (height - slope * distance) / (distance * distance);
		return 2 * level / (slope + Math.sqrt(slope * slope + 4 * bend * level));
	}

	/** On the straight line between what is too near and what is too far; without the latter, farther. */
	private static double next(double near, double nearHeight, double far, double farHeight, double level) {
		if (Double.isNaN(far)) {
			double straight = near * level / nearHeight;
			return Math.min(Math.max(straight, 1.05 * near), 4 * near);
		}
		double share = (level - nearHeight) / (farHeight - nearHeight);
		return near + (far - near) * Math.min(Math.max(share, 0.05), 0.95);
	}

	/** The others start where the straight model would have them, if they are known to it, else where they were. */
	private double[] moved(double[] from, int j, double to, double exactly) {
		double[] start = from.clone();
		double distance = to - from[j];
		for (int k = 0; k < start.length; k++) {
			double along = distance * covariance[j][k] / covariance[j][j];
			double place = start[k] + along;
			if (k != j && Double.isFinite(place)) {
				start[k] = Math.min(Math.max(place, search.lower(k)), search.upper(k));
			}
		}
		start[j] = Double.isNaN(exactly) ? to : exactly;
		return start;
	}
}
