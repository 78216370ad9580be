package stirwright.exchange;

import java.io.Writer;
import stirwright.core.CaseResult;
import stirwright.exchange.internal.write.JsonOutput;
import stirwright.exchange.internal.write.ResultJsonItem;

/** Results as JSON: every case with its candidates and the correlations for its other quantities. */
public final class ResultJson {

    private ResultJson() {}

    /** Starts the object; the writer is flushed at the end and left open. */
    public static Output<CaseResult> to(Writer out, Origin origin) {
        return new JsonOutput<>(out, origin, "cases", ResultJsonItem::write);
    }

    /** Writes the whole object; the writer is left open. */
    public static void write(Iterable<CaseResult> results, Writer out, Origin origin) {
        try (Output<CaseResult> json = to(out, origin)) {
            results.forEach(json::add);
            json.finish();
        }
    }
}
