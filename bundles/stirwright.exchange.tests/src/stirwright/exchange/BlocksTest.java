package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static stirwright.exchange.BlockUse.CONSTANT_RATE;
import static stirwright.exchange.BlockUse.DOWN;
import static stirwright.exchange.BlockUse.OTHER;
import static stirwright.exchange.BlockUse.PRE_SHEAR;
import static stirwright.exchange.BlockUse.UNORDERED;
import static stirwright.exchange.BlockUse.UP;

import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import stirwright.exchange.InventedCurve.Point;

/** Where one block ends and the next begins, and what each is. */
class BlocksTest {
    private static final String HEADER = "shear rate [1/s];shear stress [Pa]\n";
    private static final String UPWARDS = rows(InventedCurve.up());
    private static final String DOWNWARDS = rows(InventedCurve.down());

    private static CurveImport read(String text) {
        return CurveImport.of(CurveSource.clipboard(text), ImportChoice.DETECT);
    }

    private static String rows(List<Point> points) {
        return points.stream().map(p -> p.rate() + ";" + p.stress() + "\n").collect(Collectors.joining());
    }

    private static String hold(String rate, int points) {
        StringBuilder rows = new StringBuilder();
        for (int i = 0; i < points; i++) {
            rows.append(rate).append(';').append(60 - i).append(".5\n");
        }
        return rows.toString();
    }

    private static void assertBlocks(String rows, BlockUse... uses) {
        CurveImport read = read(HEADER + rows);
        assertEquals(List.of(uses), read.blocks().stream().map(CurveBlock::use).toList(), () -> String.join("\n", read.report()));
        assertEquals(read.blocks().stream().filter(b -> b.use().isCurve()).count(), read.curves().size());
        assertEquals(read.curves().size(), read.curves().stream().map(MeasuredCurve::label).distinct().count());
        assertTrue(read.counts().addUp());
    }

    @Test
    void turnsAndHolds() {
        assertBlocks(UPWARDS, UP);
        assertBlocks(UPWARDS + DOWNWARDS, UP, DOWN);
        assertBlocks(UPWARDS + DOWNWARDS + UPWARDS + DOWNWARDS, UP, DOWN, UP, DOWN);
        assertBlocks(UPWARDS + UPWARDS + UPWARDS, UP, UP, UP);
        assertBlocks(DOWNWARDS + DOWNWARDS, DOWN, DOWN);
        assertBlocks(hold("100", 12) + UPWARDS + hold("500", 9) + DOWNWARDS, PRE_SHEAR, UP, CONSTANT_RATE, DOWN);
        assertBlocks(hold("100", 12) + UPWARDS + DOWNWARDS + hold("100", 12) + UPWARDS + DOWNWARDS,
                PRE_SHEAR, UP, DOWN, PRE_SHEAR, UP, DOWN);
        assertBlocks(UPWARDS + DOWNWARDS + hold("1", 20), UP, DOWN, CONSTANT_RATE);
        assertBlocks(hold("100", 12) + hold("1", 12), OTHER);
    }

    @Test
    void strayPointsPartNothing() {
        assertBlocks("0.1;1\n0.3;2\n1;3\n3;4\n1000;5\n30;6\n100;7\n300;8\n", UP);
        assertBlocks("0.1;1\n0.3;2\n1;3\n0.5;4\n3;5\n10;6\n30;7\n", UP);
        assertBlocks("5;1\n0.1;2\n200;3\n1;4\n20;5\n0.5;6\n100;7\n2;8\n500;9\n10;10\n", UNORDERED);
    }

    /** 300 rates in a straight line, dense enough at the top to look like one rate. */
    @Test
    void denseRamps() {
        StringBuilder rows = new StringBuilder();
        for (int i = 1; i <= 300; i++) {
            rows.append(i + ";" + (10 + i) + "\n");
        }
        rows.append(hold("300", 20));
        for (int i = 300; i >= 1; i--) {
            rows.append(i + ";" + (9 + i) + "\n");
        }
        assertBlocks(rows.toString(), UP, CONSTANT_RATE, DOWN);
        // Each point at its rate for ten readings is a ramp, not a row of holds.
        assertBlocks(InventedCurve.up().stream().map(p -> (p.rate() + ";" + p.stress() + "\n").repeat(10)).collect(Collectors.joining()), UP);
    }

    @Test
    void samplesInAColumnOfTheirOwn() {
        CurveImport read = read("Sample;rate;stress\n" + ("A;" + UPWARDS.strip().replace("\n", "\nA;")) + "\nB;"
                + UPWARDS.strip().replace("\n", "\nB;") + "\n");
        assertEquals(List.of("clipboard A up", "clipboard B up"), read.requireCurves().stream().map(MeasuredCurve::label).toList());
        assertEquals(List.of(1, 1), read.curves().stream().map(c -> c.measurement().replicate()).toList());
    }

    /** Numbers go on behind a header that comes again; where they start again, so does a block. */
    @Test
    void repeatedHeaders() {
        String header = "Point;Rate;Stress\n;1/s;Pa\n";
        String[] lines = UPWARDS.split("\n");
        StringBuilder text = new StringBuilder(header);
        for (int i = 0; i < lines.length; i++) {
            text.append(i == 5 ? "\n" + header : "").append(i + 1).append(';').append(lines[i]).append('\n');
        }
        CurveImport once = read(text.toString());
        assertArrayEquals(InventedCurve.curve(InventedCurve.up()).stresses(), once.requireCurves().get(0).points().stresses());
        assertEquals(1, once.blocks().size());
        assertEquals(2, read(text + text.toString()).blocks().size());
    }

    @Test
    void numbersJoinedUnderNoName() {
        StringBuilder text = new StringBuilder(";rate;stress\n");
        int i = 0;
        for (Point p : InventedCurve.up()) {
            text.append(i < 6 ? "1-" : "2-").append(++i).append(';').append(p.rate()).append(';').append(p.stress()).append('\n');
        }
        CurveImport read = read(text.toString());
        assertEquals(List.of("segment 1", "segment 2"), read.blocks().stream().map(CurveBlock::name).toList());
    }

    @Test
    void headsOfSamplesAndIntervals() {
        CurveImport read = read("Sample: paste 20 \u00B0C\nInterval 1 pre-shear\n" + HEADER + UPWARDS + "Interval 2\n" + HEADER + UPWARDS
                + "Sample: cream 40 \u00B0C\nInterval 1\n" + HEADER + UPWARDS);
        assertEquals(List.of(PRE_SHEAR, UP, UP), read.blocks().stream().map(CurveBlock::use).toList());
        assertEquals(List.of(20.0, 40.0), read.curves().stream().map(c -> c.measurement().temperature()).toList());
        assertTrue(read.curves().get(1).label().contains("cream"), read.curves().get(1).label());
        assertTrue(read.blocks().get(0).reason().contains("name"), read.blocks().get(0).reason());
    }

    @Test
    void aPreShearIsNeverMergedAndNeverTaken() {
        StringBuilder text = new StringBuilder("shear rate [1/s];shear stress [Pa]\n");
        for (int i = 0; i < 12; i++) {
            text.append("100;").append(40 - i).append(".5\n");
        }
        InventedCurve.up().forEach(p -> text.append(p.rate() + ";" + p.stress() + "\n"));
        InventedCurve.down().forEach(p -> text.append(p.rate() + ";" + p.stress() + "\n"));
        CurveImport read = read(text.toString());
        assertEquals(List.of(BlockUse.PRE_SHEAR, BlockUse.UP, BlockUse.DOWN), read.blocks().stream().map(CurveBlock::use).toList());
        assertEquals(List.of(false, true, true), read.blocks().stream().map(CurveBlock::taken).toList());
        assertArrayEquals(InventedCurve.curve(InventedCurve.up()).stresses(), read.curves().get(0).points().stresses());
        assertArrayEquals(InventedCurve.curve(InventedCurve.down()).stresses(), read.curves().get(1).points().stresses());
        assertEquals(12, read.counts().left());
    }

    @Test
    void replicatesAreCountedAndTemperaturesKeptApart() {
        StringBuilder text = new StringBuilder("No;Rate [1/s];Stress [Pa];T [K]\n");
        for (String kelvin : List.of("293.15", "293.25", "313.15")) {
            int i = 0;
            for (Point p : InventedCurve.up()) {
                text.append(++i + ";" + p.rate() + ";" + p.stress() + ";" + kelvin + "\n");
            }
        }
        CurveImport read = read(text.toString());
        assertEquals(List.of(1, 2, 1), read.requireCurves().stream().map(c -> c.measurement().replicate()).toList());
        assertEquals(40, read.curves().get(2).measurement().temperature(), 1e-9);
        assertEquals(3, read.curves().stream().map(MeasuredCurve::label).distinct().count());
    }
}
