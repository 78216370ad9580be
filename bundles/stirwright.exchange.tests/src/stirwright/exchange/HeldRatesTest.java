package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static stirwright.exchange.BlockUse.CONSTANT_RATE;
import static stirwright.exchange.BlockUse.DOWN;
import static stirwright.exchange.BlockUse.OTHER;
import static stirwright.exchange.BlockUse.PRE_SHEAR;
import static stirwright.exchange.BlockUse.UP;

import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Rates that are held before a ramp, at its top and within it. */
class HeldRatesTest {
    private static final String HEADER = "Shear rate [1/s];Shear stress [Pa]\n";
    private static final String RISING = InventedCurve.up().stream().map(p -> p.rate() + ";" + p.stress() + "\n").collect(Collectors.joining());

    private static CurveImport read(String text, BlockUse... uses) {
        CurveImport read = CurveImport.of(CurveSource.clipboard(text), ImportChoice.DETECT);
        assertEquals(List.of(uses), read.blocks().stream().map(CurveBlock::use).toList(), () -> String.join("\n", read.report()));
        return read;
    }

    @ParameterizedTest
    @ValueSource(ints = {2, 3, 4, 5})
    void aFewPointsBeforeARampAreAPreShear(int points) {
        CurveImport read = read(HEADER + "50;80\n".repeat(points) + RISING, PRE_SHEAR, UP);
        assertArrayEquals(InventedCurve.curve(InventedCurve.up()).stresses(), read.curves().get(0).points().stresses());
        assertEquals(points, read.counts().left());
    }

    @Test
    void aRateReadTwiceAtItsStartBelongsToTheRamp() {
        read(HEADER + RISING.substring(0, RISING.indexOf('\n') + 1) + RISING, UP);
    }

    @Test
    void aPreShearByTheNameOfItsStep() {
        String steps = "Step;" + HEADER + "Pre-shear;10;46\nPre-shear;30;60\nPre-shear;60;74\nPre-shear;100;87\nPre-shear;300;110\n";
        read(steps + RISING.lines().map(l -> "Flow curve;" + l + "\n").collect(Collectors.joining()), PRE_SHEAR, UP);
        read("Flow curve after pre-shear\n" + HEADER + RISING, UP);
    }

    @Test
    void aHeadEndsAtTheNext() {
        String ramp = "5;50\n15;51\n25;52\n35;53\n45;54\n";
        read("Preshear;\n" + HEADER + ramp + "Flow;\n" + HEADER + RISING, PRE_SHEAR, UP);
    }

    @Test
    void theTopOfALoopBelongsToItsRamps() {
        CurveImport read = read(HEADER + "1;16\n3;18\n10;23\n30;30\n100;43\n300;64\n" + "300;62\n".repeat(8) + "300;54\n100;37\n30;26\n10;20\n3;16\n1;14\n",
                UP, CONSTANT_RATE, DOWN);
        assertArrayEquals(new double[] {16, 18, 23, 30, 43, 64}, read.curves().get(0).points().stresses());
        assertArrayEquals(new double[] {14, 16, 20, 26, 37, 54}, read.curves().get(1).points().stresses());
    }

    /** Near its top all rates of a dense loop are within 2 %, but none stands still. */
    @Test
    void aDenseLoopHasNoHold() {
        StringBuilder rows = new StringBuilder(HEADER);
        for (int i = 1; i < 600; i++) {
            double rate = i <= 300 ? i : 600 - i;
            rows.append(rate + ";" + (i <= 300 ? 10 + rate : 8 + rate) + "\n");
        }
        assertEquals(599, read(rows.toString(), UP, DOWN).counts().taken());
    }

    @Test
    void twoRatesInTurnAreNoFlowCurve() {
        read(HEADER + "0.5;20\n".repeat(10) + "100;30\n".repeat(10) + "0.5;20\n".repeat(20), OTHER);
    }

    @Test
    void temperaturesAreSplitAndNeverAveraged() {
        String header = "Temperature [\u00B0C];" + HEADER;
        StringBuilder turns = new StringBuilder(header);
        InventedCurve.up().forEach(p -> turns.append("20;" + p.rate() + ";" + p.stress() + "\n40;" + p.rate() + ";" + p.times("0.5").stress() + "\n"));
        assertTemperatures(read(turns.toString(), UP, UP), 20, 40);
        assertTemperatures(read(header + "20;0.1;13\n20.1;0.3;14\n20;1;16\n20;3;18\n60;10;15\n60;30;17\n60;100;20\n60;300;25\n", UP, UP), 20.025, 60);
    }

    private static void assertTemperatures(CurveImport read, double... celsius) {
        assertArrayEquals(celsius, read.curves().stream().mapToDouble(c -> c.measurement().temperature()).toArray(), 1e-9);
    }
}
