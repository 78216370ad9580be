package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.StringWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import stirwright.core.CandidateResult;
import stirwright.core.CaseResult;
import stirwright.core.FluidState;
import stirwright.core.Refusal;
import stirwright.core.Role;
import stirwright.core.Status;
import stirwright.core.YieldEffect;
import stirwright.correlation.FluidClass;
import stirwright.correlation.Verdict;

class ResultTableTest {

    /** The contract's line, letter by letter, with the duty columns that it names apart and that are filled so far. */
    private static final String CONTRACT = "case,family,correlation,role,verdict,failed_bounds,regime,speed_rev_s,"
            + "shear_rate_correlation,shear_rate_constant,shear_rate_1_s,apparent_viscosity_Pa_s,reynolds,power_number,"
            + "power_W,torque_N_m,power_per_volume_W_m3,flow_number_correlation,flow_kind,flow_number,pumping_m3_s,"
            + "tip_speed_m_s,power_based_shear_rate_1_s,yield_stress_low_Pa,yield_stress_high_Pa,power_yield_low_W,"
            + "power_yield_high_W,deviation_from_pick,spread,status,notes";

    @TempDir
    Path folder;

    private static String written(CaseResult... results) {
        StringWriter out = new StringWriter();
        ResultTable.write(List.of(results), out);
        return out.toString();
    }

    private static List<NamedCsvRecord> records(CaseResult... results) {
        return CsvReader.builder().ofNamedCsvRecord(written(results)).stream().toList();
    }

    private CaseResult computed() {
        return Sheet.good().entry(folder).check(Invented.CROSS_CHECK);
    }

    @Test
    void columnsAreTheContracts() {
        assertEquals(CONTRACT + "\n", written());
        assertEquals(CONTRACT, String.join(",", ResultTable.columns()));
    }

    /** D 0.5 m, 2 rev/s, 1000 kg/m3, 0.1 Pa s, T = H = 1.5 m; Np 5, Nq 0.75, ks 10 per revolution: by hand. */
    @Test
    void numbersOfTheGoodCase() {
        NamedCsvRecord pick = records(computed()).get(0);
        assertEquals("blades.np.firm", pick.getField("correlation"));
        assertEquals("recommended", pick.getField("role"));
        assertEquals("blades.ks.ten", pick.getField("shear_rate_correlation"));
        assertEquals("blades.nq.plain", pick.getField("flow_number_correlation"));
        assertEquals("discharge", pick.getField("flow_kind"));
        assertEquals("transitional", pick.getField("regime"));
        double power = 5 * 1000 * 8 * 0.03125;
        near(2, pick, "speed_rev_s");
        near(10, pick, "shear_rate_constant");
        near(20, pick, "shear_rate_1_s");
        near(0.1, pick, "apparent_viscosity_Pa_s");
        near(5000, pick, "reynolds");
        near(5, pick, "power_number");
        near(power, pick, "power_W");
        near(power / (4 * Math.PI), pick, "torque_N_m");
        near(power / (Math.PI / 4 * 1.5 * 1.5 * 1.5), pick, "power_per_volume_W_m3");
        near(Math.sqrt(power / (Math.PI / 4 * 1.5 * 1.5 * 1.5) / 0.1), pick, "power_based_shear_rate_1_s");
        near(0.75, pick, "flow_number");
        near(0.75 * 2 * 0.125, pick, "pumping_m3_s");
        near(Math.PI, pick, "tip_speed_m_s");
        near(0, pick, "deviation_from_pick");
        near(1, pick, "spread");
    }

    /** Np is 5 at every Reynolds number, so that the power stays whatever the yield stress. */
    @Test
    void boundsOfTheYieldStressAreCarriedOn() {
        CaseResult result = Sheet.good().without("viscosity_Pa_s").with("model", "herschel-bulkley")
                .with("consistency_Pa_sn", "2").with("flow_index", "0.5").with("yield_stress_Pa", "7")
                .with("yield_stress_low_Pa", "5").with("yield_stress_high_Pa", "11.5").entry(folder).check(Invented.CROSS_CHECK);
        List<NamedCsvRecord> rows = records(result);
        assertTrue(rows.size() > 1);
        rows.forEach(row -> near(5, row, "yield_stress_low_Pa"));
        rows.forEach(row -> near(11.5, row, "yield_stress_high_Pa"));
        near(Double.parseDouble(rows.get(0).getField("power_W")), rows.get(0), "power_yield_low_W");
        near(Double.parseDouble(rows.get(0).getField("power_W")), rows.get(0), "power_yield_high_W");
        assertEquals("", rows.get(1).getField("power_yield_low_W"));
        assertEquals("", records(computed()).get(0).getField("yield_stress_low_Pa"));
    }

    @Test
    void theStaticYieldStressWidensTheRangeAndLeavesThePower() {
        Sheet sheet = Sheet.good().without("viscosity_Pa_s").with("model", "herschel-bulkley")
                .with("consistency_Pa_sn", "2").with("flow_index", "0.5").with("yield_stress_Pa", "7")
                .with("yield_stress_low_Pa", "5").with("yield_stress_high_Pa", "11.5");
        NamedCsvRecord without = records(sheet.entry(folder).check(Invented.CROSS_CHECK)).get(0);
        NamedCsvRecord with = records(sheet.with("static_yield_stress_Pa", "40").entry(folder).check(Invented.CROSS_CHECK)).get(0);
        near(5, with, "yield_stress_low_Pa");
        near(40, with, "yield_stress_high_Pa");
        assertEquals(without.getField("power_W"), with.getField("power_W"));
        assertTrue(with.getField("notes").contains("static yield stress 40 Pa: start-up after rest needs its own check with the"
                + " drive's maker"), with.getField("notes"));
        NamedCsvRecord lower = records(sheet.with("static_yield_stress_Pa", "8").entry(folder).check(Invented.CROSS_CHECK)).get(0);
        near(11.5, lower, "yield_stress_high_Pa");
    }

    private static void near(double expected, NamedCsvRecord row, String column) {
        assertEquals(expected, Double.parseDouble(row.getField(column)), 1e-12 * Math.abs(expected), column);
    }

    @Test
    void everyDigitComesBack() {
        double value = 0.1 + 0.2;
        double small = Math.nextUp(1e-7);
        FluidState state = new FluidState(Math.PI, Math.E, 1 / 3.0, value, 1, 1000, small, 0, FluidClass.NEWTONIAN);
        NamedCsvRecord row = records(result(candidate("c", Optional.of(state), value, small))).get(0);
        assertEquals(Math.PI, Double.parseDouble(row.getField("speed_rev_s")));
        assertEquals(1 / 3.0, Double.parseDouble(row.getField("shear_rate_1_s")));
        assertEquals(state.reynolds(), Double.parseDouble(row.getField("reynolds")));
        assertEquals(value, Double.parseDouble(row.getField("power_number")));
        assertEquals(small, Double.parseDouble(row.getField("power_W")));
    }

    @Test
    void whatMeansNothingIsAnEmptyCell() {
        NamedCsvRecord row = records(result(candidate("c", Optional.empty(), Double.NaN, Double.POSITIVE_INFINITY))).get(0);
        for (String column : List.of("speed_rev_s", "reynolds", "power_number", "power_W", "regime", "flow_kind", "spread")) {
            assertEquals("", row.getField(column), column);
        }
    }

    @Test
    void refusedCaseHasOneRow() {
        List<NamedCsvRecord> rows =
                records(CaseResult.refused("A", "blades", new Refusal("flow_index", "2,5", "must be at most 2")));
        assertEquals(1, rows.size());
        assertEquals("refused", rows.get(0).getField("status"));
        assertEquals("flow_index 2,5 must be at most 2", rows.get(0).getField("notes"));
        assertEquals("A", rows.get(0).getField("case"));
        assertEquals("", rows.get(0).getField("correlation"));
    }

    @Test
    void notesOfTheCaseStandOnThePicksRowAlone() {
        List<NamedCsvRecord> rows = records(
                result(candidate("a", Optional.empty(), 1, 1), candidate("b", Optional.empty(), 2, 2)));
        assertEquals("why a; own a; flag; note", rows.get(0).getField("notes"));
        assertEquals("why b; own b", rows.get(1).getField("notes"));
        assertEquals("bound 1; bound 2", rows.get(1).getField("failed_bounds"));
        assertEquals("near", rows.get(1).getField("verdict"));
        assertEquals("excluded", rows.get(1).getField("role"));
        rows.forEach(r -> assertEquals("flagged", r.getField("status")));
    }

    @Test
    void plainTextForScripts() {
        String text = written(computed(), result(candidate("#a,\"b\"", Optional.empty(), 1, 1)));
        assertFalse(text.startsWith("\uFEFF"));
        assertFalse(text.contains("\r"));
        assertTrue(text.endsWith("\n"));
        assertTrue(text.contains("\"#a,\"\"b\"\"\""));
    }

    private static CaseResult result(CandidateResult... candidates) {
        return new CaseResult("A", "blades", Status.FLAGGED, Double.NaN, List.of(candidates), List.of(),
                List.of("flag"), List.of("note"), Optional.empty());
    }

    private static CandidateResult candidate(String id, Optional<FluidState> state, double powerNumber, double power) {
        return new CandidateResult(id, Role.EXCLUDED, Verdict.NEAR, List.of("bound 1", "bound 2"), "why " + id,
                Optional.empty(), state, "ks", powerNumber, power, 1, 1, 1, YieldEffect.NONE, "", Optional.empty(), Double.NaN, Double.NaN, 0,
                List.of("own " + id));
    }
}
