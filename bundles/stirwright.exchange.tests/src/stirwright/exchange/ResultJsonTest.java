package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.StringWriter;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import stirwright.core.CaseResult;
import stirwright.core.Refusal;

class ResultJsonTest {
    @TempDir
    Path folder;

    private static Map<String, Object> written(CaseResult... results) {
        StringWriter out = new StringWriter();
        ResultJson.write(List.of(results), out, new Origin("1.2.3", "cases.csv"));
        return Json.object(out.toString());
    }

    @Test
    void saysWhereItComesFrom() {
        Map<String, Object> json = written();
        assertEquals("1.2.3", json.get("stirwright"));
        assertEquals("cases.csv", json.get("file"));
        assertEquals(List.of(), json.get("cases"));
    }

    @Test
    void aComputedCase() {
        CaseResult result = Sheet.good().entry(folder).check(Invented.CROSS_CHECK);
        Map<String, Object> json = Json.objects(written(result), "cases").get(0);
        assertEquals(List.of("name", "family", "status", "spread", "flags", "notes", "refusal", "candidates", "quantities"),
                List.copyOf(json.keySet()));
        assertEquals("A", json.get("name"));
        assertEquals(result.status().id(), json.get("status"));
        assertEquals(result.flags(), json.get("flags"));
        assertNull(json.get("refusal"));
        Map<String, Object> pick = Json.objects(json, "candidates").get(0);
        assertEquals(5.0, pick.get("power_number"));
        assertEquals(result.candidates().get(0).power(), pick.get("power_W"));
        assertEquals(List.of(), pick.get("failed_bounds"));
        Map<String, Object> second = Json.objects(json, "candidates").get(1);
        assertEquals(result.candidates().get(1).failedBounds(), second.get("failed_bounds"));
        assertTrue(((List<?>) second.get("failed_bounds")).size() >= 2);
        assertEquals(4, Json.objects(json, "quantities").size());
        assertEquals(List.of("quantity", "correlation", "value", "role", "verdict", "failed_bounds", "source",
                "transcription", "standing", "why"), List.copyOf(Json.objects(json, "quantities").get(0).keySet()));
    }

    @Test
    void candidatesAreNamedAsTheColumns() {
        CaseResult result = Sheet.good().entry(folder).check(Invented.CROSS_CHECK);
        List<String> expected = new ArrayList<>(ResultTable.columns());
        expected.removeAll(List.of("case", "family", "spread", "status", "notes"));
        expected.addAll(List.of("why", "notes"));
        Map<String, Object> pick = Json.objects(Json.objects(written(result), "cases").get(0), "candidates").get(0);
        assertEquals(expected, List.copyOf(pick.keySet()));
    }

    @Test
    void aRefusedCase() {
        CaseResult refused = CaseResult.refused("B \"x\"", "?", new Refusal("family", "?", "is not installed"));
        Map<String, Object> json = Json.objects(written(refused), "cases").get(0);
        assertEquals("B \"x\"", json.get("name"));
        assertEquals("refused", json.get("status"));
        assertNull(json.get("spread"));
        assertEquals(Map.of("field", "family", "value", "?", "reason", "is not installed"), json.get("refusal"));
        assertEquals(List.of(), json.get("candidates"));
    }
}
