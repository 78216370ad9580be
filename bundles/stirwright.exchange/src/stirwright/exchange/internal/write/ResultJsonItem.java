package stirwright.exchange.internal.write;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.util.List;
import java.util.stream.Stream;
import stirwright.core.CandidateResult;
import stirwright.core.CaseResult;
import stirwright.core.Refusal;

/** A case's result as a JSON object; the candidates' members are called as the columns are. */
public final class ResultJsonItem {
    private static final List<Column<CandidateResult>> CANDIDATE = Stream.concat(
            ResultColumns.OF_CANDIDATE.stream(),
            Stream.of(Column.<CandidateResult>text("why", CandidateResult::why),
                    Column.<CandidateResult>words("notes", CandidateResult::notes))).toList();

    private ResultJsonItem() {}

    public static void write(CaseResult result, JsonGenerator json) throws IOException {
        json.writeStartObject();
        json.writeStringField("name", result.name());
        json.writeStringField("family", result.family());
        json.writeStringField("status", result.status().id());
        JsonRecords.number("spread", result.spread(), json);
        JsonRecords.words("flags", result.flags(), json);
        JsonRecords.words("notes", result.notes(), json);
        json.writeFieldName("refusal");
        if (result.refusal().isPresent()) {
            Refusal refusal = result.refusal().get();
            json.writeStartObject();
            json.writeStringField("field", refusal.field());
            json.writeStringField("value", refusal.value());
            json.writeStringField("reason", refusal.reason());
            json.writeEndObject();
        } else {
            json.writeNull();
        }
        JsonRecords.array("candidates", result.candidates(), CANDIDATE, json);
        JsonRecords.array("quantities", result.quantities(), QuantityColumns.OF_QUANTITY, json);
        json.writeEndObject();
    }
}
