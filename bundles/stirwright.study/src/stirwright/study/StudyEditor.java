package stirwright.study;

import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.concurrent.CopyOnWriteArrayList;
import org.eclipse.emf.common.command.BasicCommandStack;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.change.ChangeDescription;
import org.eclipse.emf.ecore.change.util.ChangeRecorder;
import stirwright.study.internal.Step;

/**
 * Changes a study in steps that can be undone and done again. Every change goes through {@link #edit}; one that does not
 * cannot be undone and spoils the steps before it. For one thread.
 */
public final class StudyEditor {

    /** A listener that is being called; closing ends that. */
    public interface Listening extends AutoCloseable {
        @Override
        void close();
    }

    private final Study study;
    private final BasicCommandStack steps = new BasicCommandStack();
    private final List<Runnable> listeners = new CopyOnWriteArrayList<>();
    private boolean editing;
    /** The step that the next edit may join; null when none. */
    private Step open;

    public StudyEditor(Study study) {
        this.study = Objects.requireNonNull(study);
    }

    public Study study() {
        return study;
    }

    /**
     * Runs a change and keeps it as a step. One that changes nothing leaves no step; one that throws leaves the study as
     * it was. An edit within the change belongs to it.
     *
     * @param label what the step does, for the menu, for instance "set density"
     */
    public void edit(String label, Runnable change) {
        edit(label, null, change);
    }

    /**
     * The same, and joins the step before when that had an equal key and nothing came between: no other step, undo, redo,
     * save or {@link #endMerge}. So typing in one field is one step.
     *
     * @param mergeKey null joins nothing
     */
    public void edit(String label, Object mergeKey, Runnable change) {
        if (editing) {
            change.run();
            return;
        }
        ChangeDescription recorded = record(change);
        if (recorded.getObjectChanges().isEmpty()) {
            return;
        }
        if (mergeKey != null && open != null && mergeKey.equals(open.mergeKey())) {
            open.join(recorded);
        } else {
            Step step = new Step(label, mergeKey, recorded);
            steps.execute(step);
            open = step;
        }
        tell();
    }

    private ChangeDescription record(Runnable change) {
        ChangeRecorder recorder = new ChangeRecorder(study);
        editing = true;
        try {
            change.run();
        } catch (RuntimeException | Error failed) {
            // Whatever it was, the study must not stay half changed; the caller hears of it.
            end(recorder).apply();
            throw failed;
        } finally {
            editing = false;
        }
        return end(recorder);
    }

    /** A recorder goes on watching every element until it is disposed of. */
    private static ChangeDescription end(ChangeRecorder recorder) {
        ChangeDescription recorded = recorder.endRecording();
        recorder.dispose();
        return recorded;
    }

    /** Keeps the next edit a step of its own, for instance when a field loses the focus. */
    public void endMerge() {
        open = null;
    }

    public boolean canUndo() {
        return steps.canUndo();
    }

    public boolean canRedo() {
        return steps.canRedo();
    }

    /** Takes the last step back; does nothing when there is none. */
    public void undo() {
        move(canUndo(), steps::undo);
    }

    /** Does again what was undone last; does nothing when there is none. */
    public void redo() {
        move(canRedo(), steps::redo);
    }

    private void move(boolean can, Runnable move) {
        if (editing) {
            throw new IllegalStateException("undo and redo have no place within an edit");
        }
        if (can) {
            endMerge();
            move.run();
            tell();
        }
    }

    /** What undo would take back; empty when there is nothing. */
    public Optional<String> undoLabel() {
        return Optional.ofNullable(steps.getUndoCommand()).map(Command::getLabel);
    }

    /** What redo would do again; empty when there is nothing. */
    public Optional<String> redoLabel() {
        return Optional.ofNullable(steps.getRedoCommand()).map(Command::getLabel);
    }

    /** Whether the study differs, by its steps, from what was saved last, or from the beginning. */
    public boolean isDirty() {
        return steps.isSaveNeeded();
    }

    /** Says that the study was saved as it is now. */
    public void markSaved() {
        endMerge();
        boolean wasDirty = isDirty();
        steps.saveIsDone();
        if (wasDirty) {
            tell();
        }
    }

    /** Calls the listener after every change, undo and redo, and when {@link #isDirty} ends. */
    public Listening listen(Runnable listener) {
        listeners.add(listener);
        return () -> listeners.remove(listener);
    }

    private void tell() {
        listeners.forEach(Runnable::run);
    }
}
