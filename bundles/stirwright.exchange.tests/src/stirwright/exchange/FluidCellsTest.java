package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static stirwright.exchange.Refusals.assertRefused;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import stirwright.rheology.Bingham;
import stirwright.rheology.Carreau;
import stirwright.rheology.Casson;
import stirwright.rheology.Cross;
import stirwright.rheology.Fluid;
import stirwright.rheology.FluidModel;
import stirwright.rheology.HerschelBulkley;
import stirwright.rheology.MeasuredWindow;
import stirwright.rheology.Newtonian;
import stirwright.rheology.PowerLaw;
import stirwright.rheology.YieldBounds;

/** Every model of the contract with its parameters, and what is refused. */
class FluidCellsTest {
    @TempDir
    Path folder;

    private static Sheet fluid(String model) {
        return Sheet.good().without("viscosity_Pa_s").with("model", model);
    }

    /** All parameters at once, each with a value of its own. */
    private FluidModel everythingGiven(String model) {
        return fluid(model).with("viscosity_Pa_s", "0.1").with("consistency_Pa_sn", "2").with("flow_index", "0.5")
                .with("yield_stress_Pa", "7").with("plastic_viscosity_Pa_s", "0.3").with("zero_shear_viscosity_Pa_s", "9")
                .with("infinite_shear_viscosity_Pa_s", "0.01").with("time_constant_s", "4")
                .entry(folder).spec().orElseThrow().fluid().model();
    }

    @Test
    void everyModel() {
        assertEquals(new Newtonian(0.1), everythingGiven("newtonian"));
        assertEquals(new PowerLaw(2, 0.5), everythingGiven("power-law"));
        assertEquals(new Bingham(7, 0.3), everythingGiven("bingham"));
        assertEquals(new HerschelBulkley(7, 2, 0.5), everythingGiven("herschel-bulkley"));
        assertEquals(new Casson(7, 0.3), everythingGiven("casson"));
        assertEquals(new Cross(9, 0.01, 4, 0.5), everythingGiven("cross"));
        assertEquals(new Carreau(9, 0.01, 4, 0.5), everythingGiven("carreau"));
    }

    @Test
    void modelNamesWhateverTheirCase() {
        assertEquals(new PowerLaw(2, 0.5), everythingGiven(" Power-LAW "));
    }

    @Test
    void modelIsNeededAndKnown() {
        assertRefused(fluid("").entry(folder), "model", "", "blank", "newtonian", "carreau");
        assertRefused(fluid("powerlaw").entry(folder), "model", "powerlaw", "power-law", "herschel-bulkley");
    }

    @Test
    void parametersAreNeeded() {
        CaseEntry entry = fluid("power-law").with("flow_index", "0.5").with("consistency_Pa_sn", "").entry(folder);
        assertRefused(entry, "consistency_Pa_sn", "", "is blank; model power-law needs it");
        assertEquals("consistency_Pa_sn is blank; model power-law needs it", entry.refusal().orElseThrow().words());
        assertRefused(fluid("cross").with("flow_index", "0.5").entry(folder), "zero_shear_viscosity_Pa_s", "", "cross");
    }

    @Test
    void unusedParametersAreRemarked() {
        List<String> remarks = Sheet.good().with("flow_index", "0.4").entry(folder).spec().orElseThrow().remarks();
        assertEquals(1, remarks.size());
        assertTrue(remarks.get(0).startsWith("flow_index 0.4 is not a parameter of model newtonian"));
    }

    @ParameterizedTest
    @CsvSource({"flow_index,0", "flow_index,2.50", "flow_index,-1", "consistency_Pa_sn,0", "consistency_Pa_sn,-0.0",
        "yield_stress_Pa,-5"})
    void parametersBeyondTheirLimits(String column, String typed) {
        Sheet sheet = fluid("herschel-bulkley").with("consistency_Pa_sn", "2").with("flow_index", "0.5")
                .with("yield_stress_Pa", "7").with(column, typed);
        assertRefused(sheet.entry(folder), column, typed, "must be");
    }

    @Test
    void densityInAnotherUnit() {
        assertRefused(Sheet.good().with("density_kg_m3", "1.10").entry(folder), "density_kg_m3", "1.10", "g/cm3");
        assertRefused(Sheet.good().with("density_kg_m3", "30000").entry(folder), "density_kg_m3", "30000", "25000");
        assertRefused(Sheet.good().with("density_kg_m3", "").entry(folder), "density_kg_m3", "", "blank");
    }

    @Test
    void measuredWindow() {
        assertEquals(new MeasuredWindow(1, 100), window("1", "100"));
        assertEquals(new MeasuredWindow(Double.NaN, 100), window("", "100"));
        assertEquals(new MeasuredWindow(1, Double.NaN), window("1", ""));
        assertEquals(MeasuredWindow.UNKNOWN, window("", ""));
    }

    private MeasuredWindow window(String least, String most) {
        Fluid fluid = Sheet.good().with("shear_rate_min_1_s", least).with("shear_rate_max_1_s", most).entry(folder)
                .spec().orElseThrow().fluid();
        return fluid.window();
    }

    @Test
    void measuredWindowIsPositiveAndAscends() {
        assertRefused(Sheet.good().with("shear_rate_min_1_s", "0").entry(folder), "shear_rate_min_1_s", "0", "greater");
        assertRefused(Sheet.good().with("shear_rate_max_1_s", "-1").entry(folder), "shear_rate_max_1_s", "-1", "greater");
        assertRefused(Sheet.good().with("shear_rate_min_1_s", "100").with("shear_rate_max_1_s", "10").entry(folder),
                "shear_rate_max_1_s", "10", "100");
    }

    private static Sheet yielding(String low, String high) {
        return fluid("herschel-bulkley").with("consistency_Pa_sn", "2").with("flow_index", "0.5")
                .with("yield_stress_Pa", "7").with("yield_stress_low_Pa", low).with("yield_stress_high_Pa", high);
    }

    @Test
    void boundsOfTheYieldStress() {
        assertEquals(new YieldBounds(5, 9), bounds(yielding("5", "9")));
        assertEquals(new YieldBounds(7, 7), bounds(yielding("7", "7")));
        assertEquals(new YieldBounds(0, Double.NaN), bounds(yielding("0", "")));
        assertEquals(new YieldBounds(Double.NaN, 9), bounds(yielding("", "9")));
        assertEquals(YieldBounds.UNKNOWN, bounds(yielding("", "")));
    }

    @Test
    void theStaticYieldStressGoesWithAnyModel() {
        assertEquals(new YieldBounds(5, 9, 60), bounds(yielding("5", "9").with("static_yield_stress_Pa", "60")));
        assertEquals(new YieldBounds(Double.NaN, Double.NaN, 3), bounds(yielding("", "").with("static_yield_stress_Pa", "3")));
        assertEquals(new YieldBounds(Double.NaN, Double.NaN, 0), bounds(Sheet.good().with("static_yield_stress_Pa", "0")));
    }

    @Test
    void theStaticYieldStressIsNotNegative() {
        assertRefused(Sheet.good().with("static_yield_stress_Pa", "-2").entry(folder), "static_yield_stress_Pa", "-2",
                "must be a finite number, 0 or greater");
        assertRefused(yielding("5", "9").with("static_yield_stress_Pa", "-0.1").entry(folder), "static_yield_stress_Pa", "-0.1");
        assertRefused(Sheet.good().with("static_yield_stress_Pa", "1e400").entry(folder), "static_yield_stress_Pa", "1e400");
        assertRefused(Sheet.good().with("static_yield_stress_Pa", "stiff").entry(folder), "static_yield_stress_Pa", "stiff");
    }

    private YieldBounds bounds(Sheet sheet) {
        return sheet.entry(folder).spec().orElseThrow().fluid().yieldBounds();
    }

    @Test
    void boundsHoldTheYieldStress() {
        assertRefused(yielding("7.5", "9").entry(folder), "yield_stress_low_Pa", "7.5", "must not be above the yield stress", "7");
        assertRefused(yielding("5", "6.5").entry(folder), "yield_stress_high_Pa", "6.5", "must not be below the yield stress", "7");
        assertRefused(yielding("9", "8").entry(folder), "yield_stress_high_Pa", "8", "below", "9");
        assertRefused(yielding("-1", "").entry(folder), "yield_stress_low_Pa", "-1", "0 or greater");
        assertRefused(yielding("much", "").entry(folder), "yield_stress_low_Pa", "much");
    }

    @Test
    void boundsBesideAModelWithoutYieldStressAreRefused() {
        assertRefused(Sheet.good().with("yield_stress_low_Pa", "1").entry(folder), "yield_stress_low_Pa", "1",
                "newtonian has no yield stress");
        assertRefused(fluid("power-law").with("consistency_Pa_sn", "2").with("flow_index", "0.5")
                .with("yield_stress_high_Pa", "9").entry(folder), "yield_stress_high_Pa", "9", "power-law has no yield stress");
    }
}
