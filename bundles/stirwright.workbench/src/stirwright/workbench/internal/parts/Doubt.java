package stirwright.workbench.internal.parts;

import java.util.List;
import java.util.Optional;
import org.eclipse.swt.graphics.Color;
import stirwright.chart.Palette;
import stirwright.core.CandidateResult;
import stirwright.core.CaseResult;
import stirwright.correlation.Correlation;
import stirwright.correlation.Quantity;
import stirwright.correlation.Transcription;
import stirwright.correlation.Verdict;
import stirwright.workbench.internal.Messages;

/**
 * Why a figure is less sure than it looks.
 *
 * @param word as among the candidates; empty where there is nothing to say
 * @param reason which correlation is meant, and what speaks against it
 */
record Doubt(Verdict verdict, String word, String reason) {
    static final Doubt NONE = new Doubt(Verdict.INSIDE, "", "");

    /** Of the power number. */
    static Doubt of(CandidateResult pick, Optional<Correlation> correlation) {
        return of(pick.verdict(), pick.failedBounds(), correlation);
    }

    /** Of another quantity's value by the correlation that the pick uses for it. */
    static Doubt of(CaseResult result, Quantity quantity, String correlationId) {
        return result.quantities().stream().filter(q -> q.quantity().equals(quantity) && q.id().equals(correlationId)).findFirst()
                .map(q -> of(q.verdict(), q.failedBounds(), q.correlation())).orElse(NONE);
    }

    private static Doubt of(Verdict verdict, List<String> failedBounds, Optional<Correlation> correlation) {
        String title = correlation.map(Correlation::title).orElse(Messages.Row_given);
        if (verdict.fails()) {
            return new Doubt(verdict, CandidateColumn.verdict(verdict),
                    Messages.bind(Messages.Strip_doubtReason, title, String.join("; ", failedBounds)));
        }
        return correlation.filter(c -> c.transcription() == Transcription.UNSURE)
                .map(c -> new Doubt(Verdict.NEAR, Messages.Digits_unsure,
                        Messages.bind(Messages.Strip_doubtReason, title, c.transcription().words())))
                .orElse(NONE);
    }

    boolean none() {
        return word.isEmpty();
    }

    /** That of the word. */
    Color colour(Palette palette) {
        return CandidateColumn.colour(verdict, palette);
    }
}
