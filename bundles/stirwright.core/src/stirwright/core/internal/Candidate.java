package stirwright.core.internal;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.core.VesselGeometry;
import stirwright.correlation.BoundCorrelation;
import stirwright.correlation.Correlation;
import stirwright.correlation.Effect;
import stirwright.correlation.Figures;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Quantity;
import stirwright.correlation.ReynoldsDefinition;
import stirwright.correlation.Variable;

/**
 * A correlation, or a given value, applied to one geometry together with the modifiers for the
 * effects that it does not contain.
 */
final class Candidate {

    /** What results call a value that the user gave. */
    static final String GIVEN = "given";

    private final Quantity quantity;
    private final Optional<Correlation> correlation;
    private final Part base;
    private final List<Part> modifiers;
    private final Geometry geometry;
    private final Set<GeometryParameter> defaultsRead;

    /** One factor: a correlation bound to the geometry, and the Reynolds number that it means. */
    private record Part(Optional<Correlation> correlation, BoundCorrelation bound, ReynoldsDefinition reynolds) {
        static Part of(Correlation correlation, Geometry geometry) {
            return new Part(Optional.of(correlation), correlation.bind(geometry), correlation.reynoldsDefinition());
        }

        double at(Point point, FluidState state) {
            return bound.at(point.set(Variable.REYNOLDS, state.reynolds(reynolds)));
        }
    }

    private Candidate(
            Quantity quantity, Optional<Correlation> correlation, Part base, List<Part> modifiers,
            Geometry geometry, Set<GeometryParameter> defaultsRead) {
        this.quantity = quantity;
        this.correlation = correlation;
        this.base = base;
        this.modifiers = List.copyOf(modifiers);
        this.geometry = geometry;
        this.defaultsRead = defaultsRead;
    }

    /** Applies a correlation with, for each effect that it lacks, the first of the modifiers. */
    static Candidate of(Correlation correlation, List<Correlation> modifiers, VesselGeometry vessel) {
        Set<GeometryParameter> defaultsRead = new LinkedHashSet<>();
        Geometry geometry = vessel.recordingDefaults(defaultsRead);
        List<Part> parts = new ArrayList<>();
        Set<Effect> done = new LinkedHashSet<>(correlation.contains());
        modifiers.stream()
                .filter(m -> m.appliesTo(geometry))
                .filter(m -> done.add(m.modifierFor().orElseThrow()))
                .forEach(m -> parts.add(Part.of(m, geometry)));
        return new Candidate(correlation.quantity(), Optional.of(correlation),
                Part.of(correlation, geometry), parts, geometry, defaultsRead);
    }

    /** A value that the user gave: a total, so no modifier touches it. */
    static Candidate given(Quantity quantity, double value, VesselGeometry vessel) {
        Part part = new Part(Optional.empty(), p -> value, ReynoldsDefinition.METZNER_OTTO);
        return new Candidate(quantity, Optional.empty(), part, List.of(), vessel, Set.of());
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

    Geometry geometry() {
        return geometry;
    }

    /** The dimensions that nobody gave and on which its bounds and its value rest, as far as evaluated. */
    Set<GeometryParameter> defaultsRead() {
        return defaultsRead;
    }

    List<Correlation> modifiers() {
        return modifiers.stream().map(m -> m.correlation().orElseThrow()).toList();
    }

    /** The value, all modifiers included; the point holds the state already. */
    double value(Point point, FluidState state) {
        double value = base.at(point, state);
        for (Part modifier : modifiers) {
            value *= modifier.at(point, state);
        }
        return value;
    }

    /** Whether the value can change with the state of the product. */
    boolean reads(Variable variable) {
        return correlation.map(c -> c.reads().contains(variable)).orElse(false)
                || modifiers.stream().anyMatch(m -> m.correlation().orElseThrow().reads().contains(variable));
    }

    boolean readsNothing() {
        return correlation.map(c -> c.reads().isEmpty()).orElse(true)
                && modifiers.stream().allMatch(m -> m.correlation().orElseThrow().reads().isEmpty());
    }

    /** The modifiers in words with the factor that each contributes. */
    List<String> modifiersInWords(Point point, FluidState state) {
        return modifiers.stream().map(m -> {
            Correlation c = m.correlation().orElseThrow();
            return c.modifierFor().orElseThrow().title() + ": " + quantity.title() + " times "
                    + Figures.show(m.at(point, state)) + " by " + c.id()
                    + (c.citation().hasSource() ? "" : " (" + c.citation() + ")");
        }).toList();
    }
}
