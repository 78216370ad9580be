package stirwright.core.internal;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Correlation;
import stirwright.correlation.Effect;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;

/**
 * A correlation and the modifiers that go with it at one geometry.
 *
 * @param applied the correlation and, for each effect that it lacks, the first modifier
 * @param leftOut the modifiers that would be among them had the case not left their effects out
 */
record Factors(List<Candidate.Part> applied, List<Candidate.Part> leftOut) {
    static final Factors NONE = new Factors(List.of(), List.of());

    /**
     * @param effectsLeftOut ids
     * @param defaultsRead receives the dimensions that nobody gave and on which the applied ones rest
     */
    static Factors of(
            Correlation correlation, Modifiers modifiers, Set<String> effectsLeftOut, VesselGeometry vessel,
            Set<GeometryParameter> defaultsRead) {
        Geometry recording = vessel.recordingDefaults(defaultsRead);
        List<Candidate.Part> applied = new ArrayList<>();
        List<Candidate.Part> leftOut = new ArrayList<>();
        applied.add(new Candidate.Part(correlation, correlation.bind(recording)));
        Set<Effect> done = new LinkedHashSet<>(correlation.contains());
        for (Correlation modifier : modifiers.all()) {
            Effect effect = modifier.modifierFor().orElseThrow();
            if (done.contains(effect)) {
                continue;
            }
            if (effectsLeftOut.contains(effect.id())) {
                // On its own, so that a modifier that fails can be done without.
                Optional<Candidate.Part> part = new ForeignCode().call(() -> modifier.appliesTo(vessel)
                        ? Optional.of(new Candidate.Part(modifier, modifier.bind(vessel))) : Optional.empty(), Optional.empty());
                part.ifPresent(left -> {
                    leftOut.add(left);
                    done.add(effect);
                });
            } else if (modifiers.applies(modifier, defaultsRead)) {
                applied.add(new Candidate.Part(modifier, modifier.bind(recording)));
                done.add(effect);
                done.addAll(modifier.contains());
            }
        }
        return new Factors(applied, leftOut);
    }
}
