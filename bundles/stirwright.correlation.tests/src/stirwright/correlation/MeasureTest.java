package stirwright.correlation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class MeasureTest {

    @Test
    void dimensionsAreMeasuredInTheUnitOfTheirColumn() {
        Geometry rightAngle = p -> Math.PI / 2;
        assertEquals(90, Measure.BLADE_ANGLE.value(rightAngle, null), 1e-12);
        assertEquals(Math.PI / 2, Measure.VESSEL_DIAMETER.value(rightAngle, null));
    }

    @Test
    void idsAndTitlesNameTheUnit() {
        assertEquals("blade_angle_deg: blade angle in degrees", words(Measure.BLADE_ANGLE));
        assertEquals("vessel_diameter_m: vessel diameter in m", words(Measure.VESSEL_DIAMETER));
        assertEquals("liquid_volume_m3: liquid volume in m3", words(Measure.of(Dimensions.LIQUID_VOLUME)));
        assertEquals("blade_count: blade count", words(Measure.BLADE_COUNT));
        assertNotEquals(Measure.of("blade_angle", "blade angle in rad", (g, p) -> 1), Measure.BLADE_ANGLE);
    }

    @Test
    void aMeasureThatIsAVariableNamesIt() {
        assertEquals(Optional.of(Variable.REYNOLDS), Measure.REYNOLDS.variable());
        assertEquals(Optional.of(Variable.FROUDE), Measure.of(Variable.FROUDE).variable());
        assertEquals(Optional.empty(), Measure.D_OVER_T.variable());
        assertEquals(Optional.empty(), Measure.of("reynolds_like", "2 Re", (g, p) -> 2 * p.reynolds()).byFactor().variable());
    }

    /** Beyond 100 to 1000 by a fifth and by a factor of 1.4, 1.6. */
    @ParameterizedTest
    @CsvSource({"80, NEAR", "1200, NEAR", "1400, NEAR", "1600, OUTSIDE", "62.5, OUTSIDE"})
    void byFactorReachesToOneAndAHalf(double found, Verdict expected) {
        Measure plain = Measure.of("any", "any", (g, p) -> 1);
        assertEquals(expected, plain.byFactor().verdict(found, 100, 1000));
        assertEquals(Verdict.OUTSIDE, plain.verdict(found, 100, 1000), "by a tenth it is outside");
    }

    @Test
    void aQuantitysPickIsAVariableOfItsName() {
        assertEquals("power_number", Variable.POWER_NUMBER.id());
        assertEquals(Variable.of("shear_rate_constant", "by another bundle", "k", "-"), Variable.SHEAR_RATE_CONSTANT);
        Variable own = Variable.of(Quantity.of("web-load", "web load", "Lw", "Pa"));
        assertEquals("web_load web load Lw Pa", String.join(" ", own.id(), own.title(), own.symbol(), own.unit()));
    }

    private static String words(Measure measure) {
        return measure.id() + ": " + measure.title();
    }
}
