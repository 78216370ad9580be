package stirwright.equinox.tests;

import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.io.StringWriter;
import java.nio.file.Files;
import java.util.List;
import java.util.Optional;
import stirwright.core.CaseResult;
import stirwright.core.Catalogue;
import stirwright.core.CrossCheck;
import stirwright.exchange.CandidateTable;
import stirwright.exchange.CaseTable;
import stirwright.exchange.ResultTable;

/** The worked examples of books: a case table, what the books answer, and the tables that come out. */
final class WorkedExamples {
    static final String CASES = "bundles/stirwright.equinox.tests/reference/worked-cases.csv";
    static final String ANSWERS = "bundles/stirwright.equinox.tests/reference/worked-answers.csv";

    /**
     * One answer of a book.
     *
     * @param correlation blank for the pick
     * @param quantity a column of the result table or the id of a quantity
     * @param kind printed, worked, or none for one that is left out
     * @param within relative
     * @param source or the reason why it is left out
     */
    record Answer(
            int example, String name, String correlation, String quantity, String kind, String expected, String within,
            String source) {

        static Answer of(NamedCsvRecord row) {
            return new Answer(Integer.parseInt(row.getField("example")), row.getField("case"), row.getField("correlation"),
                    row.getField("quantity"), row.getField("kind"), row.getField("expected"), row.getField("within"),
                    row.getField("source"));
        }

        boolean isLeftOut() {
            return kind.equals("none");
        }

        boolean isOfThePick() {
            return correlation.isEmpty();
        }

        @Override
        public String toString() {
            return name + ", " + quantity + " by " + (isOfThePick() ? "the pick" : correlation) + ": " + expected;
        }
    }

    private final CaseTable table;
    private final List<NamedCsvRecord> results;
    private final List<NamedCsvRecord> candidates;

    private WorkedExamples(CaseTable table, List<CaseResult> results) {
        this.table = table;
        StringWriter result = new StringWriter();
        ResultTable.write(results, result);
        this.results = records(result.toString());
        StringWriter candidate = new StringWriter();
        CandidateTable.write(results, candidate);
        this.candidates = records(candidate.toString());
    }

    /** Computes every case with what is installed. */
    static WorkedExamples computed() {
        Catalogue catalogue = Framework.catalogue();
        CaseTable table = CaseTable.read(SourceTree.root().resolve(CASES), catalogue);
        CrossCheck crossCheck = new CrossCheck(catalogue);
        return new WorkedExamples(table, table.entries().stream().map(entry -> entry.check(crossCheck)).toList());
    }

    static List<Answer> answers() throws IOException {
        return records(Files.readString(SourceTree.root().resolve(ANSWERS))).stream().map(Answer::of).toList();
    }

    private static List<NamedCsvRecord> records(String text) {
        return CsvReader.builder().commentStrategy(CommentStrategy.SKIP).ofNamedCsvRecord(text).stream().toList();
    }

    /** The result table. */
    List<NamedCsvRecord> results() {
        return results;
    }

    CaseTable table() {
        return table;
    }

    /** The row of a table that holds what an answer speaks of, in the column that {@link #column} says. */
    Optional<NamedCsvRecord> row(Answer answer) {
        boolean inResults = ResultTable.columns().contains(answer.quantity());
        return (inResults ? results : candidates).stream()
                .filter(row -> row.getField("case").equals(answer.name())
                        && (answer.isOfThePick() || row.getField("correlation").equals(answer.correlation()))
                        && (inResults || row.getField("quantity").equals(answer.quantity())))
                .findFirst();
    }

    static String column(Answer answer) {
        return ResultTable.columns().contains(answer.quantity()) ? answer.quantity() : "value";
    }

    /** What came out for a case, for messages. */
    String says(String name) {
        return results.stream().filter(row -> row.getField("case").equals(name)).map(NamedCsvRecord::toString)
                .findFirst().orElse("there is no such case");
    }
}
