package stirwright.workbench.internal.flow;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.Executor;
import stirwright.rheology.FitOptions;
import stirwright.study.Case;
import stirwright.study.Curve;
import stirwright.study.Fluid;
import stirwright.workbench.internal.session.Page;
import stirwright.workbench.internal.session.Pages;
import stirwright.workbench.internal.session.Recalculator;
import stirwright.workbench.internal.session.Session;

/**
 * What the flow-curve page is about: the curves of the fluid of the case at hand, what models are fitted to, and what came out
 * last. On the user interface's thread; models are fitted on another one, and none before the page is shown.
 */
public final class FlowCurves implements AutoCloseable {
    private final Session session;
    private final Pages pages;
    private final Recalculator<FlowSheet> recalculator;
    private final List<Runnable> onSheet = new CopyOnWriteArrayList<>();
    private final List<Runnable> onRequest = new CopyOnWriteArrayList<>();
    private final Map<Curve, CurveData> read = new HashMap<>();
    /** Which models were switched on or off by hand, by their keys. */
    private final Map<String, Boolean> shown = new HashMap<>();
    /** Made for the first request, on the thread that fits. */
    private FlowCalculation calculation;
    private FlowSheet sheet;
    private FlowView view = FlowView.STRESS;
    private Fluid fluid;
    private String target = "";
    private boolean robust;
    /** What was selected by hand; the sheet says what is selected when that is none of its rows. */
    private String selected = "";

    /** @param ui runs what touches widgets, later and in order */
    public FlowCurves(Session session, Pages pages, Executor ui) {
        this.session = session;
        this.pages = pages;
        this.recalculator = new Recalculator<>("stirwright-fits", ui, this::take, () -> onRequest.forEach(Runnable::run));
        session.onStudy(this::request);
        session.onOutcome(this::request);
        pages.onTurn(this::request);
    }

    /** Asks for what belongs to the study as it is, while the page is shown. */
    private void request() {
        if (pages.current() != Page.FLOW_CURVE) {
            return;
        }
        if (fluid().orElse(null) != fluid) {
            // What was chosen for one fluid means nothing for another.
            fluid = fluid().orElse(null);
            target = "";
            selected = "";
            shown.clear();
        }
        FlowRequest request = asked();
        if (calculation == null) {
            calculation = new FlowCalculation();
        }
        FlowCalculation by = calculation;
        recalculator.request(stale -> by.of(request, stale));
        onRequest.forEach(Runnable::run);
    }

    private FlowRequest asked() {
        List<CurveData> curves = curves();
        List<FitTarget> targets = FitTarget.of(curves);
        Optional<FitTarget> fitted = targets.stream().filter(t -> t.key().equals(target)).findFirst().or(() -> targets.stream().findFirst());
        return new FlowRequest(fluid().map(Fluid::getName).orElse(""), curves, targets, fitted,
                new FitOptions(FitOptions.DEFAULT.objective(), robust), view, fluid().flatMap(FluidEdits::model),
                fluid().map(Fluid::getModelReason).orElse(""), fluid().map(FluidEdits::staticYield).orElse(OptionalDouble.empty()),
                session.outcome().map(NamedRate::of).orElse(List.of()), selected, shown);
    }

    private List<CurveData> curves() {
        List<Curve> all = fluid().map(f -> List.copyOf(f.getCurves())).orElse(List.of());
        List<CurveData> data = new ArrayList<>();
        for (int i = 0; i < all.size(); i++) {
            data.add(CurveData.of(all.get(i), i, read.get(all.get(i))));
        }
        read.clear();
        for (int i = 0; i < all.size(); i++) {
            read.put(all.get(i), data.get(i));
        }
        return data;
    }

    private void take(FlowSheet fresh) {
        sheet = fresh;
        onSheet.forEach(Runnable::run);
    }

    /** The fluid of the case at hand; empty where there is none. */
    public Optional<Fluid> fluid() {
        return session.current().map(Case::getFluid);
    }

    /** What came out last; empty until the page was shown and its first calculation is through. */
    public Optional<FlowSheet> sheet() {
        return Optional.ofNullable(sheet);
    }

    public FlowView view() {
        return view;
    }

    public void show(FlowView other) {
        view = other;
        request();
    }

    /** @param key of what models are fitted to */
    public void fitTo(String key) {
        target = key;
        selected = "";
        request();
    }

    public boolean robust() {
        return robust;
    }

    /** Whether points far off count less. */
    public void setRobust(boolean on) {
        robust = on;
        request();
    }

    /** The model whose card is open; empty when there is none. */
    public Optional<ModelRow> selected() {
        return sheet().flatMap(s -> s.rows().stream().filter(r -> r.key().equals(s.selected())).findFirst());
    }

    public void select(String key) {
        selected = key;
        if (sheet().filter(s -> s.selected().equals(key)).isEmpty()) {
            request();
        }
    }

    /** Switches the curve of a model on or off. */
    public void setShown(String key, boolean on) {
        shown.put(key, on);
        request();
    }

    /** Whether something is being fitted that is not shown yet. */
    public boolean busy() {
        return recalculator.busy();
    }

    /** Whether what is shown was computed from what stands in the study now. */
    public boolean fresh() {
        return sheet != null && !recalculator.busy() && !recalculator.stopped() && recalculator.defect() == null;
    }

    /** Keeps the last numbers and gives up those being computed. */
    public void stop() {
        recalculator.stop();
    }

    /** Asks anew for what was given up. */
    public void again() {
        request();
    }

    public boolean stopped() {
        return recalculator.stopped();
    }

    /** A defect in the last calculation; null when there is none. */
    public Throwable defect() {
        return recalculator.defect();
    }

    /** Called when new numbers are there. */
    public void onSheet(Runnable listener) {
        onSheet.add(listener);
    }

    /** Called when new numbers are asked for, and when they are given up or fail. */
    public void onRequest(Runnable listener) {
        onRequest.add(listener);
    }

    @Override
    public void close() {
        recalculator.close();
    }
}
