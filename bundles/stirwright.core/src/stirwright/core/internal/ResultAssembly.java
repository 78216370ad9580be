package stirwright.core.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import stirwright.core.CandidateResult;
import stirwright.core.CaseResult;
import stirwright.core.CaseSpec;
import stirwright.core.Catalogue;
import stirwright.core.FluidState;
import stirwright.core.Point;
import stirwright.core.QuantityResult;
import stirwright.core.Status;
import stirwright.core.VesselGeometry;
import stirwright.correlation.Correlation;
import stirwright.correlation.Dimensions;
import stirwright.correlation.Family;

/** Turns ranked trials into the result of a case. */
final class ResultAssembly {
    /** Shear rates within this share of each other are one. */
    private static final double SAME = 1e-9;

    private final CaseSpec spec;
    private final Catalogue catalogue;
    private final Family family;
    private final VesselGeometry vessel;
    private final Selection.Ranked pick;
    private final YieldPowers yields;
    private final double volume;

    /** A power candidate with the shear-rate constants and flow numbers at its own state. */
    record Row(Selection.Ranked power, Selection constants, Selection flows) {

        /** The power number itself, the shear-rate constant and the flow number that are used with it. */
        List<Candidate> picks() {
            List<Candidate> picks = new ArrayList<>(3);
            picks.add(power.trial().candidate());
            constants.pick().ifPresent(r -> picks.add(r.trial().candidate()));
            flows.pick().ifPresent(r -> picks.add(r.trial().candidate()));
            return picks;
        }
    }

    ResultAssembly(
            CaseSpec spec, Catalogue catalogue, Family family, VesselGeometry vessel, Selection.Ranked pick,
            YieldPowers yields) {
        this.spec = spec;
        this.catalogue = catalogue;
        this.family = family;
        this.vessel = vessel;
        this.pick = pick;
        this.yields = yields;
        this.volume = vessel.get(Dimensions.LIQUID_VOLUME);
    }

    /**
     * @param rows the pick first
     * @param listed the quantities whose candidates the result lists
     */
    CaseResult assemble(List<Row> rows, List<Selection> listed) {
        Row first = rows.get(0);
        List<CandidateResult> results = rows.stream().map(r -> result(r, r == first)).toList();
        boolean anyQualifies = rows.stream().anyMatch(r -> r.power().trial().qualifies());
        Doubts doubts = new Doubts(spec, vessel, first, anyQualifies);
        List<String> notes = new ArrayList<>(doubts.notes());
        notes.addAll(new ByHand(spec, catalogue, first).notes());
        notes.addAll(DriveCautions.of(rows));
        new ShearRateUse(first, results.get(0)).note().ifPresent(notes::add);
        powerBasedOutside(results.get(0).powerBasedShearRate()).ifPresent(notes::add);
        notes.addAll(yields.notes(results.get(0).yieldEffect()));
        List<QuantityResult> quantities = listed.stream()
                .flatMap(s -> s.ranked().stream()).map(ResultAssembly::quantity).toList();
        List<String> flags = doubts.flags();
        return new CaseResult(spec.name(), spec.familyId(), flags.isEmpty() ? Status.OK : Status.FLAGGED,
                spread(rows), results, quantities, flags, List.copyOf(notes), Optional.empty());
    }

    private CandidateResult result(Row row, boolean picked) {
        FluidState ofPick = pick.trial().state().orElseThrow();
        Trial trial = row.power().trial();
        Assessment assessment = trial.assessment();
        Optional<FluidState> state = trial.state();
        double power = state.map(s -> s.power(trial.value())).orElse(Double.NaN);
        double speed = state.map(FluidState::speed).orElse(Double.NaN);
        Optional<Selection.Ranked> flow = row.flows().pick();
        double flowNumber = flow.map(f -> f.trial().value()).orElse(Double.NaN);
        double powerBased = state.map(s -> PowerBasedShear.average(spec.fluid().model(), power / volume, s.shearRate()))
                .orElse(Double.NaN);
        List<String> notes = new ArrayList<>(state.map(s -> effects(row, s)).orElse(List.of()));
        if (!picked) {
            // Of the pick it is said with the case.
            state.map(FluidState::shearRate).filter(rate -> Math.abs(rate - ofPick.shearRate()) > SAME * ofPick.shearRate())
                    .flatMap(rate -> WindowUse.outside(spec.fluid().window(), "its shear rate", rate)).ifPresent(notes::add);
            powerBasedOutside(powerBased).ifPresent(notes::add);
        }
        return new CandidateResult(row.power().id(), row.power().role(), assessment.verdict(), assessment.failed(),
                row.power().why(), state.map(s -> family.regimes().at(s.reynolds(), s.fluid())), state,
                row.constants().pick().map(Selection.Ranked::id).orElse(""),
                trial.value(), power, power / (2 * Math.PI * speed), power / volume,
                powerBased, picked ? yields.of(row) : yields.bounds(),
                flow.map(Selection.Ranked::id).orElse(""),
                flow.flatMap(f -> f.trial().candidate().correlation()).flatMap(Correlation::flowKind),
                flowNumber, state.map(s -> s.pumping(flowNumber)).orElse(Double.NaN),
                power / ofPick.power(pick.trial().value()) - 1, List.copyOf(notes));
    }

    /** Nothing but its own column rests on it, so it flags no case. */
    private Optional<String> powerBasedOutside(double rate) {
        return WindowUse.outside(spec.fluid().window(), "the power-based average shear rate", rate)
                .map(words -> words + "; nothing else rests on it");
    }

    /** The factors in the power number, the shear-rate constant and the flow number of a row. */
    private static List<String> effects(Row row, FluidState state) {
        List<String> words = new ArrayList<>();
        row.picks().forEach(candidate -> candidate.factors(new Point().at(state), state)
                .forEach(factor -> words.add(factor.words())));
        return List.copyOf(words);
    }

    private static QuantityResult quantity(Selection.Ranked ranked) {
        Trial trial = ranked.trial();
        return new QuantityResult(trial.candidate().quantity(), ranked.id(), trial.candidate().correlation(),
                trial.value(), ranked.role(), trial.assessment().verdict(), trial.assessment().failed(), ranked.why());
    }

    private static double spread(List<Row> rows) {
        double[] powers = rows.stream()
                .map(r -> r.power().trial())
                .filter(Trial::qualifies)
                .mapToDouble(t -> t.state().orElseThrow().power(t.value()))
                .sorted()
                .toArray();
        return powers.length == 0 ? Double.NaN : powers[powers.length - 1] / powers[0];
    }
}
