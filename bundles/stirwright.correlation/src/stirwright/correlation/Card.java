package stirwright.correlation;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;

/** What a correlation says of itself. The builder fills one in; a correlation keeps a copy of its own. */
final class Card {
    String id;
    final Quantity quantity;
    final Optional<Effect> modifierFor;
    final String title;
    final List<Bound> validity;
    final Set<Effect> contains;
    final Set<Variable> reads;
    final Set<String> families;
    List<String> remarks;
    Applicability applicability = Applicability.ALWAYS;
    ReynoldsDefinition reynolds = ReynoldsDefinition.METZNER_OTTO;
    Optional<String> belongsWith = Optional.empty();
    OptionalDouble scatter = OptionalDouble.empty();
    Standing standing = Standing.PUBLISHED;
    Optional<FlowKind> flowKind = Optional.empty();
    boolean laminarLimit;
    Citation citation;
    Transcription transcription;
    String formula;
    Relation relation;
    Constants constants;

    Card(String id, Quantity quantity, Optional<Effect> modifierFor, String title) {
        this.id = id;
        this.quantity = quantity;
        this.modifierFor = modifierFor;
        this.title = title;
        validity = new ArrayList<>();
        contains = new LinkedHashSet<>();
        reads = new LinkedHashSet<>();
        families = new LinkedHashSet<>();
        remarks = new ArrayList<>();
    }

    /** A copy whose lists and sets cannot be changed. */
    Card(Card from) {
        id = from.id;
        quantity = from.quantity;
        modifierFor = from.modifierFor;
        title = from.title;
        validity = List.copyOf(from.validity);
        contains = Collections.unmodifiableSet(new LinkedHashSet<>(from.contains));
        reads = Collections.unmodifiableSet(new LinkedHashSet<>(from.reads));
        families = Collections.unmodifiableSet(new LinkedHashSet<>(from.families));
        remarks = List.copyOf(from.remarks);
        applicability = from.applicability;
        reynolds = from.reynolds;
        belongsWith = from.belongsWith;
        scatter = from.scatter;
        standing = from.standing;
        flowKind = from.flowKind;
        laminarLimit = from.laminarLimit;
        citation = from.citation;
        transcription = from.transcription;
        formula = from.formula;
        relation = from.relation;
        constants = from.constants;
    }

    void demandId() {
        demand(id.matches("[a-z][a-z0-9]*(\\.[a-z0-9]+(-[a-z0-9]+)*)+"),
                "the id must be lower-case words joined by '.' and '-'");
    }

    void demand(boolean met, String otherwise) {
        if (!met) {
            throw new ContractException("correlation '" + id + "': " + otherwise);
        }
    }
}
