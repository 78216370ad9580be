package stirwright.conformance.internal;

import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import stirwright.correlation.GeometryParameter;

/** Values to try instead of the one at hand. */
final class Steps {
    private static final int PER_DECADE = 20;
    private static final int DECADES = 2;
    private static final int MOST_COUNT = 24;
    private static final int RIGHT_ANGLE = 90;
    private static final double WHERE_ZERO = 0.02;

    private Steps() {}

    static DoubleStream of(GeometryParameter.Kind kind, double value, double[] factors) {
        return switch (kind) {
            case COUNT -> IntStream.rangeClosed(0, MOST_COUNT).asDoubleStream();
            case ANGLE -> DoubleStream.concat(ofNumber(value, factors),
                    IntStream.rangeClosed(1, RIGHT_ANGLE).mapToDouble(Math::toRadians));
            case LENGTH, RATIO, VOLUME -> ofNumber(value, factors);
        };
    }

    /** Up to two decades either way, and the value times and over each factor. */
    static DoubleStream ofNumber(double value, double[] factors) {
        double base = value > 0 ? value : WHERE_ZERO;
        DoubleStream coarse = IntStream.rangeClosed(-DECADES * PER_DECADE, DECADES * PER_DECADE)
                .mapToDouble(k -> base * Math.pow(10, (double) k / PER_DECADE));
        DoubleStream aimed = DoubleStream.of(factors).flatMap(f -> DoubleStream.of(base * f, base / f));
        return DoubleStream.concat(aimed, coarse);
    }
}
