package stirwright.general;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The constant of two cylinders against its closed forms and limits; a is ln (T/De)^2. */
class CouetteAnalogyTest {

    /** Np Re^(power law) over pi^2 (De/D)^2 h/D, as the exact flow gives it. */
    private static double power(double a, double n) {
        return Math.pow(4 * Math.PI / (n * (1 - Math.exp(-a / n))), n);
    }

    @ParameterizedTest
    @CsvSource({"0.3, 0.2", "0.3, 0.5", "0.3, 1.8", "1.4, 0.2", "1.4, 0.7", "1.4, 1.5", "6, 0.5", "6, 2"})
    void isTheConstantThatMakesTheTwoPowersAgree(double a, double n) {
        assertEquals(Math.pow(power(a, n) / power(a, 1), 1 / (n - 1)), CouetteAnalogy.constant(a, n), 1e-12 * 40);
    }

    /** ln ks is smooth at n = 1: the mean of both sides differs from it by the square of the distance alone. */
    @ParameterizedTest
    @ValueSource(doubles = {1e-2, 1e-3, 1e-5, 1e-8, 1e-12})
    void approachesTheNewtonianLimitWithoutLossOfDigits(double e) {
        for (double a : new double[] {0.01, 0.3, 1.4, 6}) {
            double limit = Math.log(CouetteAnalogy.constant(a, 1));
            double above = Math.log(CouetteAnalogy.constant(a, 1 + e)) - limit;
            double below = Math.log(CouetteAnalogy.constant(a, 1 - e)) - limit;
            assertEquals(0, (above + below) / 2, e * e + 2e-15, () -> "a " + a);
            assertTrue(Math.abs(above) <= e + 2e-15, () -> "a " + a);
        }
    }

    /** A gap much narrower than the radius is sheared evenly: rate = pi N De/gap, gap/De = a/4. */
    @ParameterizedTest
    @ValueSource(doubles = {0.2, 0.9, 1, 1.1, 2})
    void isTheEvenShearOfANarrowGapWhateverTheFluid(double n) {
        double a = 1e-6;
        assertEquals(1, CouetteAnalogy.constant(a, n) * a / (4 * Math.PI), 2e-6);
    }

    /** Without a wall Np Re^(power law) goes with (4 pi/n)^n, so ks is 4 pi n^(n/(1-n)): 2 pi at n 1/2, pi at 2, 4 pi/e at 1. */
    @Test
    void hasTheClosedFormsOfACylinderWithoutAWall() {
        assertEquals(2 * Math.PI, CouetteAnalogy.constant(60, 0.5), 1e-12);
        assertEquals(4 * Math.PI / Math.E, CouetteAnalogy.constant(60, 1), 1e-12);
        assertEquals(Math.PI, CouetteAnalogy.constant(60, 2), 1e-11);
    }

    @Test
    void fallsWithTheFlowIndexAndWithTheGap() {
        for (double a = 0.05; a < 8; a *= 1.3) {
            for (double n = 0.1; n < 2; n += 0.05) {
                double here = CouetteAnalogy.constant(a, n);
                assertTrue(CouetteAnalogy.constant(a, n + 0.05) < here, "a " + a + " n " + n);
                assertTrue(CouetteAnalogy.constant(1.3 * a, n) < here, "a " + a + " n " + n);
            }
        }
    }
}
