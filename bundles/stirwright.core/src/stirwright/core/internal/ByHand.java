package stirwright.core.internal;

import java.util.ArrayList;
import java.util.List;
import stirwright.core.CaseSpec;
import stirwright.core.Catalogue;
import stirwright.core.Choices;
import stirwright.correlation.Correlation;

/** What a case settles about effects and constants, told with the pick. */
final class ByHand {
    private final CaseSpec spec;
    private final Catalogue catalogue;
    private final List<Candidate> picks;

    ByHand(CaseSpec spec, Catalogue catalogue, ResultAssembly.Row pickRow) {
        this.spec = spec;
        this.catalogue = catalogue;
        this.picks = pickRow.picks();
    }

    List<String> notes() {
        if (spec.choices().effectsLeftOut().isEmpty() && spec.choices().constants().isEmpty()) {
            return List.of();
        }
        List<String> notes = new ArrayList<>();
        // Where a factor is left out, the row's own notes say so.
        spec.choices().effectsLeftOut().stream()
                .filter(effect -> picks.stream().noneMatch(c -> c.leavesOut(effect)))
                .forEach(effect -> notes.add(Choices.EFFECTS_LEFT_OUT + " " + effect + ": " + without(effect)));
        notes.addAll(Settled.notes(catalogue, spec.choices(), spec.familyId()));
        return notes;
    }

    /** Why nothing is left out. */
    private String without(String effect) {
        List<String> containing = picks.stream().flatMap(c -> c.correlation().stream())
                .filter(c -> c.contains().stream().anyMatch(e -> e.id().equals(effect)))
                .map(Correlation::id).toList();
        return containing.isEmpty() ? "no factor for it applies here, so nothing is left out"
                : "part of " + String.join(" and ", containing) + " itself, so it cannot be left out";
    }
}
