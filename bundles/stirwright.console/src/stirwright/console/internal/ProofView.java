package stirwright.console.internal;

import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import stirwright.conformance.BundleReport;
import stirwright.conformance.Proof;

/** What the conformance suite found in a bundle, and what holds each of its correlations up, laid out for reading. */
final class ProofView {
    /** The groups of reference rows, those from outside first. */
    private static final List<String> GROUPS = List.of("printed", "second author", "independent", "by hand", "from memory");

    private ProofView() {}

    static void append(StringBuilder text, BundleReport report) {
        if (!report.proofs().isEmpty()) {
            Columns table = new Columns("l" + "r".repeat(GROUPS.size() + 1));
            table.add(Stream.of(Stream.of("rows by source of the number"), GROUPS.stream(), Stream.of("worst"))
                    .flatMap(s -> s).toArray(String[]::new));
            report.proofs().forEach(proof -> add(table, proof));
            table.appendTo(text, "", CaseView.WIDTH);
        }
        report.findings().forEach(f -> Columns.appendWrapped(text, "", f.toString(), CaseView.WIDTH));
        Columns.appendWrapped(text, "", report.bundle() + ": " + count(report.families().size(), "family", "families") + ", "
                + count(report.correlations().size(), "correlation", "correlations") + ", "
                + count(report.rows(), "reference row", "reference rows") + " compared"
                + (report.recalledRows() > 0 ? ", " + report.recalledRows() + " of them recalled; " : "; ")
                + (report.passed() ? "it conforms." : count(report.findings().size(), "finding", "findings") + "."),
                CaseView.WIDTH);
        text.append('\n');
    }

    private static void add(Columns table, Proof proof) {
        Stream<String> counts = GROUPS.stream().map(group -> proof.counts().getOrDefault(group, 0))
                .map(count -> count == 0 ? "-" : Integer.toString(count));
        String worst = proof.rows().isEmpty() ? "-" : String.format(Locale.ROOT, "%.1f %%", 100 * proof.worstDeviation());
        table.add(Stream.of(Stream.of(proof.correlation().id()), counts, Stream.of(worst)).flatMap(s -> s)
                .toArray(String[]::new));
        if (!proof.hasRowFromOutside()) {
            table.under("no number from outside: " + proof.lack().orElse("its reference file does not say why"));
        }
    }

    private static String count(int number, String one, String many) {
        return number + " " + (number == 1 ? one : many);
    }
}
