package stirwright.chart.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NumbersTest {
    @ParameterizedTest
    @CsvSource({"0, 1", "1, 10", "2, 100", "3, 10³", "6, 10⁶", "12, 10¹²", "-1, 0.1", "-2, 0.01", "-3, 10⁻³", "-10, 10⁻¹⁰"})
    void writesDecades(int exponent, String words) {
        assertEquals(words, Numbers.decade(exponent));
    }

    @ParameterizedTest
    @CsvSource({"1.23456, 1.235", "1234.5678, 1235", "12345.678, 12350", "0.5, 0.5000", "99.999, 100.0", "123456, 1.235×10⁵",
        "0.00123456, 0.001235", "0.000123456, 1.235×10⁻⁴", "-2.5, −2.500", "0, 0", "NaN, none"})
    void readsFourDigits(double value, String words) {
        assertEquals(words, Numbers.reading(value));
    }

    @Test
    void ticksAreShortAndWithoutNoise() {
        assertEquals("0.3", Numbers.tick(3 * 0.1, 0.1));
        assertEquals("0", Numbers.tick(1e-17, 0.1));
        assertEquals("2×10⁶", Numbers.tick(2e6, 1e6));
        assertEquals("10⁶", Numbers.tick(1e6, 1e6));
        assertEquals("1500", Numbers.tick(1500, 500));
        assertEquals("−5", Numbers.tick(-5, 5));
    }
}
