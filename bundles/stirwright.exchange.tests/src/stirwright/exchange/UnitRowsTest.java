package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import stirwright.rheology.FlowCurve;

/** Units that change within a table, in a row further down or in a column of their own. Invented tables. */
class UnitRowsTest {

    private static CurveImport read(String text) {
        CurveImport read = CurveImport.of(CurveSource.clipboard(text), ImportChoice.DETECT);
        assertTrue(read.counts().addUp(), read.counts().words());
        return read;
    }

    private static double[] stresses(CurveImport read) {
        read.requireCurves();
        return read.curves().stream().map(MeasuredCurve::points).map(FlowCurve::stresses).flatMapToDouble(Arrays::stream).toArray();
    }

    @Test
    void aRowOfUnitsFurtherDownHoldsForWhatFollows() {
        String top = "Shear rate;Viscosity\n1/s;mPas\n1;2000\n2;1500\n4;1000\n";
        CurveImport read = read(top + "1/s;Pas\n10;0.5\n20;0.4\n40;0.3\n");
        assertArrayEquals(new double[] {2, 3, 4, 5, 8, 12}, stresses(read), 1e-12);
        assertEquals(List.of(), read.dropped());
        // A cell that is blank there goes on as before.
        assertArrayEquals(new double[] {2 / 60.0, 3 / 60.0, 4 / 60.0, 5 / 60.0, 8 / 60.0, 12 / 60.0},
                stresses(read(top.replace("1/s", "1/min") + ";Pas\n10;0.5\n20;0.4\n40;0.3\n")), 1e-12);
        assertArrayEquals(new double[] {2, 3, 4}, stresses(read(top + "1/s;mPas\n")), 1e-12);
        // Nor does a second such row bring back what the header says.
        assertArrayEquals(new double[] {2 / 60.0, 3 / 60.0, 4 / 60.0, 5 / 60.0, 8 / 60.0, 12 / 60.0, 20 / 60.0, 30 / 60.0, 40 / 60.0},
                stresses(read(top.replace("1/s", "1/min") + ";Pas\n10;0.5\n20;0.4\n40;0.3\n;mPas\n50;400\n100;300\n200;200\n")), 1e-12);
    }

    @Test
    void aRowWithAUnitThatIsNotKnownIsAProblemOfWhatFollows() {
        CurveImport read = read("Shear rate;Viscosity\n1/s;mPas\n1;2000\n2;1500\n4;1000\n1/s;furlongs\n10;0.5\n20;0.4\n40;0.3\n");
        assertArrayEquals(new double[] {2, 3, 4}, stresses(read), 1e-12);
        assertTrue(read.messages().toString().contains("'furlongs' is not known for a viscosity"), read.messages().toString());
        assertTrue(read.messages().stream().anyMatch(m -> m.weight() == ImportMessage.Weight.PROBLEM));
    }

    @Test
    void aColumnOfUnitsIsReadWhenAllAreEqual() {
        String header = "Shear rate;unit;Viscosity;unit\n";
        assertArrayEquals(new double[] {2, 3, 4}, stresses(read(header + "1;1/s;2000;mPas\n2;1/s;1500;mPas\n4;1/s;1000;mPas\n")), 1e-12);
        assertArrayEquals(new double[] {2, 3, 4}, stresses(read(header + "1;1/s;2;Pas\n2;1/s;1.5;Pas\n4;1/s;1;Pas\n")), 1e-12);
    }

    @Test
    void aColumnOfUnitsThatDifferIsAProblem() {
        assertProblem("Shear rate;unit;Viscosity;unit\n1;1/s;2000;mPas\n2;1/s;1500;mPas\n4;1/s;1;Pas\n", "line 4", "'Pas'", "mPa s");
        assertProblem("Shear rate;Viscosity [Pa s];unit\n1;2000;mPas\n2;1500;mPas\n4;1000;mPas\n", "line 2", "'mPas'", "Pa s");
    }

    private static void assertProblem(String text, String... words) {
        CurveImport read = read(text);
        assertEquals(List.of(), read.curves());
        String problems = read.messages().stream().filter(m -> m.weight() == ImportMessage.Weight.PROBLEM).toList().toString();
        for (String word : words) {
            assertTrue(problems.contains(word), problems);
        }
    }
}
