package stirwright.general;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class CalderbankMooYoungTest {

    @Test
    void isTheLimitAtOne() {
        assertEquals(Math.exp(-0.25), CalderbankMooYoung.factor(1), 0);
    }

    /**
     * Around n = 1 the series of ln(factor) by hand, e = 1 - n: n ln(1 - e/(4 - 3 e))/e = -1/4 - e/32
     * + ..., so the difference from the limit shrinks with e and no digits are lost.
     */
    @ParameterizedTest
    @ValueSource(doubles = {1e-3, 1e-5, 1e-8, 1e-12, -1e-3, -1e-5, -1e-8, -1e-12})
    void approachesTheLimitWithoutLossOfDigits(double e) {
        assertEquals(-0.25 + e / 32, Math.log(CalderbankMooYoung.factor(1 - e)), 0.1 * e * e + 1e-15);
    }

    /** (4n/(3n+1))^(n/(1-n)) in closed form: n = 1/2 gives 4/5, n = 2 gives (8/7)^-2. */
    @Test
    void hasTheClosedFormsOnBothSides() {
        assertEquals(4.0 / 5, CalderbankMooYoung.factor(0.5), 1e-15);
        assertEquals(49.0 / 64, CalderbankMooYoung.factor(2), 1e-15);
    }
}
