package stirwright.core.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.SortedSet;
import stirwright.core.CaseRefusedException;
import stirwright.core.Catalogue;
import stirwright.core.Choices;
import stirwright.core.Entry;
import stirwright.correlation.Constants;
import stirwright.correlation.Correlation;
import stirwright.correlation.Figures;

/** What a case settles about correlations themselves: whether it speaks of what is installed, and what comes of it. */
final class Settled {

    private Settled() {}

    /**
     * What is installed, and beside it each correlation of which the case changes constants.
     *
     * @throws CaseRefusedException naming the effect, the correlation or the constant that is not there
     */
    static Catalogue catalogue(Catalogue installed, Choices choices) {
        requireEffects(installed, choices);
        if (choices.constants().isEmpty()) {
            return installed;
        }
        List<Entry> changed = new ArrayList<>();
        choices.constants().forEach((id, values) -> changed.add(changed(installed, id, values)));
        return installed.with(changed);
    }

    private static void requireEffects(Catalogue installed, Choices choices) {
        if (choices.effectsLeftOut().isEmpty()) {
            return;
        }
        SortedSet<String> known = installed.effects();
        for (String effect : choices.effectsLeftOut()) {
            if (!known.contains(effect)) {
                throw new CaseRefusedException(Choices.EFFECTS_LEFT_OUT, effect, "names '" + effect
                        + "', which is no effect of any installed correlation; there are " + String.join(", ", known));
            }
        }
    }

    private static Entry changed(Catalogue installed, String id, Map<String, Double> values) {
        Entry entry = installed.entry(id).orElseThrow(() -> refused(id, "which is no installed correlation;"
                + " 'candidates' lists them with their constants"));
        Correlation correlation = entry.correlation();
        if (correlation.modifierFor().isPresent()) {
            throw refused(id, "which is a factor and not a candidate of its own; leave its effect '"
                    + correlation.modifierFor().get().id() + "' out in " + Choices.EFFECTS_LEFT_OUT + " instead");
        }
        if (installed.entry(Choices.changed(id)).isPresent()) {
            throw refused(id, "of which a changed form is installed as " + Choices.changed(id) + "; use that");
        }
        Constants constants = correlation.constants();
        for (Map.Entry<String, Double> value : values.entrySet()) {
            if (!constants.names().contains(value.getKey())) {
                throw refused(id, "which has no constant '" + value.getKey() + "'; "
                        + (constants.names().isEmpty() ? "it has none" : "it has " + inWords(constants)));
            }
            constants = constants.with(value.getKey(), value.getValue());
        }
        return new Entry(correlation.variant(Choices.changed(id), constants), entry.origin());
    }

    private static CaseRefusedException refused(String id, String why) {
        return new CaseRefusedException(Choices.CONSTANTS, id, "names '" + id + "', " + why);
    }

    private static String inWords(Constants constants) {
        return String.join(", ", constants.names().stream()
                .map(name -> name + " = " + Figures.show(constants.get(name))).toList());
    }

    /** What the case makes of each correlation that it changes, a sentence each. */
    static List<String> notes(Catalogue catalogue, Choices choices, String familyId) {
        List<String> notes = new ArrayList<>();
        choices.constants().forEach((id, values) -> catalogue.entry(id).ifPresent(entry -> {
            Correlation published = entry.correlation();
            notes.add(published.holdsFor(familyId)
                    ? "constants changed in the case: " + Choices.changed(id) + " has "
                            + String.join(", ", values.entrySet().stream().map(v -> v.getKey() + " = "
                                    + Figures.show(v.getValue()) + " in place of "
                                    + Figures.show(published.constants().get(v.getKey()))).toList())
                    : "constants changed in the case: " + id + " is not for family " + familyId + ", so nothing follows");
        }));
        return notes;
    }
}
