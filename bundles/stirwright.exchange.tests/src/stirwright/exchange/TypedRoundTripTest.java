package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What is shown reads back, for many numbers. */
class TypedRoundTripTest {
    private static final CaseField DIAMETER = Typing.field("impeller_diameter_m");
    private static final int MANY = 20_000;
    private static final long SEED = 20_240_501;

    /** Finite, of every size and sign, as likely as their bits. */
    private static double any(Random random) {
        double value = Double.longBitsToDouble(random.nextLong());
        return Double.isFinite(value) && value != 0 ? value : any(random);
    }

    @Test
    void everyNumberReadsBackAsItself() {
        Random random = new Random(SEED);
        for (int i = 0; i < MANY; i++) {
            double value = any(random);
            assertEquals(value, Typing.value(TypedNumber.show(value), DIAMETER));
        }
    }

    @Test
    void numbersOfEverydaySizeAreShownPlainAndNoShorterTextWouldDo() {
        Random random = new Random(SEED);
        for (int i = 0; i < MANY; i++) {
            double value = Math.pow(10, -4 + 11 * random.nextDouble());
            String shown = TypedNumber.show(value);
            assertTrue(shown.matches("\\d+(\\.\\d*[1-9])?"), shown);
            assertEquals(value, Typing.value(shown, DIAMETER));
            BigDecimal exact = new BigDecimal(shown);
            BigDecimal shorter = exact.round(new MathContext(Math.max(1, exact.precision() - 1)));
            assertFalse(exact.precision() > 1 && shorter.doubleValue() == value, shown);
        }
    }

    @Test
    void aDecimalCommaReadsAsADecimalPointOrIsRefused() {
        Random random = new Random(SEED);
        int refused = 0;
        for (int i = 0; i < MANY; i++) {
            BigDecimal number = BigDecimal.valueOf(random.nextInt(1, 2_000_000), random.nextInt(1, 6));
            String typed = number.toPlainString().replace('.', ',');
            boolean either = number.scale() == 3 && number.compareTo(BigDecimal.ONE) >= 0
                    && number.compareTo(new BigDecimal(1000)) < 0;
            if (either) {
                Typing.problem(typed, DIAMETER);
                refused++;
            } else {
                assertEquals(number.doubleValue(), Typing.value(typed, DIAMETER), typed);
            }
        }
        assertTrue(refused > MANY / 20, "refused " + refused);
    }

    /** Each unit with its factor as a decimal, so that the product is exact and is rounded once. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "impeller_diameter_m | mm | 0.001", "impeller_diameter_m | in | 0.0254", "impeller_diameter_m | ft | 0.3048",
        "density_kg_m3 | g/cm3 | 1000", "viscosity_Pa_s | cP | 0.001", "liquid_volume_m3 | US gal | 0.003785411784",
        "liquid_volume_m3 | imp gal | 0.00454609", "yield_stress_Pa | dyn/cm2 | 0.1", "speed_rpm | rev/s | 60"})
    void aConversionIsRoundedOnce(String column, String unit, BigDecimal factor) {
        Random random = new Random(SEED);
        for (int i = 0; i < 500; i++) {
            BigDecimal number = BigDecimal.valueOf(random.nextLong(1, 10_000_000_000L), random.nextInt(0, 9));
            String typed = number.toPlainString() + " " + unit;
            assertEquals(number.multiply(factor).doubleValue(), Typing.value(typed, Typing.field(column)), typed);
        }
    }

    @ParameterizedTest
    @CsvSource({"0.9, 0.9", "1350, 1350", "1e-4, 0.0001", "1e7, 10000000", "9.99e-5, 9.99e-5", "12345678.5, 1.23456785e7",
        "100, 100", "-0.085, -0.085", "0, 0", "-0.0, 0", "4.9e-324, 4.9e-324", "0.30000000000000004, 0.30000000000000004"})
    void shown(double value, String text) {
        assertEquals(text, TypedNumber.show(value));
    }

    @Test
    void whatWasNotGivenIsBlank() {
        assertEquals(new TypedNumber.Blank(), TypedNumber.read(TypedNumber.show(Double.NaN), DIAMETER));
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void noFieldShowsWhatItCannotRead(double value) {
        assertThrows(IllegalArgumentException.class, () -> TypedNumber.show(value));
    }
}
