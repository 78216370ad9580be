package stirwright.core.internal;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import stirwright.correlation.Correlation;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Standing;

/**
 * The order of candidates as the contract page fixes it: approved in-house first, then fewer bounds
 * that are not stated, better transcription, a stated scatter before none and smaller before
 * larger, then id. Flow numbers that count discharge go before those that count circulation, since
 * the two are different quantities.
 */
public final class Ranking {

    /**
     * One criterion.
     *
     * @param label what is compared
     * @param words what a candidate has of it
     */
    private record Criterion(String label, Comparator<Correlation> order, Function<Correlation, String> words) {}

    private static final List<Criterion> CRITERIA = List.of(
            new Criterion("counts", Comparator.comparing(Ranking::countsCirculation),
                    c -> c.flowKind().map(FlowKind::id).orElse("")),
            new Criterion("standing", Comparator.comparing(c -> c.standing() != Standing.APPROVED), c -> c.standing().words()),
            new Criterion("bounds not stated", Comparator.comparingLong(Ranking::notStated), c -> String.valueOf(notStated(c))),
            new Criterion("digits", Comparator.comparing(Correlation::transcription), c -> c.transcription().words()),
            new Criterion("scatter", Comparator.comparingDouble(c -> c.scatter().orElse(Double.MAX_VALUE)), Ranking::scatterInWords),
            new Criterion("else equal, by id", Comparator.comparing(Correlation::id), Correlation::id));

    /** From the most to the least recommendable; says nothing of whether a candidate qualifies. */
    public static final Comparator<Correlation> BY_TRUST =
            CRITERIA.stream().map(Criterion::order).reduce(Comparator::thenComparing).orElseThrow();

    /** Of modifiers for one effect: those that can be trusted first, then those made for named families. */
    public static final Comparator<Correlation> MODIFIERS = Comparator.<Correlation, Boolean>comparing(c -> !Trust.in(c))
            .thenComparing(c -> c.families().isEmpty())
            .thenComparing(BY_TRUST);

    private static final double DOUBT = Math.log(2);

    /**
     * Among those that do not qualify, the nearest first; equal ones keep their order. One whose
     * digits, source or standing are in doubt counts as a factor of two beyond its bounds, and so does
     * one without a stated Reynolds range, which cannot be known to be near: better than a trusted one
     * that is far outside of its range, worse than one that is a little outside. What is in doubt
     * twice, silent or retired besides, comes after all that is not, and a rule of the trade without a source after that.
     */
    static final Comparator<Trial> NEAREST_FIRST = Comparator.<Trial, Boolean>comparing(t -> !t.usable())
            // What the case changed stands beside the published numbers and takes the place of one only when chosen.
            .thenComparing(t -> t.candidate().isChangedInCase())
            .thenComparing(t -> isCommonPractice(t.candidate()))
            .thenComparing(t -> t.candidate().doubts() > 1)
            .thenComparing(t -> t.candidate().correlation().map(Ranking::countsCirculation).orElse(false))
            .thenComparingDouble(t -> t.assessment().distance() + t.candidate().doubts() * Ranking.DOUBT)
            .thenComparingInt(t -> t.assessment().failureCount());

    private Ranking() {}

    /** What decided between two, the one ahead first: "bounds not stated 2 before 3". */
    static String difference(Correlation ahead, Correlation behind) {
        return CRITERIA.stream()
                .filter(c -> c.order().compare(ahead, behind) != 0)
                .findFirst()
                .map(c -> c.label() + " " + c.words().apply(ahead) + " before " + c.words().apply(behind))
                .orElse("equal");
    }

    /** A pumping rate means discharge unless nothing else is there. */
    private static boolean countsCirculation(Correlation correlation) {
        return correlation.flowKind().filter(FlowKind.CIRCULATION::equals).isPresent();
    }

    /** A rule of the trade. It is never recommended, and never the nearest beside anything published or given. */
    static boolean isCommonPractice(Candidate candidate) {
        return candidate.correlation().filter(c -> !c.citation().hasSource()).isPresent();
    }

    private static long notStated(Correlation correlation) {
        return correlation.validity().stream().filter(b -> !b.stated()).count();
    }

    private static String scatterInWords(Correlation correlation) {
        return correlation.scatter().isPresent()
                ? String.format(Locale.ROOT, "%.0f %%", 100 * correlation.scatter().getAsDouble())
                : "none stated";
    }
}
