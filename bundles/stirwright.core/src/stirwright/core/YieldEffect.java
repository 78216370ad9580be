package stirwright.core;

/**
 * What hangs on a yield stress that is known between bounds alone. NaN where an end is unknown or means nothing.
 *
 * @param low       least yield stress, Pa
 * @param high      greatest yield stress, the static one included, Pa
 * @param powerLow  W: the pick's power with the least yield stress at the same speed, the model's other parameters as they
 *                  are; of the pick alone
 * @param powerHigh W: the same with the greatest
 */
public record YieldEffect(double low, double high, double powerLow, double powerHigh) {

    /** Nothing is known of the yield stress but what the model says. */
    public static final YieldEffect NONE = new YieldEffect(Double.NaN, Double.NaN, Double.NaN, Double.NaN);
}
