package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.lang.management.ManagementFactory;
import java.util.Arrays;
import org.junit.jupiter.api.Test;
import stirwright.correlation.BoundCorrelation;
import stirwright.correlation.Correlation;
import stirwright.correlation.Quantity;
import stirwright.correlation.Variable;

class SliceTest {
    private static final BoundCorrelation INVERSE = laminar().bind(p -> 1);

    private static Correlation laminar() {
        return Invented.formula(Invented.anywhere(Quantity.POWER_NUMBER, "np.laminar", Variable.REYNOLDS).constant("a", 70),
                "{a}/Re", (g, k) -> {
                    double a = k.get("a");
                    return p -> a / p.reynolds();
                });
    }

    @Test
    void sweepsOneVariableAndHoldsTheOthers() {
        double[] into = new double[3];
        new Slice(INVERSE, new Point().set(Variable.FROUDE, 1), Variable.REYNOLDS)
                .evaluate(new double[] {1, 10, 100}, into);
        assertArrayEquals(new double[] {70, 7, 0.7}, into, 1e-15);
        assertThrows(IllegalArgumentException.class, () -> new Slice(INVERSE, new Point(), Variable.REYNOLDS)
                .evaluate(new double[2], new double[3]));
    }

    @Test
    void blocksAllocateNothingPerValue() {
        Slice slice = new Slice(INVERSE, new Point(), Variable.REYNOLDS);
        double[] values = new double[100_000];
        Arrays.setAll(values, i -> 1 + i);
        double[] into = new double[values.length];
        slice.evaluate(values, into);
        var threads = (com.sun.management.ThreadMXBean) ManagementFactory.getThreadMXBean();
        long before = threads.getThreadAllocatedBytes(Thread.currentThread().threadId());
        slice.evaluate(values, into);
        long used = threads.getThreadAllocatedBytes(Thread.currentThread().threadId()) - before;
        assertTrue(used < values.length, used + " bytes for " + values.length + " values");
    }
}
