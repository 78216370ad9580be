package stirwright.core;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.concurrent.ConcurrentHashMap;
import stirwright.core.internal.Ranking;
import stirwright.correlation.Correlation;
import stirwright.correlation.Effect;
import stirwright.correlation.Family;
import stirwright.correlation.Quantity;

/** The families and correlations that were installed at one moment. Immutable. */
public final class Catalogue {
    private final Map<String, Family> families = new LinkedHashMap<>();
    private final Map<String, Entry> entries = new LinkedHashMap<>();
    private final Map<String, String> familyOrigins = new LinkedHashMap<>();
    private final Map<String, String> units = new HashMap<>();
    private final List<String> problems = new ArrayList<>();

    /** What is asked for in every case, found once. */
    private final Map<Wanted, List<Correlation>> chosen = new ConcurrentHashMap<>();
    private final Map<String, List<Quantity>> quantities = new ConcurrentHashMap<>();

    private record Wanted(Quantity quantity, String familyId, boolean modifiers) {}

    private Catalogue() {}

    /**
     * Collects contributions in their order. Of two with one id the first is kept, and a problem
     * names both bundles; a contribution that fails is left out, and a problem says why.
     */
    public static Catalogue of(List<Arrival> arrivals) {
        Catalogue catalogue = new Catalogue();
        arrivals.forEach(catalogue::take);
        return catalogue;
    }

    /** The same with further correlations, of which none has the id of one that is here. */
    public Catalogue with(List<Entry> further) {
        Catalogue wider = new Catalogue();
        wider.families.putAll(families);
        wider.familyOrigins.putAll(familyOrigins);
        wider.units.putAll(units);
        wider.problems.addAll(problems);
        wider.entries.putAll(entries);
        further.forEach(entry -> wider.entries.put(entry.correlation().id(), entry));
        return wider;
    }

    private void take(Arrival arrival) {
        arrival.failure().ifPresent(failure -> problems.add(arrival.origin() + " was left out: " + failure));
        for (Family family : arrival.families()) {
            if (keepsFirst("family", family.id(), familyOrigins.get(family.id()), arrival.origin())) {
                families.put(family.id(), family);
                familyOrigins.put(family.id(), arrival.origin());
            }
        }
        for (Correlation correlation : arrival.correlations()) {
            Entry first = entries.get(correlation.id());
            if (keepsFirst("correlation", correlation.id(), first == null ? null : first.origin(), arrival.origin())) {
                entries.put(correlation.id(), new Entry(correlation, arrival.origin()));
                compareUnit(correlation.quantity(), arrival.origin());
            }
        }
    }

    /** Equal ids are the same quantity, so they must have the same unit. */
    private void compareUnit(Quantity quantity, String origin) {
        String first = units.putIfAbsent(quantity.id(), quantity.unit());
        if (first != null && !first.equals(quantity.unit())) {
            problems.add("quantity '" + quantity.id() + "' is in '" + first + "', but " + origin + " gives it in '"
                    + quantity.unit() + "'");
        }
    }

    private boolean keepsFirst(String what, String id, String firstOrigin, String origin) {
        if (firstOrigin == null) {
            return true;
        }
        problems.add(what + " '" + id + "' comes from " + firstOrigin + " and again from " + origin
                + "; the first is used");
        return false;
    }

    public Optional<Family> family(String id) {
        return Optional.ofNullable(families.get(id));
    }

    public Collection<Family> families() {
        return Collections.unmodifiableCollection(families.values());
    }

    /** The bundle that described a family. */
    public String originOf(Family family) {
        return familyOrigins.getOrDefault(family.id(), "");
    }

    public Collection<Entry> entries() {
        return Collections.unmodifiableCollection(entries.values());
    }

    public Optional<Entry> entry(String correlationId) {
        return Optional.ofNullable(entries.get(correlationId));
    }

    /** The quantities for which a family has correlations, by id. */
    public List<Quantity> quantities(String familyId) {
        return quantities.computeIfAbsent(familyId, id -> entries.values().stream()
                .map(Entry::correlation)
                .filter(c -> c.holdsFor(id) && c.modifierFor().isEmpty())
                .map(Correlation::quantity)
                .distinct()
                .sorted(Comparator.comparing(Quantity::id))
                .toList());
    }

    /** The correlations for a quantity of a family, modifiers aside, the most recommendable first. */
    public List<Correlation> correlations(Quantity quantity, String familyId) {
        return choose(new Wanted(quantity, familyId, false));
    }

    /** The modifiers of a quantity of a family, the most recommendable first. */
    public List<Correlation> modifiers(Quantity quantity, String familyId) {
        return choose(new Wanted(quantity, familyId, true));
    }

    private List<Correlation> choose(Wanted wanted) {
        return chosen.computeIfAbsent(wanted, w -> entries.values().stream()
                .map(Entry::correlation)
                .filter(c -> c.quantity().equals(w.quantity()) && c.holdsFor(w.familyId())
                        && c.modifierFor().isPresent() == w.modifiers())
                .sorted(w.modifiers() ? Ranking.MODIFIERS : Ranking.BY_TRUST)
                .toList());
    }

    /** The ids of the effects that any correlation speaks of, as a factor's or as contained. */
    public SortedSet<String> effects() {
        SortedSet<String> ids = new TreeSet<>();
        for (Entry entry : entries.values()) {
            entry.correlation().modifierFor().map(Effect::id).ifPresent(ids::add);
            entry.correlation().contains().forEach(effect -> ids.add(effect.id()));
        }
        return ids;
    }

    /** What is wrong with the installed contributions, a sentence each. */
    public List<String> problems() {
        return Collections.unmodifiableList(problems);
    }
}
