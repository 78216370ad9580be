package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static stirwright.exchange.Refusals.assertAccepted;
import static stirwright.exchange.Refusals.assertRefused;

import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import stirwright.core.SpeedDemand;

/** One speed or one target, above 0 and plausible. */
class SpeedCellsTest {
    @TempDir
    Path folder;

    private CaseEntry entry(String... columnsAndValues) {
        Sheet sheet = Sheet.good().without("speed_rev_s").with("speed_rpm", "").with("speed_rev_s", "");
        for (int i = 0; i < columnsAndValues.length; i += 2) {
            sheet.with(columnsAndValues[i], columnsAndValues[i + 1]);
        }
        return sheet.entry(folder);
    }

    private SpeedDemand speed(String column, String value) {
        return entry(column, value).spec().orElseThrow().speed();
    }

    @Test
    void eachKind() {
        assertEquals(new SpeedDemand.At(1.5), speed("speed_rpm", "90"));
        assertEquals(new SpeedDemand.At(1.5), speed("speed_rev_s", "1.5"));
        assertEquals(new SpeedDemand.ForShearRate(30), speed("target_shear_rate_1_s", "30"));
        assertEquals(new SpeedDemand.ForPowerPerVolume(500), speed("target_power_per_volume_W_m3", "500"));
        assertEquals(new SpeedDemand.ForTipSpeed(4), speed("target_tip_speed_m_s", "4"));
    }

    @Test
    void none() {
        assertRefused(entry(), "speed_rpm", "", "blank", "speed_rev_s", "target_shear_rate_1_s",
                "target_power_per_volume_W_m3", "target_tip_speed_m_s");
    }

    @Test
    void moreThanOne() {
        assertRefused(entry("speed_rpm", "90", "speed_rev_s", "1.5"), "speed_rpm", "90", "speed_rev_s 1.5");
        assertRefused(entry("speed_rev_s", "1.5", "target_tip_speed_m_s", "3"),
                "speed_rev_s", "1.5", "target_tip_speed_m_s 3");
        assertRefused(entry("target_shear_rate_1_s", "20", "target_tip_speed_m_s", "3"),
                "target_shear_rate_1_s", "20", "target_tip_speed_m_s 3");
    }

    @ParameterizedTest
    @ValueSource(strings = {"speed_rpm", "speed_rev_s", "target_shear_rate_1_s", "target_power_per_volume_W_m3",
        "target_tip_speed_m_s"})
    void aboveZero(String column) {
        assertRefused(entry(column, "0"), column, "0", "greater than 0");
        assertRefused(entry(column, "-2"), column, "-2", "greater than 0");
    }

    /** The impeller of the good case measures 0.5 m, so 60 m/s is at 38.197 rev/s. */
    @Test
    void tipSpeedAboveSixtyIsAMistakenUnit() {
        assertAccepted(entry("speed_rev_s", "38.19"));
        assertRefused(entry("speed_rev_s", "38.21"), "speed_rev_s", "38.21", "rev/min", "60 m/s", "no source");
        assertRefused(entry("speed_rev_s", "90"), "speed_rev_s", "90", "141.4 m/s", "rev/min");
        assertAccepted(entry("speed_rpm", "2291"));
        assertRefused(entry("speed_rpm", "2293"), "speed_rpm", "2293", "60 m/s", "impeller_diameter_m 0.5");
        assertRefused(entry("target_tip_speed_m_s", "61"), "target_tip_speed_m_s", "61", "60 m/s");
    }
}
