package stirwright.core.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import stirwright.core.CaseRefusedException;
import stirwright.core.CaseSpec;
import stirwright.core.Catalogue;
import stirwright.core.Choices;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Correlation;
import stirwright.correlation.Family;
import stirwright.correlation.Quantity;

/** Applies what the catalogue holds for a family to one vessel. */
final class Candidates {
    private static final Set<Quantity> COUPLED =
            Set.of(Quantity.POWER_NUMBER, Quantity.SHEAR_RATE_CONSTANT, Quantity.FLOW_NUMBER);

    private final Catalogue catalogue;
    private final Family family;
    private final VesselGeometry vessel;
    private final Choices choices;

    Candidates(Catalogue catalogue, Family family, VesselGeometry vessel, CaseSpec spec) {
        this.catalogue = catalogue;
        this.family = family;
        this.vessel = vessel;
        this.choices = spec.choices();
    }

    /** The quantities that rest on power, shear rate and flow, for instance the blend time. */
    List<Quantity> furtherQuantities() {
        return catalogue.quantities(family.id()).stream().filter(q -> !COUPLED.contains(q)).toList();
    }

    /**
     * Every candidate for a quantity, a given value first.
     *
     * @throws CaseRefusedException when the case asks for a correlation that is not there
     */
    List<Candidate> of(Quantity quantity) {
        List<Correlation> correlations = catalogue.correlations(quantity, family.id());
        choices.correlation(quantity).ifPresent(id -> {
            if (correlations.stream().noneMatch(c -> c.id().equals(id))) {
                throw new CaseRefusedException(Choices.field(quantity), id, "is not a correlation for the "
                        + quantity.title() + " of family " + family.id() + "; installed: "
                        + String.join(", ", correlations.stream().map(Correlation::id).toList())
                        + Choices.published(id).filter(base -> !choices.constants().containsKey(base)).map(base ->
                                "; " + id + " exists only while the case changes constants of " + base).orElse(""));
            }
        });
        Modifiers modifiers = new Modifiers(catalogue.modifiers(quantity, family.id()), vessel);
        List<Candidate> candidates = new ArrayList<>();
        choices.given(quantity).ifPresent(value -> candidates.add(Candidate.given(quantity, value, vessel)));
        correlations.forEach(c -> candidates.add(Candidate.of(c, modifiers, choices.effectsLeftOut(), vessel)
                .changedInCase(Choices.published(c.id()).filter(choices.constants()::containsKey).isPresent())));
        return candidates;
    }
}
