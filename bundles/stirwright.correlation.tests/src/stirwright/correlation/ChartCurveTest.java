package stirwright.correlation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ChartCurveTest {

    /** Through (1, 70), (10, 7) and (1000, 7): slope -1, then flat. */
    private static final ChartCurve CURVE = ChartCurve.through(1, 70, 10, 7, 1000, 7);

    @ParameterizedTest
    @CsvSource({"1, 70", "10, 7", "2, 35", "5, 14", "100, 7", "0.1, 700", "1e6, 7"})
    void isStraightOnLogAxesAndGoesOnBeyondItsEnds(double x, double y) {
        assertEquals(y, CURVE.at(x), 1e-12 * y);
    }

    @Test
    void scalesEveryPoint() {
        assertEquals(21, CURVE.scaled(1.5).at(10) * 2, 1e-12);
        assertEquals("through (1, 70), (10, 7), (1000, 7), both axes logarithmic", CURVE.toString());
    }

    @Test
    void refusesWhatIsNoCurve() {
        assertThrows(ContractException.class, () -> ChartCurve.through(1, 70));
        assertThrows(ContractException.class, () -> ChartCurve.through(1, 70, 2));
        assertThrows(ContractException.class, () -> ChartCurve.through(1, 70, 1, 60));
        assertThrows(ContractException.class, () -> ChartCurve.through(0, 70, 1, 60));
        assertThrows(ContractException.class, () -> ChartCurve.through(1, 70, 2, -1));
    }
}
