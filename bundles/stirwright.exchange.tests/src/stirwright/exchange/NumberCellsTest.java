package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static stirwright.exchange.Refusals.assertRefused;

import java.nio.file.Path;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import stirwright.rheology.Newtonian;

/** Plain decimals and nothing else that some language takes for a number. */
class NumberCellsTest {
    @TempDir
    Path folder;

    @ParameterizedTest
    @CsvSource({"1,1", "+1,1", "007.50,7.5", ".5,0.5", "5.,5", "1e3,1000", "1.5E-3,0.0015", "2e+2,200", "\u00A03 ,3",
        "4.9e-324,4.9e-324"})
    void numbers(String typed, double expected) {
        CaseEntry entry = Sheet.good().with("viscosity_Pa_s", typed).entry(folder);
        assertEquals(new Newtonian(expected), entry.spec().orElseThrow().fluid().model());
    }

    @ParameterizedTest
    @ValueSource(strings = {"NaN", "Infinity", "-Infinity", "0x1p3", "1d", "1f", "1e", "e5", "+", "-", ".", "1..2", "--1",
        "1 Pa s", "5%", "abc", "1e5.5", "\u0661", "\u2212" + "5", "=1+1", "1_000"})
    void noNumbers(String typed) {
        assertRefused(Sheet.good().with("viscosity_Pa_s", typed).entry(folder), "viscosity_Pa_s", typed, "plain decimal");
    }

    @ParameterizedTest
    @ValueSource(strings = {"1e400", "-1e400", "1e-400", "1e99999999999999999999"})
    void beyondDoublePrecision(String typed) {
        assertRefused(Sheet.good().with("viscosity_Pa_s", typed).entry(folder), "viscosity_Pa_s", typed, "precision");
    }

    @ParameterizedTest
    @ValueSource(strings = {"blade_count", "impeller_diameter_m", "liquid_height_m", "speed_rev_s", "density_kg_m3",
        "viscosity_Pa_s", "power_number", "shear_rate_constant", "flow_number", "shear_rate_min_1_s"})
    void everyNumericColumnIsChecked(String column) {
        assertRefused(Sheet.good().with(column, "wide").entry(folder), column, "wide", "number");
    }

    @ParameterizedTest
    @ValueSource(ints = {40, 41, 5000})
    void longValuesAreCut(int length) {
        String shown = length > 40 ? "q".repeat(39) + "…" : "q".repeat(length);
        assertRefused(Sheet.good().with("viscosity_Pa_s", "q".repeat(length)).entry(folder), "viscosity_Pa_s", shown);
    }
}
