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
     * Takes over a value for a constant as it is typed; NaN stands for the correlation's own. Typing on in one field stays
     * one step. While the changed correlation is picked or selected it stays, even on the way through the published value.
     *
     * @param published the value that the correlation has
     */
    public void typed(Case one, String correlation, String name, double published, double value) {
        double wanted = Double.isNaN(value) ? published : value;
        if (OwnConstants.get(one, correlation, name).orElse(published) == wanted) {
            return;
        }
        session.editor().edit(label(name), key(one, correlation, name), () -> {
            if (wanted == published && !inUse(one, correlation)) {
                OwnConstants.remove(one, correlation, name);
            } else {
                OwnConstants.set(one, correlation, name, wanted);
            }
        });
    }

    private boolean inUse(Case one, String correlation) {
        return session.selected().map(Row::correlationId).filter(Choices.changed(correlation)::equals).isPresent()
                || one.getPicks().stream().anyMatch(p -> Choices.changed(correlation).equals(p.getCorrelation()));
    }

    /** Ends the typing: a value that is the published one is none of the case's own. */
    public void left(Case one, String correlation, String name, double published) {
        if (OwnConstants.get(one, correlation, name).orElse(Double.NaN) == published) {
            publish(one, correlation, name);
        }
        session.editor().endMerge();
    }

    /** Gives a constant the published value again. */
    public void publish(Case one, String correlation, String name) {
        session.selected().filter(row -> row.correlationId().equals(Choices.changed(correlation)) && isLast(one, correlation, name))
                .ifPresent(row -> session.select(Row.key(row.familyId(), correlation)));
        session.editor().edit(label(name), key(one, correlation, name), () -> {
            OwnConstants.remove(one, correlation, name);
            withoutChanged(one, correlation);
        });
    }

    private static boolean isLast(Case one, String correlation, String name) {
        return one.getConstants().stream().noneMatch(c -> correlation.equals(c.getCorrelation()) && !name.equals(c.getName()));
    }

    private static String label(String name) {
        return Messages.bind(Messages.Edit_constant, name);
    }

    private static List<Object> key(Case one, String correlation, String name) {
        return List.of(System.identityHashCode(one), correlation, name);
    }

    /** Takes back what no installed correlation can be found for. */
    public void forget(Case one, Constant constant) {
        session.editor().edit(label(String.valueOf(constant.getName())), () -> {
            one.getConstants().remove(constant);
            withoutChanged(one, String.valueOf(constant.getCorrelation()));
        });
    }

    /** A pick of the changed correlation goes over to the published one once nothing of it is changed. */
    private static void withoutChanged(Case one, String correlation) {
        if (!OwnConstants.any(one, correlation)) {
            one.getPicks().stream().filter(p -> Choices.changed(correlation).equals(p.getCorrelation()))
                    .forEach(p -> p.setCorrelation(correlation));
        }
    }
}
