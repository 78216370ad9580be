package stirwright.workbench.internal.session;

import java.util.List;
import stirwright.core.Choices;
import stirwright.study.Case;
import stirwright.study.Constant;
import stirwright.study.OwnConstants;
import stirwright.workbench.internal.Messages;

/** The edits of what a case says about correlations themselves, each one step for undo. */
public final class CorrelationEdits {
    private final Session session;

    public CorrelationEdits(Session session) {
        this.session = session;
    }

    /** Applies the factors for an effect, or leaves them out. */
    public void apply(Case one, String effectId, boolean applied) {
        if (one.getLeftOut().contains(effectId) == applied) {
            session.editor().edit(Messages.bind(applied ? Messages.Edit_applyEffect : Messages.Edit_leaveOutEffect, effectId), () -> {
                if (applied) {
                    one.getLeftOut().remove(effectId);
                } else {
                    one.getLeftOut().add(effectId);
                }
            });
        }
    }

    /**
     * Gives a constant a value of the case's own; NaN, or the correlation's own value, takes that back. Typing on in one
     * field stays one step.
     *
     * @param published the value that the correlation has
     */
    public void constant(Case one, String correlation, String name, double published, double value) {
        double wanted = value == published ? Double.NaN : value;
        if (Double.compare(OwnConstants.get(one, correlation, name).orElse(Double.NaN), wanted) == 0) {
            return;
        }
        List<Object> key = List.of(System.identityHashCode(one), correlation, name);
        session.editor().edit(Messages.bind(Messages.Edit_constant, name), key, () -> {
            if (Double.isNaN(wanted)) {
                OwnConstants.remove(one, correlation, name);
            } else {
                OwnConstants.set(one, correlation, name, wanted);
            }
            withoutChanged(one, correlation);
        });
    }

    /** Takes back what no installed correlation can be found for. */
    public void forget(Case one, Constant constant) {
        session.editor().edit(Messages.bind(Messages.Edit_constant, String.valueOf(constant.getName())),
                () -> one.getConstants().remove(constant));
    }

    /** A pick of the changed correlation goes over to the published one once nothing of it is changed. */
    private static void withoutChanged(Case one, String correlation) {
        if (!OwnConstants.any(one, correlation)) {
            one.getPicks().stream().filter(p -> Choices.changed(correlation).equals(p.getCorrelation()))
                    .forEach(p -> p.setCorrelation(correlation));
        }
    }
}
