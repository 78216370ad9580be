package stirwright.core.internal;

import java.util.IdentityHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Correlation;
import stirwright.correlation.GeometryParameter;

/**
 * The modifiers of one quantity at one vessel. Whether one applies is asked once and not again for
 * each candidate; what fails to answer is asked again, so that it costs each candidate on its own.
 */
final class Modifiers {
    private final List<Correlation> all;
    private final VesselGeometry vessel;
    private final Map<Correlation, Answer> answers = new IdentityHashMap<>();

    /** @param defaultsRead the dimensions that nobody gave and on which the answer rests */
    private record Answer(boolean applies, Set<GeometryParameter> defaultsRead) {}

    /** @param all the most recommendable first */
    Modifiers(List<Correlation> all, VesselGeometry vessel) {
        this.all = all;
        this.vessel = vessel;
    }

    List<Correlation> all() {
        return all;
    }

    /** @param defaultsRead receives the dimensions that nobody gave and on which the answer rests */
    boolean applies(Correlation modifier, Set<GeometryParameter> defaultsRead) {
        Answer answer = answers.get(modifier);
        if (answer == null) {
            answer = ask(modifier);
            answers.put(modifier, answer);
        }
        defaultsRead.addAll(answer.defaultsRead());
        return answer.applies();
    }

    private Answer ask(Correlation modifier) {
        Set<GeometryParameter> askedFor = new LinkedHashSet<>();
        boolean applies = modifier.appliesTo(vessel.recordingDefaults(askedFor));
        if (!applies) {
            // The standard geometry is where no modifier applies, so that nothing rests on its having been assumed.
            askedFor.removeIf(p -> vessel.defaultKind(p) == GeometryParameter.Default.ASSUMED);
        }
        return new Answer(applies, askedFor);
    }
}
