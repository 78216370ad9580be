package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Values worked out by hand; each must be met to the last digit. */
class TypedNumberTest {

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "impeller_diameter_m | 0.9 | 0.9", "impeller_diameter_m | 900 mm | 0.9", "impeller_diameter_m | 85mm | 0.085",
        "impeller_diameter_m | 35.4 in | 0.89916", "impeller_diameter_m | 3 ft | 0.9144", "impeller_diameter_m | 90 cm | 0.9",
        "impeller_diameter_m | 0,9 m | 0.9", "impeller_diameter_m | 0,900 | 0.9", "impeller_diameter_m | 1234,567 mm | 1.234567",
        "impeller_diameter_m | .9 m | 0.9", "impeller_diameter_m | +9e2 mm | 0.9", "impeller_diameter_m | 1.350 | 1.35",
        "impeller_diameter_m | 900 µm | 0.0009", "impeller_diameter_m | −2 | -2", "impeller_diameter_m | 0e999999999 mm | 0",
        "liquid_volume_m3 | 2 L | 0.002", "liquid_volume_m3 | 2500 l | 2.5", "liquid_volume_m3 | 1 m³ | 1",
        "liquid_volume_m3 | 240 US gal | 0.90849882816", "liquid_volume_m3 | 100 imp gal | 0.454609",
        "liquid_volume_m3 | 100 imp. gallons | 0.454609", "liquid_volume_m3 | 35 cm3 | 0.000035",
        "blade_angle_deg | 60 deg | 60", "blade_angle_deg | 45° | 45", "blade_angle_deg | 0.25 rev | 90",
        "speed_rpm | 85 rpm | 85", "speed_rpm | 85 1/min | 85", "speed_rpm | 85 min⁻¹ | 85", "speed_rpm | 1.5 rev/s | 90",
        "speed_rpm | 1.5 1/s | 90", "speed_rpm | 1.5 s^-1 | 90", "speed_rpm | 85 r/min | 85",
        "speed_rev_s | 90 rpm | 1.5", "speed_rev_s | 90 rev/min | 1.5", "speed_rev_s | 2 s-1 | 2",
        "target_shear_rate_1_s | 120 1/s | 120", "target_shear_rate_1_s | 120 s⁻¹ | 120", "target_shear_rate_1_s | 90 1/min | 1.5",
        "density_kg_m3 | 1.35 g/cm3 | 1350", "density_kg_m3 | 1,35 g/cm³ | 1350", "density_kg_m3 | 1.35 g·cm⁻³ | 1350",
        "density_kg_m3 | 1350 g/L | 1350", "density_kg_m3 | 1.35 kg/L | 1350", "density_kg_m3 | 1.35 t/m3 | 1350",
        "viscosity_Pa_s | 1350 mPa s | 1.35", "viscosity_Pa_s | 1350 mPa·s | 1.35", "viscosity_Pa_s | 1350 mPa.s | 1.35",
        "viscosity_Pa_s | 1350 mPas | 1.35", "viscosity_Pa_s | 12 cP | 0.012", "viscosity_Pa_s | 3 P | 0.3",
        "viscosity_Pa_s | 3 Pa*s | 3", "viscosity_Pa_s | 3 kg m-1 s-1 | 3", "viscosity_Pa_s | 3 N s/m2 | 3",
        "consistency_Pa_sn | 4.5 Pa s^n | 4.5", "consistency_Pa_sn | 4500 mPa s^n | 4.5", "consistency_Pa_sn | 4500 mPa·sⁿ | 4.5",
        "consistency_Pa_sn | 4.5 Pas^n | 4.5", "consistency_Pa_sn | 45 dyn s^n/cm2 | 4.5",
        "yield_stress_Pa | 4.5 dyn/cm2 | 0.45", "yield_stress_Pa | 2 kPa | 2000", "yield_stress_Pa | 4.5 N/m² | 4.5",
        "time_constant_s | 300 ms | 0.3", "time_constant_s | 2 min | 120",
        "target_power_per_volume_W_m3 | 0.8 kW/m3 | 800", "target_power_per_volume_W_m3 | 0.8 W/L | 800",
        "target_tip_speed_m_s | 600 ft/min | 3.048", "target_tip_speed_m_s | 4.5 m/s | 4.5", "target_tip_speed_m_s | 4.5 m.s-1 | 4.5",
        "shear_rate_constant | 11.5 per revolution | 11.5", "shear_rate_constant | 11.5 1/rev | 11.5",
        "power_number | 5 - | 5", "flow_index | 0.35 | 0.35", "baffle_count | 4 | 4"})
    void handComputed(String column, String typed, double expected) {
        assertEquals(expected, Typing.value(typed, Typing.field(column)), typed);
    }

    /** The first 17 digits of decimals worked out from pi = 3.14159265358979323846. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "speed_rev_s | 10 rad/s | 1.5915494309189534", // 5/pi
        "speed_rpm | 10 rad/s | 95.492965855137201", // 300/pi
        "blade_angle_deg | 0.5 rad | 28.647889756541160", // 90/pi
        "shear_rate_constant | 1 1/rad | 6.2831853071795865", // 2 pi
        "speed_rev_s | 85 rpm | 1.4166666666666667"}) // 17/12
    void neverExact(String column, String typed, double expected) {
        assertEquals(expected, Typing.value(typed, Typing.field(column)), typed);
    }

    @Test
    void tellsTheUnitAsTyped() {
        CaseField diameter = Typing.field("impeller_diameter_m");
        assertEquals(new TypedNumber.Value(0.9, "mm"), TypedNumber.read(" 900 mm\u00A0", diameter));
        assertEquals(new TypedNumber.Value(0.9, "m"), TypedNumber.read("0.9\u202Fm", diameter));
        assertEquals(new TypedNumber.Value(0.9, ""), TypedNumber.read("0.9", diameter));
    }

    @Test
    void blankIsNoProblem() {
        assertEquals(new TypedNumber.Blank(), TypedNumber.read("", CaseFields.DENSITY));
        assertEquals(new TypedNumber.Blank(), TypedNumber.read(" \u00A0\t", CaseFields.DENSITY));
    }

    @Test
    void whatAFieldShowsCanBeTyped() {
        Typing.fields().forEach(f -> assertEquals(new TypedNumber.Value(2.5, f.unit()), TypedNumber.read("2.5 " + f.unit(), f)));
    }

    /** The unit behind a field is read without the library; otherwise spelled it is read by the library. */
    @Test
    void theLibraryAgreesWithWhatAFieldShows() {
        Typing.fields().stream().filter(f -> !f.unit().equals("-")).forEach(f -> {
            String unit = f.unit().contains("/") ? f.unit().replace("/", " / ")
                    : f.unit().startsWith("per ") ? f.unit().replace(" ", "  ") : "m m-1 " + f.unit();
            assertEquals(2.5, Typing.value("2.5 " + unit, f), f.column());
        });
    }
}
