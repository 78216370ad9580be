package stirwright.console.internal;

import java.math.BigDecimal;
import java.util.List;
import stirwright.core.CandidateResult;
import stirwright.core.CaseResult;
import stirwright.core.FluidState;
import stirwright.core.Role;
import stirwright.correlation.Figures;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Regime;
import stirwright.exchange.CaseEntry;

/** One case laid out for reading, at most 120 columns wide. */
final class CaseView {
    static final int WIDTH = 120;

    /** Stands wherever power or torque is printed. */
    static final String CAUTION = "Power and torque are estimates. Drive, mechanical and safety design is for the"
            + " responsible engineer, by the codes that apply and with the equipment maker.";

    private CaseView() {}

    static String text(CaseEntry entry, CaseResult result) {
        StringBuilder text = new StringBuilder();
        Columns.appendWrapped(text, "", shortened(entry.name()) + ", family "
                + (result.family().isBlank() ? "not given" : shortened(result.family()))
                + ": " + result.status().id(), WIDTH);
        result.flags().forEach(f -> Columns.appendWrapped(text, "  ", "flag: " + f, WIDTH));
        result.refusal().ifPresent(r -> Columns.appendWrapped(text, "  ", r.words(), WIDTH));
        result.pick().ifPresent(pick -> {
            pick.state().ifPresent(state -> productAndFlow(text, pick, state));
            candidates(text, result);
            notesOfAll(result.candidates()).forEach(n -> Columns.appendWrapped(text, "  ", "for every candidate: " + n, WIDTH));
            result.notes().forEach(n -> Columns.appendWrapped(text, "  ", "note: " + n, WIDTH));
            Columns.appendWrapped(text, "  ", CAUTION, WIDTH);
        });
        return text.toString();
    }

    /** Words of the input as a terminal can bear them: no control characters, not longer than half a line. */
    static String shortened(String words) {
        String plain = words.replaceAll("\\p{Cntrl}", "?");
        return plain.length() <= WIDTH / 2 ? plain : plain.substring(0, WIDTH / 2) + "...";
    }

    private static void productAndFlow(StringBuilder text, CandidateResult pick, FluidState state) {
        Columns.appendWrapped(text, "  ", Figures.show(state.speed()) + " rev/s (" + Figures.show(60 * state.speed())
                + " rev/min), tip speed " + Figures.show(state.tipSpeed()) + " m/s, Reynolds number "
                + Figures.show(state.reynolds()) + " (" + pick.regime().map(Regime::id).orElse("") + ")", WIDTH);
        Columns.appendWrapped(text, "  ", "average shear rate " + Figures.show(state.shearRate()) + " 1/s ("
                + Figures.show(state.shearRateConstant()) + " per revolution, " + pick.shearRateCorrelation()
                + "), apparent viscosity " + Figures.show(state.viscosity()) + " Pa s", WIDTH);
        Columns.appendWrapped(text, "  ", "power " + Figures.show(pick.power()) + " W, torque " + Figures.show(pick.torque())
                + " N m, " + Figures.show(pick.powerPerVolume()) + " W/m3, power number " + Figures.show(pick.powerNumber())
                + " by " + pick.correlation(), WIDTH);
        if (!Double.isNaN(pick.powerBasedShearRate())) {
            Columns.appendWrapped(text, "  ", "power-based average shear rate, over the whole vessel: "
                    + Figures.show(pick.powerBasedShearRate()) + " 1/s", WIDTH);
        }
        if (!pick.flowCorrelation().isEmpty()) {
            Columns.appendWrapped(text, "  ", "pumping " + Figures.show(pick.pumping()) + " m3/s (flow number "
                    + Figures.show(pick.flowNumber()) + pick.flowKind().map(FlowKind::id).map(k -> ", " + k).orElse("")
                    + ", " + pick.flowCorrelation() + ")", WIDTH);
        }
    }

    private static void candidates(StringBuilder text, CaseResult result) {
        Columns table = new Columns("llrrrrr")
                .add("power number by", "verdict", "Np", "speed", "power", "torque", "from pick")
                .add("", "", "-", "rev/s", "W", "N m", "%");
        List<String> everywhere = notesOfAll(result.candidates());
        for (CandidateResult row : result.candidates()) {
            table.add(mark(row) + row.correlation(), row.verdict().id(), shown(row.powerNumber()),
                    row.state().map(s -> shown(s.speed())).orElse(""), shown(row.power()), shown(row.torque()),
                    percent(row.deviation()));
            table.under(row.why());
            row.notes().stream().filter(note -> !everywhere.contains(note)).forEach(table::under);
        }
        table.appendTo(text, "  ", WIDTH);
        long qualified = result.candidates().stream().filter(CaseView::qualifies).count();
        Columns.appendWrapped(text, "  ", Double.isNaN(result.spread()) ? "no candidate qualifies, so there is no spread"
                : qualified < 2 && result.spread() == 1 ? "only one candidate qualifies, so there is no spread"
                : "largest over smallest power of those that qualify: " + Figures.show(result.spread()), WIDTH);
    }

    /** What is said of every candidate alike, if there are several, and so once. */
    private static List<String> notesOfAll(List<CandidateResult> rows) {
        return rows.size() < 2 ? List.of() : rows.get(0).notes().stream()
                .filter(note -> rows.stream().allMatch(row -> row.notes().contains(note))).distinct().toList();
    }

    private static boolean qualifies(CandidateResult row) {
        return row.role() == Role.RECOMMENDED || row.role() == Role.CANDIDATE;
    }

    /** What a row is to its case, readable without colour; the summary says what the marks mean. */
    private static String mark(CandidateResult row) {
        return switch (row.role()) {
            case RECOMMENDED -> "> ";
            case CHOSEN -> "* ";
            case CANDIDATE -> "  ";
            case EXCLUDED -> "x ";
        };
    }

    /** Signed, to a tenth of a per cent. */
    private static String percent(double share) {
        if (!Double.isFinite(share)) {
            return "";
        }
        long tenths = Math.round(1000 * share);
        return (tenths < 0 ? "" : "+") + BigDecimal.valueOf(tenths, 1).toPlainString();
    }

    private static String shown(double value) {
        return Double.isNaN(value) ? "" : Figures.show(value);
    }
}
