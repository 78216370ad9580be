package stirwright.study.internal;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.emf.common.command.AbstractCommand;
import org.eclipse.emf.ecore.change.ChangeDescription;

/** What one edit changed, or several that were joined. */
public final class Step extends AbstractCommand {
    private final Object mergeKey;
    /** In the order in which they were made; each turns into its reverse when it is applied. */
    private final List<ChangeDescription> changes = new ArrayList<>();

    /** @param mergeKey null joins nothing */
    public Step(String label, Object mergeKey, ChangeDescription change) {
        super(label);
        this.mergeKey = mergeKey;
        changes.add(change);
    }

    public Object mergeKey() {
        return mergeKey;
    }

    public void join(ChangeDescription change) {
        changes.add(change);
    }

    @Override
    protected boolean prepare() {
        return true;
    }

    @Override
    public void execute() {
        // The change was made while it was recorded.
    }

    @Override
    public void undo() {
        changes.reversed().forEach(ChangeDescription::applyAndReverse);
    }

    @Override
    public void redo() {
        changes.forEach(ChangeDescription::applyAndReverse);
    }
}
