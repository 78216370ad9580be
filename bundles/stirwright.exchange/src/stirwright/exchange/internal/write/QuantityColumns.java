package stirwright.exchange.internal.write;

import static stirwright.exchange.internal.write.Column.number;
import static stirwright.exchange.internal.write.Column.text;
import static stirwright.exchange.internal.write.Column.words;

import java.util.List;
import java.util.function.Function;
import java.util.stream.Stream;
import stirwright.core.CaseResult;
import stirwright.core.QuantityResult;
import stirwright.correlation.Correlation;

/** The columns of the candidate table: every correlation for every quantity of a case. */
public final class QuantityColumns {

    /** A case and one correlation for one of its quantities. */
    public record Row(String caseName, QuantityResult quantity) {}

    /** What belongs to one quantity's correlation. */
    static final List<Column<QuantityResult>> OF_QUANTITY = columns(q -> q);

    public static final List<Column<Row>> ALL = Stream.concat(
            Stream.of(text("case", Row::caseName)), QuantityColumns.<Row>columns(Row::quantity).stream()).toList();

    private QuantityColumns() {}

    public static List<Row> rows(CaseResult result) {
        return result.quantities().stream().map(q -> new Row(result.name(), q)).toList();
    }

    private static <R> List<Column<R>> columns(Function<R, QuantityResult> of) {
        return List.of(
                text("quantity", r -> of.apply(r).quantity().id()),
                text("correlation", r -> of.apply(r).id()),
                number("value", r -> of.apply(r).value()),
                text("role", r -> of.apply(r).role().id()),
                text("verdict", r -> of.apply(r).verdict().id()),
                words("failed_bounds", r -> of.apply(r).failedBounds()),
                source("source", of, c -> c.citation().toString()),
                source("transcription", of, c -> c.transcription().words()),
                source("standing", of, c -> c.standing().words()),
                text("why", r -> of.apply(r).why()));
    }

    /** Empty for a value that the case gives. */
    private static <R> Column<R> source(String name, Function<R, QuantityResult> of, Function<Correlation, String> words) {
        return text(name, r -> of.apply(r).correlation().map(words).orElse(""));
    }
}
