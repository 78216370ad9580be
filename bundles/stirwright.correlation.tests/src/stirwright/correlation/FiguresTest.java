package stirwright.correlation;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FiguresTest {

    @ParameterizedTest
    @CsvSource({
        "0.33333333, 0.3333", "100, 100", "51850, 51850", "123456, 123500", "0, 0", "-0.5, -0.5",
        "1e6, 1e6", "12345678, 1.235e7", "0.00012, 0.00012", "0.00001234, 1.234e-5",
    })
    void showsFourSignificantDigits(double value, String expected) {
        assertEquals(expected, Figures.show(value));
    }

    @ParameterizedTest
    @CsvSource({"2.512, 2.512", "-0.195, -0.195", "8, 8", "896000, 896000", "1.69, 1.69", "0.1, 0.1"})
    void exactKeepsEveryDigitThatWasWritten(double value, String expected) {
        assertEquals(expected, Figures.exact(value));
    }

    @ParameterizedTest
    @CsvSource({"NaN, unknown", "Infinity, unbounded", "-Infinity, minus unbounded"})
    void saysWhatIsNoNumber(double value, String expected) {
        assertEquals(expected, Figures.show(value));
    }
}
