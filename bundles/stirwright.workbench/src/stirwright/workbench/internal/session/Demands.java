package stirwright.workbench.internal.session;

import stirwright.core.CandidateResult;
import stirwright.core.FluidState;
import stirwright.exchange.CaseField;
import stirwright.exchange.CaseFields;
import stirwright.study.Case;
import stirwright.workbench.internal.Messages;

/** What settles the speed of a case: a speed or a target. */
public final class Demands {
    private static final double MINUTE = 60;

    private Demands() {}

    /** The kind that a case has; a speed in rev/min for a case without. */
    public static CaseField field(Case c) {
        return CaseFields.SPEEDS.stream()
                .filter(f -> c.getDemand() != null && f.column().equals(c.getDemand().getColumn()))
                .findFirst().orElse(CaseFields.SPEED_RPM);
    }

    /** The kind in words, with the unit where two kinds differ by that alone. */
    public static String title(CaseField kind) {
        boolean speed = kind.equals(CaseFields.SPEED_RPM) || kind.equals(CaseFields.SPEED_REV_S);
        return speed ? Messages.bind(Messages.Case_speedIn, kind.unit()) : kind.title();
    }

    /** The value that a case has, in its column's unit; NaN for none. */
    public static double value(Case c) {
        return c.getDemand() != null && c.getDemand().isSetValue() ? c.getDemand().getValue() : Double.NaN;
    }

    /**
     * What a case has now in another kind, so that turning from one to the other changes no number much; NaN where that is
     * not known.
     */
    public static double equivalent(Session session, Case c, CaseField kind) {
        double now = value(c);
        if (field(c).equals(CaseFields.SPEED_RPM) && kind.equals(CaseFields.SPEED_REV_S)) {
            return now / MINUTE;
        }
        if (field(c).equals(CaseFields.SPEED_REV_S) && kind.equals(CaseFields.SPEED_RPM)) {
            return now * MINUTE;
        }
        return !session.fresh() ? Double.NaN : session.outcome().flatMap(o -> o.main().result().pick()).filter(p -> p.state().isPresent())
                .map(p -> value(p, p.state().get(), kind)).orElse(Double.NaN);
    }

    private static double value(CandidateResult pick, FluidState state, CaseField kind) {
        if (kind.equals(CaseFields.SPEED_RPM)) {
            return MINUTE * state.speed();
        }
        if (kind.equals(CaseFields.SPEED_REV_S)) {
            return state.speed();
        }
        if (kind.equals(CaseFields.TARGET_SHEAR_RATE)) {
            return state.shearRate();
        }
        return kind.equals(CaseFields.TARGET_TIP_SPEED) ? state.tipSpeed() : pick.powerPerVolume();
    }
}
