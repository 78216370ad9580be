package stirwright.console.internal;

import java.io.PrintWriter;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.Map;
import stirwright.core.CandidateResult;
import stirwright.core.CaseResult;
import stirwright.core.SpeedDemand;
import stirwright.core.Status;
import stirwright.correlation.Figures;
import stirwright.exchange.CaseEntry;
import stirwright.rheology.Fluid;

/** Closes a cross-check: how many cases came out how, and who needs the least power for one target. */
final class Summary {

    /** Cases that ask for the same shear rate of the same fluid compete. */
    private record Contest(double shearRate, Fluid fluid) {}

    private record Entrant(String name, String family, CandidateResult pick) {}

    private final Map<Status, Integer> counts = new EnumMap<>(Status.class);
    private final Map<Contest, Entrant> least = new LinkedHashMap<>();
    private final Map<Contest, Integer> entrants = new LinkedHashMap<>();

    void add(CaseEntry entry, CaseResult result) {
        counts.merge(result.status(), 1, Integer::sum);
        entry.spec().ifPresent(spec -> {
            if (spec.speed() instanceof SpeedDemand.ForShearRate demand && result.pick().isPresent()) {
                Contest contest = new Contest(demand.value(), spec.fluid());
                Entrant entrant = new Entrant(entry.name(), result.family(), result.pick().get());
                entrants.merge(contest, 1, Integer::sum);
                least.merge(contest, entrant, (a, b) -> b.pick().power() < a.pick().power() ? b : a);
            }
        });
    }

    /** The worst status of any case; ok when there is none. */
    Status worst() {
        return counts.keySet().stream().reduce(Status.OK, Status::worseOf);
    }

    void print(PrintWriter out) {
        StringBuilder text = new StringBuilder();
        least.forEach((contest, best) -> {
            if (entrants.get(contest) > 1) {
                Columns.appendWrapped(text, "", "Least power for " + Figures.show(contest.shearRate()) + " 1/s among "
                        + entrants.get(contest) + " cases with this fluid: " + best.name() + " (" + best.family() + "), "
                        + Figures.show(best.pick().power()) + " W at "
                        + best.pick().state().map(s -> Figures.show(s.speed())).orElse("?") + " rev/s by "
                        + best.pick().correlation() + ".", CaseView.WIDTH);
            }
        });
        Columns.appendWrapped(text, "", "Cases: " + count(Status.OK) + " ok, " + count(Status.FLAGGED) + " flagged, "
                + count(Status.REFUSED) + " refused. > recommended, * chosen in the case, x excluded.", CaseView.WIDTH);
        out.print(text);
        out.flush();
    }

    private int count(Status status) {
        return counts.getOrDefault(status, 0);
    }
}
