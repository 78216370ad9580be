package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigDecimal;
import java.math.MathContext;
import org.junit.jupiter.api.Test;

/** The factors against the definitions, worked out with decimals here and not by the units library. */
class UnitDefinitionsTest {
    /** International yard and pound agreement, 1959. */
    private static final BigDecimal INCH = new BigDecimal("0.0254");
    private static final BigDecimal FOOT = new BigDecimal("0.3048");
    private static final BigDecimal POUND = new BigDecimal("0.45359237");

    /** 3rd CGPM, 1901. */
    private static final BigDecimal STANDARD_GRAVITY = new BigDecimal("9.80665");

    private static void is(BigDecimal factor, String unit, String column) {
        assertEquals(factor.doubleValue(), Typing.value("1 " + unit, Typing.field(column)), unit);
    }

    private static void is(String factor, String unit, String column) {
        is(new BigDecimal(factor), unit, column);
    }

    private static BigDecimal over(BigDecimal above, BigDecimal below) {
        return above.divide(below, MathContext.DECIMAL128);
    }

    @Test
    void inchFootAndPound() {
        is(INCH, "in", "impeller_diameter_m");
        is(FOOT, "ft", "impeller_diameter_m");
        is(over(POUND, FOOT.pow(3)), "lb/ft3", "density_kg_m3");
        is(FOOT.pow(3), "ft3", "liquid_volume_m3");
        is(over(FOOT, new BigDecimal(60)), "ft/min", "target_tip_speed_m_s");
        is(over(POUND.multiply(STANDARD_GRAVITY), INCH.pow(2)), "psi", "yield_stress_Pa");
    }

    @Test
    void gallons() {
        is(INCH.pow(3).multiply(new BigDecimal(231)), "US gal", "liquid_volume_m3");
        is("0.00454609", "imp gal", "liquid_volume_m3");
    }

    @Test
    void centimetreGramSecond() {
        is("0.1", "P", "viscosity_Pa_s");
        is("0.001", "cP", "viscosity_Pa_s");
        is(new BigDecimal("1e-5").divide(new BigDecimal("1e-4")), "dyn/cm2", "yield_stress_Pa");
        is("1000", "g/cm3", "density_kg_m3");
    }

    @Test
    void besideTheSi() {
        is("0.001", "L", "liquid_volume_m3");
        is("60", "min", "time_constant_s");
        is("3600", "h", "time_constant_s");
        is("100000", "bar", "yield_stress_Pa");
        is("1000", "t/m3", "density_kg_m3");
        is("360", "rev", "blade_angle_deg");
    }

    @Test
    void prefixes() {
        is("0.1", "dm", "impeller_diameter_m");
        is("0.01", "cm", "impeller_diameter_m");
        is("0.001", "mm", "impeller_diameter_m");
        is("0.000001", "um", "impeller_diameter_m");
        is("0.1", "hL", "liquid_volume_m3");
        is("0.000001", "mL", "liquid_volume_m3");
        is("100", "hPa", "yield_stress_Pa");
        is("1000000", "MPa", "yield_stress_Pa");
        is("0.001", "mPa", "yield_stress_Pa");
        is("100", "mbar", "yield_stress_Pa");
        is("1000", "kN/m2", "yield_stress_Pa");
        is("0.001", "mN/m2", "yield_stress_Pa");
        is("1", "mg/mL", "density_kg_m3");
        is("0.001", "mW/m3", "target_power_per_volume_W_m3");
        is("1000000", "MW/m3", "target_power_per_volume_W_m3");
    }
}
