package stirwright.core;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.lang.management.ManagementFactory;
import java.util.Arrays;
import org.junit.jupiter.api.Test;
import stirwright.correlation.Correlation;
import stirwright.correlation.Effect;
import stirwright.correlation.Measure;
import stirwright.correlation.Quantity;
import stirwright.correlation.ReynoldsDefinition;
import stirwright.correlation.Transcription;
import stirwright.correlation.Variable;
import stirwright.correlation.Verdict;
import stirwright.rheology.PowerLaw;

/** What a chart draws is what the table says. */
class SliceTest {
    private static final Correlation KS = Invented.constant(Quantity.SHEAR_RATE_CONSTANT, "ks.ten", 10);

    private static Correlation laminar(ReynoldsDefinition definition) {
        return Invented.correlation(Quantity.POWER_NUMBER, "np.laminar").reynolds(definition)
                .range(Measure.REYNOLDS, 1, 100).overReynolds("a", 70).build();
    }

    private static final Correlation DOUBLE = Correlation.modifier(
                    "invented.np.double", Quantity.POWER_NUMBER, Effect.CLEARANCE, "twice")
            .families(Invented.FAMILY).cite(Invented.SOURCE).transcription(Transcription.FROM_MEMORY).value("f", 2).build();

    private static Slice slice(Correlation power) {
        return new CrossCheck(Invented.catalogue(KS, DOUBLE, power)).open(Invented.at(2, new PowerLaw(80, 0.5))).slice(
                Quantity.POWER_NUMBER, "invented.np.laminar", Variable.REYNOLDS);
    }

    @Test
    void holdsModifiersAndVerdictsOfTheTable() {
        double[] into = new double[5];
        Verdict[] verdicts = new Verdict[5];
        slice(laminar(ReynoldsDefinition.METZNER_OTTO)).evaluate(new double[] {0.1, 1, 10, 120, 1000}, into, verdicts);
        assertArrayEquals(new double[] {1400, 140, 14, 140.0 / 120, 0.14}, into, 1e-12);
        assertArrayEquals(new Verdict[] {Verdict.OUTSIDE, Verdict.INSIDE, Verdict.INSIDE, Verdict.NEAR, Verdict.OUTSIDE}, verdicts);
    }

    @Test
    void meetsTheTableAtThePick() {
        for (ReynoldsDefinition definition : new ReynoldsDefinition[] {ReynoldsDefinition.METZNER_OTTO, ReynoldsDefinition.POWER_LAW}) {
            Catalogue catalogue = Invented.catalogue(KS, DOUBLE, laminar(definition));
            CandidateResult row = new CrossCheck(catalogue).check(Invented.at(2, new PowerLaw(80, 0.5))).pick().orElseThrow();
            double[] into = new double[1];
            Verdict[] verdicts = new Verdict[1];
            slice(laminar(definition)).evaluate(new double[] {row.state().orElseThrow().reynolds()}, into, verdicts);
            assertEquals(row.powerNumber(), into[0], 1e-12 * row.powerNumber());
            assertEquals(row.verdict(), verdicts[0]);
        }
    }

    @Test
    void refusesWhatIsNotThere() {
        CrossCheck check = new CrossCheck(Invented.catalogue(KS, DOUBLE, laminar(ReynoldsDefinition.METZNER_OTTO)));
        assertThrows(CaseRefusedException.class, () -> check.open(
                Invented.at(2, new PowerLaw(80, 0.5))).slice(Quantity.POWER_NUMBER, "invented.np.none", Variable.REYNOLDS));
        assertThrows(IllegalArgumentException.class, () -> slice(laminar(ReynoldsDefinition.METZNER_OTTO))
                .evaluate(new double[2], new double[3], new Verdict[2]));
    }

    @Test
    void blocksAllocateNothingPerValue() {
        Slice slice = slice(laminar(ReynoldsDefinition.METZNER_OTTO));
        double[] values = new double[100_000];
        Arrays.setAll(values, i -> 1 + i);
        double[] into = new double[values.length];
        Verdict[] verdicts = new Verdict[values.length];
        slice.evaluate(values, into, verdicts);
        var threads = (com.sun.management.ThreadMXBean) ManagementFactory.getThreadMXBean();
        long before = threads.getThreadAllocatedBytes(Thread.currentThread().threadId());
        slice.evaluate(values, into, verdicts);
        long used = threads.getThreadAllocatedBytes(Thread.currentThread().threadId()) - before;
        assertTrue(used < values.length, used + " bytes for " + values.length + " values");
    }
}
