package stirwright.workbench.internal.flowpage;

import java.util.Arrays;
import java.util.List;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.layout.RowData;
import org.eclipse.swt.layout.RowLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Link;
import stirwright.workbench.internal.flow.FitTarget;
import stirwright.workbench.internal.flow.FlowCurves;
import stirwright.workbench.internal.flow.FlowSheet;
import stirwright.workbench.internal.flow.FlowView;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;
import stirwright.workbench.internal.widgets.WordBar;

/** Above the chart: what it draws, what models are fitted to and how, and the way to more curves. */
public final class FlowHead extends Composite {
    private static final int TARGET_WIDTH = 48 * Looks.STEP;

    private final FlowCurves flow;
    private final WordBar views;
    private final Combo target;
    private final Button robust;
    private final Link whole;
    private List<FitTarget> shown = List.of();

    /**
     * @param bring opens the import
     * @param reset shows everything on the chart
     */
    public FlowHead(Composite parent, Looks looks, FlowCurves flow, Runnable bring, Runnable reset) {
        super(parent, SWT.NONE);
        this.flow = flow;
        looks.onPage(this);
        setBackgroundMode(SWT.INHERIT_FORCE);
        GridLayout layout = new GridLayout(3, false);
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        setLayout(layout);
        views = new WordBar(this, looks, PageWords.Head_views, Arrays.stream(FlowView.values()).map(FlowView::title).toList(),
                i -> flow.show(FlowView.values()[i]));
        views.setLayoutData(new GridData(SWT.LEFT, SWT.CENTER, false, false));
        Composite fit = looks.area(this);
        fit.setLayoutData(new GridData(SWT.RIGHT, SWT.CENTER, true, false));
        RowLayout line = new RowLayout(SWT.HORIZONTAL);
        line.center = true;
        line.spacing = 2 * Looks.STEP;
        line.marginTop = 0;
        line.marginBottom = 0;
        line.wrap = false;
        fit.setLayout(line);
        looks.quiet(fit, SWT.NONE, PageWords.Head_fitTo);
        target = Names.name(new Combo(fit, SWT.READ_ONLY | SWT.DROP_DOWN), PageWords.Head_fitTo);
        target.setLayoutData(new RowData(TARGET_WIDTH, SWT.DEFAULT));
        target.addListener(SWT.Selection, e -> flow.fitTo(shown.get(target.getSelectionIndex()).key()));
        target.addListener(SWT.MouseVerticalWheel, e -> e.doit = false);
        robust = looks.onPage(new Button(fit, SWT.CHECK));
        robust.setText(PageWords.Head_robust);
        robust.setToolTipText(PageWords.Head_robustTip);
        robust.addListener(SWT.Selection, e -> flow.setRobust(robust.getSelection()));
        Composite acts = looks.area(this);
        acts.setLayoutData(new GridData(SWT.RIGHT, SWT.CENTER, false, false));
        RowLayout links = new RowLayout(SWT.HORIZONTAL);
        links.spacing = 3 * Looks.STEP;
        links.marginTop = 0;
        links.marginBottom = 0;
        links.wrap = false;
        acts.setLayout(links);
        looks.link(acts, PageWords.Head_import, bring);
        whole = looks.link(acts, PageWords.Head_whole, reset);
        whole.setToolTipText(PageWords.Head_wholeTip);
    }

    /** Shows what came out. */
    public void show(FlowSheet sheet) {
        views.setCurrent(flow.view().ordinal());
        if (!sheet.targets().stream().map(FitTarget::title).toList().equals(List.of(target.getItems()))) {
            target.setItems(sheet.targets().stream().map(FitTarget::title).toArray(String[]::new));
        }
        shown = sheet.targets();
        target.select(sheet.target().map(t -> shown.stream().map(FitTarget::key).toList().indexOf(t.key())).orElse(-1));
        robust.setSelection(flow.robust());
        for (Control control : new Control[] {views, target, robust, whole}) {
            control.setEnabled(!sheet.empty() && (control != target || shown.size() > 1));
        }
    }
}
