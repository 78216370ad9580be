package stirwright.core.internal;

import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import stirwright.core.Choices;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.correlation.Quantity;
import stirwright.correlation.Variable;

/**
 * Evaluates and assesses candidates at states of the product. It knows the flow numbers and the laminar
 * power constant of the case, since other candidates may read them. Not thread-safe.
 */
final class Trials {
    private final List<Candidate> flows;
    private final LaminarPower laminarPower;
    private final Choices choices;
    private final Map<FluidState, Selection> flowsByState = new IdentityHashMap<>();

    Trials(List<Candidate> flows, LaminarPower laminarPower, Choices choices) {
        this.flows = flows;
        this.laminarPower = laminarPower;
        this.choices = choices;
    }

    /** A candidate at a state. */
    Trial at(FluidState state, Candidate candidate) {
        return at(state, candidate, point(state, candidate), OptionalDouble.empty());
    }

    /** A candidate whose value led to the state, so that it is known already. */
    Trial at(FluidState state, Candidate candidate, double known) {
        return at(state, candidate, point(state, candidate), OptionalDouble.of(known));
    }

    /** A candidate at the state of the pick, where the pick's power number is known too. */
    Trial at(Selection.Ranked pick, Candidate candidate) {
        return at(pick.trial().state().orElseThrow(), candidate, point(pick, candidate), OptionalDouble.empty());
    }

    private static Trial at(FluidState state, Candidate candidate, Point point, OptionalDouble known) {
        double value = known.orElseGet(() -> candidate.value(point, state));
        return new Trial(candidate, Optional.of(state), value, Assessment.of(candidate, point, state, value));
    }

    /** A candidate for which no state was found. */
    static Trial nowhere(Candidate candidate, String reason) {
        return new Trial(candidate, Optional.empty(), Double.NaN, Assessment.impossible(reason));
    }

    /** The state of the pick as an operating point, with its power number unless that is asked for. */
    Point point(Selection.Ranked pick, Candidate candidate) {
        Point point = point(pick.trial().state().orElseThrow(), candidate);
        return candidate.quantity().equals(Quantity.POWER_NUMBER)
                ? point : point.set(Variable.POWER_NUMBER, pick.trial().value());
    }

    private Point point(FluidState state, Candidate candidate) {
        return setUp(new Point(), state, candidate);
    }

    /** Takes over a state, with what else a candidate reads and does not give. */
    Point setUp(Point point, FluidState state, Candidate candidate) {
        point.at(state);
        if (candidate.readsFlowNumber()) {
            point.set(Variable.FLOW_NUMBER, flowNumber(state));
        }
        if (candidate.readsLaminarPower()) {
            point.set(Variable.LAMINAR_POWER, laminarPower.constant());
        }
        return point;
    }

    /** The pick's flow number at a state that may be one of many on the way to a solution. */
    private double flowNumber(FluidState state) {
        return selectFlow(state).pick().map(r -> r.trial().value()).orElse(Double.NaN);
    }

    /** The flow numbers at a state that stays; asked for by each power candidate at it. */
    Selection flowsAt(FluidState state) {
        return flowsByState.computeIfAbsent(state, this::selectFlow);
    }

    private Selection selectFlow(FluidState state) {
        return Selection.of(flows.stream().map(flow -> at(state, flow)).toList(),
                choices.correlation(Quantity.FLOW_NUMBER), Optional.empty());
    }
}
