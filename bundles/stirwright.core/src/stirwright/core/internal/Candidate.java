package stirwright.core.internal;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import stirwright.core.BoundFinding;
import stirwright.core.FactorFinding;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Bound;
import stirwright.correlation.BoundCorrelation;
import stirwright.correlation.Classifier;
import stirwright.correlation.Correlation;
import stirwright.correlation.Geometry;
import stirwright.correlation.GeometryParameter;
import stirwright.correlation.Quantity;
import stirwright.correlation.ReynoldsDefinition;
import stirwright.correlation.Standing;
import stirwright.correlation.Variable;
import stirwright.correlation.Verdict;

/**
 * A correlation, or a given value, applied to one geometry together with the modifiers for the
 * effects that it does not contain. Not thread-safe.
 *
 * <p>What correlations compute is code of other bundles: whatever it throws becomes a value that is
 * no number and a failure in {@link #foreign}, so that it costs its own candidate alone.
 */
final class Candidate {

    /** What results call a value that the user gave. */
    static final String GIVEN = "given";

    private final Quantity quantity;
    private final Optional<Correlation> correlation;
    private final List<Part> parts;
    private final List<Part> leftOut;
    private final Set<Variable> reads;
    private final Variable[] readsBesidesReynolds;
    /** Asked for at every step of every loop. */
    private final boolean readsFlowNumber;
    private final boolean readsLaminarPower;
    private final Geometry geometry;
    private final Set<GeometryParameter> defaultsRead;
    private final ForeignCode foreign;
    private String distrust;
    private double givenValue = Double.NaN;
    private boolean changedInCase;
    private int doubts = -1;

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
            Quantity quantity, Optional<Correlation> correlation, Factors factors, Geometry geometry,
            Set<GeometryParameter> defaultsRead, ForeignCode foreign) {
        this.foreign = foreign;
        this.quantity = quantity;
        this.correlation = correlation;
        this.parts = factors.applied();
        this.leftOut = factors.leftOut();
        this.geometry = geometry;
        this.defaultsRead = defaultsRead;
        this.reads = parts.size() == 1 ? parts.get(0).correlation().reads() : reads(parts);
        this.readsBesidesReynolds = reads.stream().filter(v -> !v.equals(Variable.REYNOLDS)).toArray(Variable[]::new);
        this.readsFlowNumber = !quantity.equals(Quantity.FLOW_NUMBER) && reads.contains(Variable.FLOW_NUMBER);
        this.readsLaminarPower = !quantity.equals(Quantity.POWER_NUMBER) && reads.contains(Variable.LAMINAR_POWER);
    }

    private static Set<Variable> reads(List<Part> parts) {
        Set<Variable> all = new LinkedHashSet<>();
        parts.forEach(p -> all.addAll(p.correlation().reads()));
        return all;
    }

    /**
     * Applies a correlation with, for each effect that it lacks, the first of the modifiers.
     *
     * @param effectsLeftOut the ids of effects for which none is applied
     */
    static Candidate of(
            Correlation correlation, Modifiers modifiers, Set<String> effectsLeftOut, VesselGeometry vessel) {
        Set<GeometryParameter> defaultsRead = new LinkedHashSet<>();
        Geometry geometry = vessel.recordingDefaults(defaultsRead);
        ForeignCode foreign = new ForeignCode();
        Factors factors = foreign.call(
                () -> Factors.of(correlation, modifiers, effectsLeftOut, vessel, defaultsRead), Factors.NONE);
        return new Candidate(
                correlation.quantity(), Optional.of(correlation), factors, geometry, defaultsRead, foreign);
    }

    /** A value that the user gave: a total, so no modifier touches it. */
    static Candidate given(Quantity quantity, double value, VesselGeometry vessel) {
        Candidate candidate = new Candidate(
                quantity, Optional.empty(), Factors.NONE, vessel, Set.of(), new ForeignCode());
        candidate.givenValue = value;
        return candidate;
    }

    /** The same, made by the case itself from an installed correlation. */
    Candidate changedInCase(boolean changed) {
        changedInCase = changed;
        return this;
    }

    boolean isChangedInCase() {
        return changedInCase;
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

    /** The first variable besides the Reynolds number that it reads and that a point does not know; null when all is known. */
    Variable unknownAt(Point point) {
        for (Variable variable : readsBesidesReynolds) {
            if (Double.isNaN(point.get(variable))) {
                return variable;
            }
        }
        return null;
    }

    /** Whether it reads the flow number and does not give it. */
    boolean readsFlowNumber() {
        return readsFlowNumber;
    }

    /** Whether it reads the laminar power constant and is none of the power numbers that settle it. */
    boolean readsLaminarPower() {
        return readsLaminarPower;
    }

    /** What keeps it from being recommended whatever the case; asked for at every state, found once. */
    String distrust() {
        if (distrust == null) {
            distrust = Trust.obstacle(this);
        }
        return distrust;
    }

    /**
     * How often it must be doubted that it is near: once for its digits, source or standing, once more for a standing
     * that says not to use it, once for a Reynolds range not stated.
     */
    int doubts() {
        if (doubts < 0) {
            doubts = correlation.map(c -> (Trust.in(c) ? 0 : 1) + (c.standing() == Standing.RETIRED ? 1 : 0)
                    + (Trust.isSilent(c) ? 1 : 0)).orElse(0);
        }
        return doubts;
    }

    /** Where its contributed code is run, and what it threw. */
    ForeignCode foreign() {
        return foreign;
    }

    /** The value at a state, all modifiers included; NaN when its code fails. */
    double value(Point point, FluidState state) {
        return foreign.call(() -> product(point, state, state.reynolds()), Double.NaN);
    }

    /**
     * The value at any Reynolds number (Metzner and Otto's). For sweeps: it allocates nothing, and what
     * its code throws is for the caller to guard.
     */
    double product(Point point, FluidState state, double reynolds) {
        if (correlation.isEmpty()) {
            return givenValue;
        }
        double value = parts.isEmpty() ? Double.NaN : 1;
        for (int i = 0; i < parts.size(); i++) {
            Part part = parts.get(i);
            value *= part.bound().at(point.set(Variable.REYNOLDS, part.reynolds(state, reynolds)));
        }
        return value;
    }

    /** The worst verdict at any Reynolds number, for sweeps as well. */
    Verdict worst(Point point, FluidState state, double reynolds) {
        Verdict worst = correlation.isPresent() ? Verdict.INSIDE : Verdict.NOT_STATED;
        for (int i = 0; i < parts.size(); i++) {
            point.set(Variable.REYNOLDS, parts.get(i).reynolds(state, reynolds));
            List<Bound> bounds = parts.get(i).correlation().validity();
            for (int j = 0; j < bounds.size(); j++) {
                worst = worst.worseOf(bounds.get(j).verdict(geometry, point));
            }
        }
        return worst;
    }

    /** Every bound with what the case has at a state; what fails to answer is left out. */
    List<BoundFinding> findings(Point point, FluidState state) {
        List<BoundFinding> all = new ArrayList<>();
        for (Part part : parts) {
            String whose = part == parts.get(0) ? "" : part.correlation().id() + ": ";
            point.set(Variable.REYNOLDS, part.reynolds(state, state.reynolds()));
            for (Bound bound : part.correlation().validity()) {
                foreign.call(() -> all.add(new BoundFinding(whose + bound.words(), bound.found(geometry, point),
                        bound.verdict(geometry, point))), false);
            }
        }
        return all;
    }

    /** The modifiers applied, then those left out, each with its factor at a state. */
    List<FactorFinding> factors(Point point, FluidState state) {
        if (parts.size() < 2 && leftOut.isEmpty()) {
            return List.of();
        }
        List<FactorFinding> all = new ArrayList<>();
        parts.stream().skip(1).forEach(part -> all.add(new FactorFinding(
                part.correlation(), foreign.call(() -> factor(part, point, state), Double.NaN), false)));
        leftOut.forEach(part -> all.add(new FactorFinding(
                part.correlation(), new ForeignCode().call(() -> factor(part, point, state), Double.NaN), true)));
        return all;
    }

    private static double factor(Part part, Point point, FluidState state) {
        return part.bound().at(point.set(Variable.REYNOLDS, part.reynolds(state, state.reynolds())));
    }

    /** Whether the case leaves out an effect that would have a factor here. */
    boolean leavesOut(String effectId) {
        return leftOut.stream().anyMatch(p -> p.correlation().modifierFor().orElseThrow().id().equals(effectId));
    }

    /**
     * Whether the vessel is of a class for which the correlation was made: baffled or not, blade
     * count. Known before any state is.
     */
    boolean fitsVessel() {
        Point unknown = new Point();
        return foreign.call(() -> parts.stream().flatMap(p -> p.correlation().validity().stream())
                .filter(b -> b instanceof Bound.OneOf || b.subject().equals(Classifier.BAFFLING))
                .noneMatch(b -> b.verdict(geometry, unknown).fails()), false);
    }
}
