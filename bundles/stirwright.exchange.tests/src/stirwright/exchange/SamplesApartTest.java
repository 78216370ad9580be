package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import stirwright.exchange.InventedCurve.Point;

/** Curves are replicates, or of one sample, only where something says so; all tables are invented. */
class SamplesApartTest {
    private static final String HEADER = "Shear rate [1/s];Shear stress [Pa]\n";
    private static final String ONE = rows("", "1");
    private static final String TWO = rows("", "2");

    private static String rows(String before, String factor) {
        return InventedCurve.up().stream().map(p -> p.times(factor)).map(p -> before + p.rate() + ";" + p.stress() + "\n")
                .collect(Collectors.joining());
    }

    private static CurveImport read(String text) {
        return CurveImport.of(CurveSource.clipboard(text), ImportChoice.DETECT);
    }

    private static void assertSamples(String text, String... samples) {
        assertSamples(read(text), samples);
    }

    private static void assertSamples(CurveImport read, String... samples) {
        assertEquals(List.of(samples), read.requireCurves().stream().map(c -> c.measurement().sample() + " "
                + c.measurement().replicate()).toList(), () -> String.join("\n", read.report()));
        assertTrue(read.counts().addUp(), read.counts().words());
    }

    @Test
    void noNameIsNoSameName() {
        assertSamples(HEADER + ONE + HEADER + TWO, " 1", "table on line 15 1");
        assertSamples(HEADER + ONE + "\n" + TWO, " 1", "table on line 15 1");
        assertSamples(HEADER + ONE + TWO, " 1", " 2");
        assertSamples("invented report\n" + HEADER + ONE + HEADER + TWO, " 1", "table on line 16 1");
        assertSamples("Interval 1\n" + HEADER + ONE + "Interval 1\n" + HEADER + TWO, " 1", "table on line 17 1");
        assertSamples("Run 1\n" + HEADER + ONE + "Run 2\n" + HEADER + TWO, " 1", " 2");
    }

    @Test
    void aLineOfWordsIsAHead() {
        assertSamples(HEADER + "Mustard\n" + ONE + "Mayonnaise\n" + TWO, "Mustard 1", "Mayonnaise 1");
        assertSamples("Mustard\n" + HEADER + ONE + "\nMayonnaise\n" + HEADER + TWO, "Mustard 1", "Mayonnaise 1");
        CurveImport warm = read(HEADER + "20 \u00B0C;\n" + ONE + "40 \u00B0C;\n" + TWO);
        assertSamples(warm, " 1", " 1");
        assertEquals(List.of(20.0, 40.0), warm.curves().stream().map(c -> c.measurement().temperature()).toList());
        assertSamples(HEADER + ONE + "measured twice\n", " 1");
        assertSamples(HEADER + "0.05;0.1\n;spilled\n" + ONE, " 1");
    }

    @Test
    void aColumnThatNamesTheBlocks() {
        assertSamples("Formulation;" + HEADER + rows("F1;", "1") + rows("F2;", "2"), "F1 1", "F2 1");
        assertSamples("Concentration (%);" + HEADER + rows("0.5;", "1") + rows("1.0;", "2"), "Concentration (%) 0.5 1", "Concentration (%) 1.0 1");
        assertSamples("Target temp;" + HEADER + rows("20;", "1") + rows("40;", "2"), " 1", " 2");
        assertSamples("Cycle;" + HEADER + rows("1;", "1") + rows("2;", "2"), " 1", " 2");
    }

    @Test
    void aMergedCellHoldsForTheRowsBelow() {
        String merged = rows(";", "1").replaceFirst(";", "A;") + rows(";", "2").replaceFirst(";", "B;");
        assertSamples("Sample;" + HEADER + merged, "A 1", "B 1");
    }

    @Test
    void samplesThatTakeTurnsAreGathered() {
        StringBuilder turns = new StringBuilder("Sample;" + HEADER);
        for (Point p : InventedCurve.up()) {
            turns.append("A;" + p.rate() + ";" + p.stress() + "\nB;" + p.rate() + ";" + p.times("2").stress() + "\n");
        }
        CurveImport read = read(turns.toString());
        assertSamples(read, "A 1", "B 1");
        assertEquals(2 * read.curves().get(0).points().stress(3), read.curves().get(1).points().stress(3), 1e-9);
    }

    @Test
    void rampRunAndTemperatureInNamesAreNoSample() {
        assertSamples("Shear rate [1/s];Stress Run 1 [Pa];Stress Run 2 [Pa]\n" + beside(), " 1", " 2");
        CurveImport warm = read("Shear rate [1/s];Stress at 20 \u00B0C [Pa];Stress at 40 \u00B0C [Pa]\n" + beside());
        assertSamples(warm, " 1", " 1");
        assertEquals(List.of(20.0, 40.0), warm.curves().stream().map(c -> c.measurement().temperature()).toList());
        CurveImport numbers = read("Shear rate [1/s];Stress 1 [Pa];Stress 2 [Pa]\n" + beside());
        assertSamples(numbers, " 1", " 2");
        assertTrue(numbers.curves().get(0).measurement().warnings().toString().contains("taken for a replicate"), "a guess flags the curve");
        assertSamples("Sample Ketchup up\n" + HEADER + ONE + "Sample Ketchup down\n" + HEADER + TWO, "Sample Ketchup 1", "Sample Ketchup 2");
    }

    private static String beside() {
        return InventedCurve.up().stream().map(p -> p.rate() + ";" + p.stress() + ";" + p.times("2").stress() + "\n").collect(Collectors.joining());
    }

    @Test
    void sheetsAreSamplesUnlessTheirNamesSayOtherwise() {
        assertSamples(book("Mustard", "Mayonnaise"), "Mustard 1", "Mayonnaise 1");
        assertSamples(book("Run 1", "Run 2"), " 1", " 2");
        assertSamples(book("3C", "4C"), "3C 1", "4C 1");
        List<List<Object>> twice = new ArrayList<>(sheet("1"));
        twice.addAll(sheet("2"));
        assertSamples(Books.read(Xlsx.write(Map.of("Data", twice))), " 1", "table on line 15 1");
        CurveImport warm = book("20C", "40 C");
        assertSamples(warm, " 1", " 1");
        assertEquals(List.of(20.0, 40.0), warm.curves().stream().map(c -> c.measurement().temperature()).toList());
    }

    private static CurveImport book(String one, String two) {
        Map<String, List<List<Object>>> sheets = new LinkedHashMap<>();
        sheets.put(one, sheet("1"));
        sheets.put(two, sheet("2"));
        return Books.read(Xlsx.write(sheets));
    }

    private static List<List<Object>> sheet(String factor) {
        return Books.sheet(InventedCurve.up().stream().map(p -> p.times(factor)).toList());
    }

    @Test
    void theSamePointsTwiceAreNamed() {
        Map<String, List<List<Object>>> sheets = new LinkedHashMap<>();
        sheets.put("Run 1", sheet("1"));
        sheets.put("Run 2", sheet("1"));
        List<MeasuredCurve> curves = Books.read(Xlsx.write(sheets)).requireCurves();
        assertEquals(List.of(), curves.get(0).measurement().warnings());
        assertTrue(curves.get(1).measurement().warnings().toString().contains("its points are those of"), curves.toString());
    }
}
