package stirwright.core.internal;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Bound;
import stirwright.correlation.BoundCorrelation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.Effect;
import stirwright.correlation.Figures;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Quantity;
import stirwright.correlation.ReynoldsDefinition;
import stirwright.correlation.Variable;
import stirwright.correlation.Verdict;

/**
 * A correlation, or a given value, applied to one geometry together with the modifiers for the
 * effects that it does not contain. Not thread-safe.
 *
 * <p>What correlations compute is code of other bundles: whatever it throws becomes a value that is
 * no number and a {@link #failure}, so that one bad contribution costs its own candidate alone.
 */
final class Candidate {

    /** What results call a value that the user gave. */
    static final String GIVEN = "given";

    private final Quantity quantity;
    private final Optional<Correlation> correlation;
    private final List<Part> parts;
    private final Set<Variable> reads;
    private final Geometry geometry;
    private final Set<GeometryParameter> defaultsRead;
    private String failure = "";
    private String distrust;
    private double givenValue = Double.NaN;

    /** One factor: a correlation bound to the geometry. */
    record Part(Correlation correlation, BoundCorrelation bound) {

        /** The Reynolds number that this correlation means, from that of Metzner and Otto. */
        double reynolds(FluidState state, double reynolds) {
            ReynoldsDefinition definition = correlation.reynoldsDefinition();
            return definition.equals(ReynoldsDefinition.METZNER_OTTO)
                    ? reynolds : reynolds * state.reynolds(definition) / state.reynolds();
        }
    }

    private Candidate(
            Quantity quantity, Optional<Correlation> correlation, List<Part> parts, Geometry geometry,
            Set<GeometryParameter> defaultsRead) {
        this.quantity = quantity;
        this.correlation = correlation;
        this.parts = parts;
        this.geometry = geometry;
        this.defaultsRead = defaultsRead;
        this.reads = parts.size() == 1 ? parts.get(0).correlation().reads() : reads(parts);
    }

    private static Set<Variable> reads(List<Part> parts) {
        Set<Variable> all = new LinkedHashSet<>();
        parts.forEach(p -> all.addAll(p.correlation().reads()));
        return all;
    }

    /** Applies a correlation with, for each effect that it lacks, the first of the modifiers. */
    static Candidate of(Correlation correlation, List<Correlation> modifiers, VesselGeometry vessel) {
        Set<GeometryParameter> defaultsRead = new LinkedHashSet<>();
        Geometry geometry = vessel.recordingDefaults(defaultsRead);
        List<Part> parts = new ArrayList<>();
        String failure = "";
        try {
            parts.add(new Part(correlation, correlation.bind(geometry)));
            Set<Effect> done = modifiers.isEmpty() ? Set.of() : new LinkedHashSet<>(correlation.contains());
            for (Correlation modifier : modifiers) {
                Effect effect = modifier.modifierFor().orElseThrow();
                if (!done.contains(effect) && modifier.appliesTo(geometry)) {
                    parts.add(new Part(modifier, modifier.bind(geometry)));
                    done.add(effect);
                    done.addAll(modifier.contains());
                }
            }
        } catch (RuntimeException | LinkageError broken) {
            // See the class comment: code of another bundle.
            failure = String.valueOf(broken);
        }
        Candidate candidate = new Candidate(
                correlation.quantity(), Optional.of(correlation), parts, geometry, defaultsRead);
        candidate.failure = failure;
        return candidate;
    }

    /** A value that the user gave: a total, so no modifier touches it. */
    static Candidate given(Quantity quantity, double value, VesselGeometry vessel) {
        Candidate candidate = new Candidate(quantity, Optional.empty(), List.of(), vessel, Set.of());
        candidate.givenValue = value;
        return candidate;
    }

    String id() {
        return correlation.map(Correlation::id).orElse(GIVEN);
    }

    Quantity quantity() {
        return quantity;
    }

    Optional<Correlation> correlation() {
        return correlation;
    }

    /** The correlation and the modifiers applied to it; empty for a given value. */
    List<Part> parts() {
        return parts;
    }

    Geometry geometry() {
        return geometry;
    }

    /** The dimensions that nobody gave and on which its bounds and its value rest, as far as evaluated. */
    Set<GeometryParameter> defaultsRead() {
        return defaultsRead;
    }

    Set<Variable> reads() {
        return reads;
    }

    /** What keeps it from being recommended whatever the case; asked for at every state, found once. */
    String distrust() {
        if (distrust == null) {
            distrust = Trust.obstacle(this);
        }
        return distrust;
    }

    /** What the contributed code threw; empty when it did not. */
    String failure() {
        return failure;
    }

    /** The value at a state, all modifiers included. */
    double value(Point point, FluidState state) {
        return value(point, state, state.reynolds());
    }

    /** The value at another Reynolds number; like the verdict called in sweeps, so without iterators. */
    double value(Point point, FluidState state, double reynolds) {
        if (correlation.isEmpty()) {
            return givenValue;
        }
        if (!failure.isEmpty()) {
            return Double.NaN;
        }
        try {
            double value = 1;
            for (int i = 0; i < parts.size(); i++) {
                Part part = parts.get(i);
                value *= part.bound().at(point.set(Variable.REYNOLDS, part.reynolds(state, reynolds)));
            }
            return value;
        } catch (RuntimeException | LinkageError broken) {
            failure = String.valueOf(broken);
            return Double.NaN;
        }
    }

    /** The worst verdict over all bounds, without words. */
    Verdict verdict(Point point, FluidState state, double reynolds) {
        Verdict worst = correlation.isPresent() ? Verdict.INSIDE : Verdict.NOT_STATED;
        try {
            for (int i = 0; i < parts.size(); i++) {
                point.set(Variable.REYNOLDS, parts.get(i).reynolds(state, reynolds));
                List<Bound> bounds = parts.get(i).correlation().validity();
                for (int j = 0; j < bounds.size(); j++) {
                    worst = worst.worseOf(bounds.get(j).verdict(geometry, point));
                }
            }
            return worst;
        } catch (RuntimeException | LinkageError broken) {
            failure = String.valueOf(broken);
            return Verdict.OUTSIDE;
        }
    }

    /** The modifiers in words with the factor that each contributes. */
    List<String> modifiersInWords(Point point, FluidState state) {
        if (!failure.isEmpty()) {
            return List.of();
        }
        try {
            return parts.stream().skip(1).map(part -> inWords(part, point, state)).toList();
        } catch (RuntimeException | LinkageError broken) {
            failure = String.valueOf(broken);
            return List.of();
        }
    }

    private String inWords(Part part, Point point, FluidState state) {
        Correlation c = part.correlation();
        double factor = part.bound().at(point.set(Variable.REYNOLDS, part.reynolds(state, state.reynolds())));
        return c.modifierFor().orElseThrow().title() + ": " + quantity.title() + " times "
                + Figures.show(factor) + " by " + c.id()
                + (c.citation().hasSource() ? "" : " (" + c.citation() + ")");
    }

    /**
     * Whether the vessel is of a class for which the correlation was made: baffled or not, blade
     * count. Known before any state is.
     */
    boolean fitsVessel() {
        Point unknown = new Point();
        try {
            return parts.stream().flatMap(p -> p.correlation().validity().stream())
                    .filter(b -> b instanceof Bound.OneOf || b.subject().equals(Classifier.BAFFLING))
                    .noneMatch(b -> b.verdict(geometry, unknown).fails());
        } catch (RuntimeException | LinkageError broken) {
            failure = String.valueOf(broken);
            return false;
        }
    }
}
