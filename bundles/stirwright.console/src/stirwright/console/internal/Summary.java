package stirwright.console.internal;

import java.io.PrintWriter;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
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

    private record Entrant(String name, CandidateResult pick) {
        String words() {
            return CaseView.shortened(name) + ", " + Figures.show(pick.power()) + " W at "
                    + pick.state().map(s -> Figures.show(s.speed())).orElse("?") + " rev/s";
        }
    }

    private final Map<Status, Integer> counts = new EnumMap<>(Status.class);
    private final Map<Contest, List<Entrant>> contests = new LinkedHashMap<>();

    void add(CaseEntry entry, CaseResult result) {
        counts.merge(result.status(), 1, Integer::sum);
        entry.spec().ifPresent(spec -> {
            if (spec.speed() instanceof SpeedDemand.ForShearRate demand && result.pick().isPresent()) {
                contests.computeIfAbsent(new Contest(demand.value(), spec.fluid()), c -> new ArrayList<>())
                        .add(new Entrant(entry.name(), result.pick().get()));
            }
        });
    }

    /** The worst status of any case; ok when there is none. */
    Status worst() {
        return counts.keySet().stream().reduce(Status.OK, Status::worseOf);
    }

    void print(PrintWriter out) {
        StringBuilder text = new StringBuilder();
        contests.forEach((contest, entrants) -> {
            if (entrants.size() > 1) {
                entrants.sort(Comparator.comparingDouble(e -> e.pick().power()));
                Columns.appendWrapped(text, "", "Least power for " + Figures.show(contest.shearRate()) + " 1/s among "
                        + entrants.size() + " cases with this fluid: " + entrants.get(0).words() + "; next "
                        + entrants.get(1).words() + ". Through the speed, power rests on the shear-rate constant up to its"
                        + " third power: see what each case says of its constant.", CaseView.WIDTH);
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
