package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import stirwright.core.Status;
import stirwright.equinox.tests.WorkedExamples.Answer;
import stirwright.exchange.CaseEntry;

/** Worked examples of books through the case table, with all that is installed. No coefficient is bent to fit. */
class WorkedExamplesTest {

    /** The examples of our list that concern a vessel with an impeller. */
    private static final Set<Integer> EXAMPLES =
            Set.of(1, 2, 3, 5, 7, 8, 9, 11, 14, 16, 17, 18, 19, 20, 21, 23, 24, 25, 26, 27);

    /** Where the book read its power number off a chart, the pick may be so far off. */
    private static final double WIDEST = 0.15;

    private static WorkedExamples examples;

    @BeforeAll
    static void compute() {
        examples = WorkedExamples.computed();
    }

    static List<Answer> computedAnswers() throws IOException {
        return WorkedExamples.answers().stream().filter(answer -> !answer.isLeftOut()).toList();
    }

    static List<Answer> answersLeftOut() throws IOException {
        return WorkedExamples.answers().stream().filter(Answer::isLeftOut).toList();
    }

    @ParameterizedTest
    @MethodSource("computedAnswers")
    void theBooksAnswerComesOut(Answer answer) {
        double expected = Double.parseDouble(answer.expected());
        double within = Double.parseDouble(answer.within());
        assertTrue(expected > 0 && within > 0 && within <= WIDEST, () -> "cannot be compared: " + answer);
        NamedCsvRecord row = examples.row(answer).orElseThrow(
                () -> new AssertionError("no such row for " + answer + "; " + examples.says(answer.name())));
        if (answer.isOfThePick()) {
            assertEquals("recommended", row.getField("role"), () -> "the pick is not recommended: " + row);
        }
        double found = Double.parseDouble(row.getField(WorkedExamples.column(answer)));
        assertEquals(expected, found, within * expected, () -> answer.source() + "; " + row);
    }

    @ParameterizedTest
    @MethodSource("answersLeftOut")
    void whatIsLeftOutSaysWhy(Answer answer) {
        assertTrue(answer.source().length() > "[a] Example 1: ".length(), answer::source);
        assertEquals("", answer.name() + answer.correlation() + answer.expected() + answer.within());
    }

    @Test
    void everyExampleIsThere() throws IOException {
        assertEquals(new TreeSet<>(EXAMPLES), WorkedExamples.answers().stream().map(Answer::example)
                .collect(Collectors.toCollection(TreeSet::new)));
        assertEquals(Set.of("printed", "worked", "none"),
                WorkedExamples.answers().stream().map(Answer::kind).collect(Collectors.toSet()));
    }

    @Test
    void everyCaseIsReadAndAnswered() throws IOException {
        List<String> names = examples.table().entries().stream().map(CaseEntry::name).toList();
        assertEquals(new TreeSet<>(names), computedAnswers().stream().map(Answer::name)
                .collect(Collectors.toCollection(TreeSet::new)));
        assertEquals(List.of(), examples.table().messages().stream().filter(m -> m.contains("ignored")).toList());
    }

    @Test
    void noneIsRefused() {
        assertEquals(List.of(), examples.results().stream()
                .filter(row -> row.getField("status").equals(Status.REFUSED.id())).toList());
    }
}
