package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What is not taken, and in which words. */
class TypedProblemsTest {
    private static final String LENGTHS = "a length is expected: m, mm, cm, in, ft";
    private static final String ROTATIONS = "a speed of rotation is expected: rev/min, rpm, 1/min, rev/s, 1/s, rad/s";
    private static final String EACH = "; write the one that you mean";
    private static final String ONE_NUMBER =
            "has a thousands separator or more than one number; write digits and one decimal sign only, for instance 0.9 or 900 mm";

    private static void says(String expected, String typed, String column) {
        CaseField field = Typing.field(column);
        assertEquals(field.title() + ": '" + typed + "' " + expected, Typing.problem(typed, field));
    }

    @ParameterizedTest
    @ValueSource(strings = {"abc", "m", ".", ",", "-", "e5", "NaN", "Infinity", "#VALUE!", "one", "$5", "٣"})
    void noNumber(String typed) {
        says("is no number; write for instance 0.9 or 900 mm", typed, "impeller_diameter_m");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "liquid_volume_m3 | 2.5 or 2500 L", "blade_angle_deg | 45 or 45 deg", "speed_rpm | 85 rpm or 1.5 rev/s",
        "speed_rev_s | 85 rpm or 1.5 rev/s", "shear_rate_constant | 11.5", "shear_rate_min_1_s | 120 or 120 1/s",
        "density_kg_m3 | 1350 or 1.35 g/cm3", "viscosity_Pa_s | 0.012 or 12 mPa s", "flow_index | 6 or 0.85",
        "consistency_Pa_sn | 4.5 or 4500 mPa s^n", "yield_stress_Pa | 0.45 or 4.5 dyn/cm2", "time_constant_s | 0.3 or 300 ms",
        "target_power_per_volume_W_m3 | 800 or 0.8 kW/m3", "target_tip_speed_m_s | 4.5 or 4.5 m/s"})
    void everyFieldGivesAnExampleThatItTakes(String column, String examples) {
        says("is no number; write for instance " + examples, "abc", column);
        for (String example : examples.split(" or ")) {
            Typing.value(example, Typing.field(column));
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"1 350", "1 350 mm", "1'350", "1’350", "1.350,5", "1,350.5", "1,350,000", "1.350.000 mm",
        "1..5", "2 10 mm", "5'11", "3 1", "5 1/2 in"})
    void severalNumbers(String typed) {
        says(ONE_NUMBER, typed, "impeller_diameter_m");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {"1,350 | 1.350 | 1350", "12,345 mm | 12.345 | 12345", "-1,350 | -1.350 | -1350",
        "999,000e2 | 999.000e2 | 999000e2"})
    void commaOfEitherKind(String typed, String decimal, String whole) {
        says("can be read as " + decimal + " or as " + whole + EACH, typed, "impeller_diameter_m");
    }

    @ParameterizedTest
    @ValueSource(strings = {"1e999", "1e-999", "1e3080", "1e-322 mm", "1e-999 mm"})
    void beyondDoubles(String typed) {
        says("is beyond the numbers that a computer's double precision holds", typed, "impeller_diameter_m");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "5 kg | is a mass", "5 m2 | is an area", "5 L | is a volume", "5 deg | is an angle", "5 N | is a force",
        "5 W | is a power", "5 m3/s | is a flow", "5 cSt | is a kinematic viscosity", "5 rpm | is a speed of rotation",
        "5 1/s | is a shear rate", "5 Pa | is a stress", "5 cP | is a viscosity", "5 mPa s^n | is a consistency",
        "5 h | is a time", "5 ft/min | is a velocity", "5 g/L | is a density", "5 W/L | is a power per volume",
        "5 1/rev | is a number per turn", "5 m/m | is a number without unit", "5 - | is a number without unit",
        "5 kg m | measures something else"})
    void anotherKind(String typed, String what) {
        says(what + "; " + LENGTHS, typed, "impeller_diameter_m");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "5 furlong | furlong", "5 MM | MM", "5 m10 | m10", "5 m^n | m^n", "5 m^1.5 | 5", "10³ mm | 3", "10^3 mm | ^3",
        "5\" | \"", "5 °C | °C", "5 % | %", "5 m- | m-", "5 (m) | (m)"})
    void unknownUnit(String typed, String symbol) {
        says("has the unit '" + symbol + "', which is not known here; " + LENGTHS, typed, "impeller_diameter_m");
    }

    @ParameterizedTest
    @ValueSource(strings = {"120 rpm", "120 rev/s", "120 rad/s"})
    void aShearRateIsNoSpeed(String typed) {
        says("is a speed of rotation; a shear rate is expected: 1/s, 1/min", typed, "target_shear_rate_1_s");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "speed_rpm | 50 Hz | Hz may be the frequency of an inverter instead of the shaft's; write rev/s or rpm",
        "speed_rpm | 50 cps | cps stands for centipoise and for cycles per second; write cP or rev/s",
        "viscosity_Pa_s | 50 cps | cps stands for centipoise and for cycles per second; write cP or rev/s",
        "liquid_volume_m3 | 240 gal | a US and an imperial gallon differ by a fifth; write US gal or imp gal",
        "density_kg_m3 | 11 lb/gal | a US and an imperial gallon differ by a fifth; write US gal or imp gal",
        "target_power_per_volume_W_m3 | 5 hp/m3 | mechanical and metric horsepower differ; write kW",
        "density_kg_m3 | 5 ton/m3 | short, long and metric tons differ; write t (1000 kg) or lb"})
    void oneSpellingOfTwoUnits(String column, String typed, String why) {
        says("is not clear: " + why, typed, column);
    }

    @ParameterizedTest
    @ValueSource(strings = {"5 rad", "5 m/s", "5 s"})
    void noSpeed(String typed) {
        String what = typed.endsWith("rad") ? "is an angle" : typed.endsWith("m/s") ? "is a velocity" : "is a time";
        says(what + "; " + ROTATIONS, typed, "speed_rpm");
    }

    @ParameterizedTest
    @ValueSource(strings = {"4.5 Pa s", "45 P", "4500 mPas"})
    void theUnitOfAConsistencyDependsOnTheFlowIndex(String typed) {
        says("has the unit of a viscosity, but the unit of a consistency depends on the flow index n; write the number"
                + " alone, in Pa s^n, or with Pa s^n or mPa s^n", typed, "consistency_Pa_sn");
    }

    @ParameterizedTest
    @ValueSource(strings = {"5/s", "51/s", "5 /s"})
    void slashAtTheStart(String typed) {
        says("has a unit that begins with a slash; write a space and then 1/s, for instance", typed, "shear_rate_min_1_s");
    }

    @ParameterizedTest
    @ValueSource(strings = {"5 kg/m s", "5 kg/m·s", "5 kg/m/s"})
    void productBehindASlash(String typed) {
        says("has more than one symbol behind a slash, which can be read in two ways; write negative exponents, for"
                + " instance kg m-1 s-1", typed, "viscosity_Pa_s");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {"5 m | is a length", "5 rpm | is a speed of rotation"})
    void aPureNumberHasNoUnit(String typed, String what) {
        says(what + "; a number without unit is expected", typed, "power_number");
    }
}
