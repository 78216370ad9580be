package stirwright.workbench.internal.session;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.Executor;
import stirwright.core.Catalogue;
import stirwright.core.Library;
import stirwright.exchange.StudyCases;
import stirwright.study.Case;
import stirwright.study.Study;
import stirwright.study.StudyEditor;

/**
 * What the window has open: a study with its edits, the case at hand, the view, and what came out last. Everything here
 * happens on the user interface's thread; the numbers are computed on another one.
 */
public final class Session implements AutoCloseable {
    private final Library library;
    private final Recalculator<Outcome> recalculator;
    private final Library.Listening arrivals;
    private final List<Runnable> onStudy = new CopyOnWriteArrayList<>();
    private final List<Runnable> onOutcome = new CopyOnWriteArrayList<>();
    private final List<Runnable> onSelection = new CopyOnWriteArrayList<>();
    private final List<Runnable> onRequest = new CopyOnWriteArrayList<>();
    private final Set<String> hidden = new HashSet<>();

    private StudyEditor editor;
    private Optional<Path> file = Optional.empty();
    private Case current;
    private View view = View.POWER_NUMBER;
    private Outcome outcome;
    private String selected = "";

    /** @param ui runs what touches widgets, later and in order */
    public Session(Library library, Executor ui, Study study, Optional<Path> file) {
        this.library = library;
        this.recalculator = new Recalculator<>("stirwright-cases", ui, this::take, () -> onRequest.forEach(Runnable::run));
        this.arrivals = library.listen(() -> ui.execute(this::recalculate));
        open(study, file);
    }

    /**
     * Turns to another study; what was open is dropped.
     *
     * @param from the file it stands in; empty for one that was never saved
     */
    public void open(Study study, Optional<Path> from) {
        editor = new StudyEditor(study);
        editor.listen(this::changed);
        file = from;
        current = null;
        selected = "";
        hidden.clear();
        changed();
    }

    private void changed() {
        List<Case> cases = editor.study().getCases();
        if (!cases.contains(current)) {
            current = cases.isEmpty() ? null : cases.get(0);
        }
        onStudy.forEach(Runnable::run);
        recalculate();
    }

    /** Computes the case at hand anew. */
    public void recalculate() {
        Catalogue catalogue = library.catalogue();
        if (current == null) {
            recalculator.drop();
            take(Outcome.withoutCase(catalogue, view));
            return;
        }
        List<Request.Entry> entries = new ArrayList<>();
        entries.add(new Request.Entry(familyId(), StudyCases.entry(current, catalogue)));
        for (String other : current.getCompared()) {
            if (!other.equals(familyId()) && catalogue.family(other).isPresent()) {
                entries.add(new Request.Entry(other, StudyCases.entry(current, catalogue, other)));
            }
        }
        Request request = new Request(catalogue, entries, view);
        recalculator.request(stale -> Calculation.of(request, stale));
        onRequest.forEach(Runnable::run);
    }

    /** Takes the last step back, and turns to a case that it changed when that is not the one at hand. */
    public void undo() {
        walk(editor::undo);
    }

    /** Does again what was undone last, and turns to a case that it changes. */
    public void redo() {
        walk(editor::redo);
    }

    private void walk(Runnable step) {
        CaseChanges changes = new CaseChanges(editor.study());
        step.run();
        changes.toShow(current).ifPresent(this::turnTo);
    }

    private void take(Outcome fresh) {
        outcome = fresh;
        if (fresh.rows().stream().noneMatch(r -> r.key().equals(selected))) {
            selected = fresh.rows().isEmpty() ? "" : fresh.rows().get(0).key();
        }
        onOutcome.forEach(Runnable::run);
    }

    /** The id of the case's family; empty without an impeller. */
    public String familyId() {
        return current == null || current.getImpeller() == null || current.getImpeller().getFamily() == null
                ? "" : current.getImpeller().getFamily();
    }

    public Catalogue catalogue() {
        return library.catalogue();
    }

    public StudyEditor editor() {
        return editor;
    }

    public Optional<Path> file() {
        return file;
    }

    /** Notes where the study was saved. */
    public void savedTo(Path path) {
        file = Optional.of(path);
        editor.markSaved();
        onStudy.forEach(Runnable::run);
    }

    /** The case at hand; empty for a study without cases. */
    public Optional<Case> current() {
        return Optional.ofNullable(current);
    }

    public void turnTo(Case other) {
        editor.endMerge();
        current = other;
        changed();
    }

    public View view() {
        return view;
    }

    public void show(View other) {
        view = other;
        selected = "";
        recalculate();
    }

    /** What came out last; empty until the first calculation is through. */
    public Optional<Outcome> outcome() {
        return Optional.ofNullable(outcome);
    }

    /** The candidate whose card is open; empty when there is none. */
    public Optional<Row> selected() {
        return outcome().flatMap(o -> o.rows().stream().filter(r -> r.key().equals(selected)).findFirst());
    }

    public void select(String key) {
        selected = key;
        onSelection.forEach(Runnable::run);
    }

    /** The curves that are switched off, by key. */
    public Set<String> hidden() {
        return Set.copyOf(hidden);
    }

    public void setHidden(String key, boolean hide) {
        if (hide ? hidden.add(key) : hidden.remove(key)) {
            onSelection.forEach(Runnable::run);
        }
    }

    /** Whether numbers are being computed that are not shown yet. */
    public boolean busy() {
        return recalculator.busy();
    }

    /** Keeps the last numbers and gives up those being computed. */
    public void stop() {
        recalculator.stop();
    }

    /** Whether what is shown was computed from what stands in the study now. */
    public boolean fresh() {
        return outcome != null && !recalculator.busy() && !recalculator.stopped() && recalculator.defect() == null;
    }

    /** Whether the newest numbers were given up by hand. */
    public boolean stopped() {
        return recalculator.stopped();
    }

    /** A defect in the last calculation; null when there is none. */
    public Throwable defect() {
        return recalculator.defect();
    }

    /** Called after each change of the study, of its file or of the case at hand. */
    public void onStudy(Runnable listener) {
        onStudy.add(listener);
    }

    /** Called when new numbers are there. */
    public void onOutcome(Runnable listener) {
        onOutcome.add(listener);
    }

    /** Called when new numbers are asked for, and when they are given up or fail. */
    public void onRequest(Runnable listener) {
        onRequest.add(listener);
    }

    /** Called when another candidate is selected or a curve is switched on or off. */
    public void onSelection(Runnable listener) {
        onSelection.add(listener);
    }

    @Override
    public void close() {
        arrivals.close();
        recalculator.close();
    }
}
