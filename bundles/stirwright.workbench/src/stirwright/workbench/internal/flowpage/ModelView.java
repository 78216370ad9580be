package stirwright.workbench.internal.flowpage;

import java.util.List;
import java.util.Optional;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StyledText;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Text;
import stirwright.workbench.internal.flow.FlowCurves;
import stirwright.workbench.internal.flow.FlowSheet;
import stirwright.workbench.internal.flow.FluidEdits;
import stirwright.workbench.internal.flow.ModelCard;
import stirwright.workbench.internal.flow.ModelRow;
import stirwright.workbench.internal.flow.Section;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;

/** The card of the selected model, what is to be said of the curves, and the pick with its reason. */
final class ModelView extends Composite {
    private final FlowCurves flow;
    private final FluidEdits edits;
    private final StyledText card;
    private final Text reason;
    private final Button pick;
    /** The model that the reason was typed for. */
    private String about = "";

    ModelView(Composite parent, Looks looks, FlowCurves flow, FluidEdits edits) {
        super(parent, SWT.NONE);
        this.flow = flow;
        this.edits = edits;
        looks.onPage(this);
        GridLayout layout = new GridLayout(2, false);
        layout.marginHeight = Looks.STEP;
        layout.verticalSpacing = Looks.STEP;
        setLayout(layout);
        card = Names.name(new StyledText(this, SWT.READ_ONLY | SWT.WRAP | SWT.V_SCROLL), PageWords.Card_name);
        looks.onPage(card);
        card.setAlwaysShowScrollBars(false);
        card.setMargins(Looks.STEP, Looks.STEP, Looks.STEP, Looks.STEP);
        card.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true, 2, 1));
        // Tab leaves the card as it leaves every other control.
        card.addListener(SWT.Traverse, e -> e.doit |= e.detail == SWT.TRAVERSE_TAB_NEXT || e.detail == SWT.TRAVERSE_TAB_PREVIOUS);
        reason = looks.field(Names.name(new Text(this, SWT.BORDER), PageWords.Card_reasonName));
        reason.setMessage(PageWords.Card_reason);
        reason.addListener(SWT.Modify, e -> reason.setToolTipText(reason.getText().isBlank() ? null : reason.getText()));
        reason.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
        reason.addListener(SWT.Modify, e -> enable());
        reason.addListener(SWT.DefaultSelection, e -> pickThis());
        pick = looks.button(this, PageWords.Card_pick, this::pickThis);
        pick.setLayoutData(new GridData(SWT.RIGHT, SWT.CENTER, false, false));
        flow.onRequest(this::enable);
    }

    void show(FlowSheet sheet) {
        Optional<ModelRow> row = flow.selected();
        List<Section> sections = row.map(r -> ModelCard.of(sheet, r)).orElse(sheet.about());
        String key = row.map(ModelRow::key).orElse("");
        Sections.show(card, sections, key.equals(about));
        if (!key.equals(about) || reason.getText().isBlank()) {
            about = key;
            // The recommendation speaks for itself; whoever takes another says why.
            reason.setText(row.filter(ModelRow::recommended).map(r -> sheet.reason()).orElse(""));
        }
        enable();
    }

    private void enable() {
        if (isDisposed()) {
            return;
        }
        boolean pickable = flow.fresh() && flow.selected().filter(r -> r.fit().isPresent() && !r.pick()).isPresent();
        boolean missing = reason.getText().isBlank();
        reason.setEnabled(pickable);
        pick.setEnabled(pickable && !missing);
        pick.setToolTipText(pickable && missing ? PageWords.Card_reasonTip : null);
    }

    private void pickThis() {
        if (pick.isEnabled()) {
            FlowSheet sheet = flow.sheet().orElseThrow();
            edits.pick(flow.fluid().orElseThrow(), flow.selected().orElseThrow().model().orElseThrow(), sheet.window(), sheet.yield(),
                    reason.getText().strip());
        }
    }
}
