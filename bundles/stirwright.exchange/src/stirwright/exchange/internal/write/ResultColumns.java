package stirwright.exchange.internal.write;

import static stirwright.exchange.internal.write.Column.number;
import static stirwright.exchange.internal.write.Column.text;
import static stirwright.exchange.internal.write.Column.words;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;
import stirwright.core.CandidateResult;
import stirwright.core.CaseResult;
import stirwright.core.FluidState;
import stirwright.core.Refusal;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Regime;

/** The columns of the result table, in the contract's order. */
public final class ResultColumns {

    /** A case and one of its candidates; none when the case is refused. */
    public record Row(CaseResult result, Optional<CandidateResult> candidate) {}

    /** What belongs to one candidate. */
    static final List<Column<CandidateResult>> OF_CANDIDATE = candidateColumns(Optional::of);

    public static final List<Column<Row>> ALL = Stream.of(
                    List.<Column<Row>>of(text("case", r -> r.result().name()), text("family", r -> r.result().family())),
                    candidateColumns(Row::candidate),
                    List.<Column<Row>>of(
                            number("spread", r -> r.result().spread()),
                            text("status", r -> r.result().status().id()),
                            words("notes", ResultColumns::notes)))
            .flatMap(List::stream).toList();

    private ResultColumns() {}

    /** A row for each candidate, or the one row of a refused case. */
    public static List<Row> rows(CaseResult result) {
        return result.candidates().isEmpty()
                ? List.of(new Row(result, Optional.empty()))
                : result.candidates().stream().map(c -> new Row(result, Optional.of(c))).toList();
    }

    /** Written once for rows of the table and for objects of JSON; empty where there is no candidate. */
    private static <R> List<Column<R>> candidateColumns(Function<R, Optional<CandidateResult>> of) {
        Cells<R> c = new Cells<>(of);
        return List.of(
                c.text("correlation", CandidateResult::correlation),
                c.text("role", r -> r.role().id()),
                c.text("verdict", r -> r.verdict().id()),
                words("failed_bounds", r -> of.apply(r).map(CandidateResult::failedBounds).orElse(List.of())),
                c.text("regime", r -> r.regime().map(Regime::id).orElse("")),
                c.state("speed_rev_s", FluidState::speed),
                c.text("shear_rate_correlation", CandidateResult::shearRateCorrelation),
                c.state("shear_rate_constant", FluidState::shearRateConstant),
                c.state("shear_rate_1_s", FluidState::shearRate),
                c.state("apparent_viscosity_Pa_s", FluidState::viscosity),
                c.state("reynolds", FluidState::reynolds),
                c.number("power_number", CandidateResult::powerNumber),
                c.number("power_W", CandidateResult::power),
                c.number("torque_N_m", CandidateResult::torque),
                c.number("power_per_volume_W_m3", CandidateResult::powerPerVolume),
                c.text("flow_number_correlation", CandidateResult::flowCorrelation),
                c.text("flow_kind", r -> r.flowKind().map(FlowKind::id).orElse("")),
                c.number("flow_number", CandidateResult::flowNumber),
                c.number("pumping_m3_s", CandidateResult::pumping),
                c.state("tip_speed_m_s", FluidState::tipSpeed),
                c.number("power_based_shear_rate_1_s", CandidateResult::powerBasedShearRate),
                c.number("yield_stress_low_Pa", r -> r.yieldEffect().low()),
                c.number("yield_stress_high_Pa", r -> r.yieldEffect().high()),
                c.number("power_yield_low_W", r -> r.yieldEffect().powerLow()),
                c.number("power_yield_high_W", r -> r.yieldEffect().powerHigh()),
                c.number("deviation_from_pick", CandidateResult::deviation));
    }

    /** Makes columns of what reaches a candidate. */
    private record Cells<R>(Function<R, Optional<CandidateResult>> of) {
        Column<R> text(String name, Function<CandidateResult, String> words) {
            return Column.text(name, r -> of.apply(r).map(words).orElse(""));
        }

        Column<R> number(String name, ToDoubleFunction<CandidateResult> value) {
            return Column.number(name, r -> {
                Optional<CandidateResult> candidate = of.apply(r);
                return candidate.isPresent() ? value.applyAsDouble(candidate.get()) : Double.NaN;
            });
        }

        Column<R> state(String name, ToDoubleFunction<FluidState> value) {
            return number(name, candidate -> {
                Optional<FluidState> state = candidate.state();
                return state.isPresent() ? value.applyAsDouble(state.get()) : Double.NaN;
            });
        }
    }

    private static List<String> notes(Row row) {
        if (row.candidate().isEmpty()) {
            return row.result().refusal().map(Refusal::words).map(List::of).orElse(List.of());
        }
        CandidateResult candidate = row.candidate().get();
        List<String> notes = new ArrayList<>();
        notes.add(candidate.why());
        notes.addAll(candidate.notes());
        if (candidate == row.result().candidates().get(0)) {
            notes.addAll(row.result().flags());
            notes.addAll(row.result().notes());
        }
        return notes;
    }
}
