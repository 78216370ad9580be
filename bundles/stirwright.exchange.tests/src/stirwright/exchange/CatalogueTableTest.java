package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.StringWriter;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

class CatalogueTableTest {

    @Test
    void everyCorrelationAndEveryFamily() {
        StringWriter out = new StringWriter();
        CatalogueTable.complete(CatalogueTable.csv(out), Invented.CATALOGUE);
        List<NamedCsvRecord> rows = CsvReader.builder().ofNamedCsvRecord(out.toString()).stream().toList();
        assertEquals(List.of("blades.np.firm", "blades.np.narrow", "blades.ks.ten", "blades.nq.plain", ""),
                rows.stream().map(r -> r.getField("correlation")).toList());
        NamedCsvRecord first = rows.get(0);
        assertEquals("blades", first.getField("family"));
        assertEquals("power-number", first.getField("quantity"));
        assertEquals("Np = 5", first.getField("formula"));
        assertEquals("invented for tests, locator not at hand", first.getField("source"));
        assertTrue(first.getField("range").contains("blade count 6; "), first.getField("range"));
        assertEquals("0.1", first.getField("scatter"));
        assertEquals("baffles; clearance", first.getField("contains"));
        assertEquals("invented.blades 1.0.0", first.getField("bundle"));
        assertEquals("plate", rows.get(4).getField("family"));
        assertEquals("invented plate", rows.get(4).getField("title"));
        assertEquals("", rows.get(1).getField("scatter"));
    }

    @Test
    void jsonHasTheSameMembers() {
        StringWriter out = new StringWriter();
        CatalogueTable.complete(CatalogueTable.json(out, new Origin("1", "")), Invented.CATALOGUE);
        Map<String, Object> json = Json.object(out.toString());
        assertEquals(List.of("stirwright", "correlations"), List.copyOf(json.keySet()));
        List<Map<String, Object>> rows = Json.objects(json, "correlations");
        assertEquals(5, rows.size());
        assertEquals(CatalogueTable.columns(), List.copyOf(rows.get(0).keySet()));
        assertEquals(0.1, rows.get(0).get("scatter"));
        assertEquals(List.of("baffles", "clearance"), rows.get(0).get("contains"));
    }
}
