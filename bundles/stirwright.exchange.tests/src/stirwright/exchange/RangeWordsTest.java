package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Points beyond an instrument's range, and columns that hold something else; all tables are invented. */
class RangeWordsTest {

    private static CurveImport read(String text) {
        return CurveImport.of(CurveSource.clipboard(text), ImportChoice.DETECT);
    }

    @Test
    void aWordInTheTorqueOrTheViscosityDropsThePoint() {
        CurveImport read = read("Torque [%];Viscosity [cP];Shear rate [1/s];Shear stress [Pa]\n10;16000;1;16\n20;6000;3;18\n30;2300;10;23\n"
                + "40;EEEE;30;30\nEEEE;430;100;43\n50;-;300;64\n");
        assertEquals(List.of(5, 6), read.dropped().stream().map(d -> d.place().line()).toList());
        assertTrue(read.dropped().get(0).reason().contains("'EEEE'"), read.dropped().toString());
        assertEquals(4, read.requireCurves().get(0).points().size());
    }

    @Test
    void fourNinesMayBeMeasured() {
        String start = "Shear rate [1/s];Viscosity [mPa s]\n0.3;47756\n1;16000\n3;9999\n10;2327\n30;999.9\n";
        assertEquals(0, read(start).dropped().size());
        assertEquals(2, read(start + "100;9999\n").dropped().size(), "a number that comes again is the full scale");
        assertEquals(1, read(start + "100;99999\n").dropped().size());
    }

    @ParameterizedTest
    @CsvSource({"steady after overshoot,0", "unterbrochen,0", "understood,0", "max torque exceeded,1", "Torque overload,1", "over range,1",
        "\u00DCber Messbereich,1", "limit,1"})
    void statusWordsAreWholeWords(String word, int dropped) {
        assertEquals(dropped, read("rate;stress;status\n1;2;ok\n3;3;ok\n9;4;ok\n27;5;ok\n81;6;" + word + "\n").dropped().size());
    }

    @ParameterizedTest
    @ValueSource(strings = {"Fitted stress [Pa]", "Model stress [Pa]", "Elastic stress [Pa]", "Average stress [Pa]", "Shear stress HB [Pa]"})
    void otherStressesAreNotReadAndNamed(String name) {
        CurveImport read = read("Shear rate [1/s];" + name + ";Shear stress [Pa];Speed of sound\n1;5;2;1\n10;6;7;1\n100;7;20;1\n");
        assertArrayEquals(new double[] {2, 7, 20}, read.requireCurves().get(0).points().stresses());
        assertEquals(1, read.curves().size());
        assertTrue(read.report().toString().contains("not read: column 2 '" + name + "'"), read.report().toString());
    }

    @ParameterizedTest
    @ValueSource(strings = {"Specific viscosity", "Extensional viscosity [Pa s]"})
    void otherViscositiesAreNotRead(String name) {
        CurveImport read = read("Shear rate [1/s];" + name + ";Viscosity [Pa s]\n1;5;2\n10;6;0.7\n100;7;0.2\n");
        assertArrayEquals(new double[] {2, 7, 20}, read.requireCurves().get(0).points().stresses(), 1e-12);
    }

    @Test
    void whatASpreadsheetDoesNotShowIsNotRead() {
        Map<String, List<List<Object>>> sheets = new LinkedHashMap<>();
        sheets.put("Data", Books.sheet(InventedCurve.up()));
        sheets.put("old", Books.sheet(InventedCurve.up().stream().map(p -> p.times("5")).toList()));
        CurveImport read = Books.read(Xlsx.write(sheets, List.of("old"), List.of(4)));
        List<Double> shown = new ArrayList<>(InventedCurve.up().stream().map(p -> p.stress().doubleValue()).toList());
        shown.remove(2);
        assertArrayEquals(shown.stream().mapToDouble(d -> d).toArray(), read.requireCurves().get(0).points().stresses());
        assertEquals(1, read.curves().size());
        String said = read.messages().toString();
        assertTrue(said.contains("'old' is hidden") && said.contains("1 hidden row (the first is row 4)"), said);
    }
}
