package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.StringWriter;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import stirwright.core.CaseResult;
import stirwright.core.Refusal;

class CandidateTableTest {
    @TempDir
    Path folder;

    private static List<NamedCsvRecord> records(CaseResult... results) {
        StringWriter out = new StringWriter();
        CandidateTable.write(List.of(results), out);
        return CsvReader.builder().ofNamedCsvRecord(out.toString()).stream().toList();
    }

    @Test
    void columnsAreTheContractsAndWhy() {
        assertEquals("case, quantity, correlation, value, role, verdict, failed_bounds, source, transcription, standing, why",
                String.join(", ", CandidateTable.columns()));
    }

    @Test
    void oneRowForEachQuantityAndCorrelation() {
        List<NamedCsvRecord> rows = records(Sheet.good().entry(folder).check(Invented.CROSS_CHECK));
        assertEquals(List.of("blades.np.firm", "blades.np.narrow", "blades.ks.ten", "blades.nq.plain"),
                rows.stream().map(r -> r.getField("correlation")).toList());
        assertEquals(List.of("5.0", "4.0", "10.0", "0.75"), rows.stream().map(r -> r.getField("value")).toList());
        assertEquals(List.of("power-number", "power-number", "shear-rate-constant", "flow-number"),
                rows.stream().map(r -> r.getField("quantity")).toList());
        NamedCsvRecord first = rows.get(0);
        assertEquals("A", first.getField("case"));
        assertEquals("recommended", first.getField("role"));
        assertEquals("invented for tests, locator not at hand", first.getField("source"));
        assertEquals("checked against the source", first.getField("transcription"));
        assertEquals("published", first.getField("standing"));
        assertTrue(rows.get(1).getField("failed_bounds").contains("2"));
        rows.forEach(r -> assertTrue(r.getField("why").length() > 5));
    }

    @Test
    void aGivenValueHasNoSource() {
        List<NamedCsvRecord> rows =
                records(Sheet.good().with("power_number", "3").entry(folder).check(Invented.CROSS_CHECK));
        assertEquals("given", rows.get(0).getField("correlation"));
        assertEquals("chosen", rows.get(0).getField("role"));
        assertEquals("", rows.get(0).getField("source"));
        assertEquals("3.0", rows.get(0).getField("value"));
    }

    @Test
    void aRefusedCaseHasNoRow() {
        assertEquals(List.of(), records(CaseResult.refused("A", "blades", new Refusal("family", "x", "is unknown"))));
    }
}
