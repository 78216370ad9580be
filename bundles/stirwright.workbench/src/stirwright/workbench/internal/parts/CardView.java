package stirwright.workbench.internal.parts;

import java.util.List;
import java.util.Optional;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StackLayout;
import org.eclipse.swt.custom.StyledText;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.layout.RowData;
import org.eclipse.swt.layout.RowLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Link;
import org.eclipse.swt.widgets.Text;
import stirwright.core.Choices;
import stirwright.core.Role;
import stirwright.correlation.Correlation;
import stirwright.correlation.Quantity;
import stirwright.study.Amounts;
import stirwright.study.Case;
import stirwright.study.Picks;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.app.CardsWindow;
import stirwright.workbench.internal.session.CaseEdits;
import stirwright.workbench.internal.session.Outcome;
import stirwright.workbench.internal.session.Problems;
import stirwright.workbench.internal.session.Published;
import stirwright.workbench.internal.session.Row;
import stirwright.workbench.internal.session.Session;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;
import stirwright.workbench.internal.widgets.WordBar;

/**
 * The card of the selected candidate: why or why not, formula, range, source; on pages beside it its constants and its
 * factors; and the pick with its reason.
 */
final class CardView extends Composite {
    /** The place of the constants among the pages. */
    private static final int CONSTANTS = 1;

    private final Session session;
    private final CaseEdits edits;
    private final Composite pages;
    private final StackLayout onTop = new StackLayout();
    private final StyledText card;
    private final ConstantsPage constants;
    private final Text reason;
    private final Button pick;
    private final Button unpick;
    private final Link open;

    CardView(Composite parent, Looks looks, Session session, CardsWindow cards, Problems problems) {
        super(parent, SWT.NONE);
        this.session = session;
        this.edits = new CaseEdits(session);
        looks.onPage(this);
        GridLayout layout = new GridLayout(1, false);
        layout.marginHeight = Looks.STEP;
        layout.verticalSpacing = Looks.STEP;
        setLayout(layout);
        WordBar turn = new WordBar(this, looks, Messages.Card_pages,
                List.of(Messages.Card_page, Messages.Constants_page, Messages.Factors_page), this::turnTo);
        turn.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        pages = looks.area(this);
        pages.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        pages.setLayout(onTop);
        card = Names.name(new StyledText(pages, SWT.READ_ONLY | SWT.WRAP | SWT.V_SCROLL), Messages.Card_name);
        looks.onPage(card);
        card.setAlwaysShowScrollBars(false);
        card.setMargins(Looks.STEP, Looks.STEP, Looks.STEP, Looks.STEP);
        constants = new ConstantsPage(pages, looks, session, problems, () -> {
            turn.setCurrent(CONSTANTS);
            turnTo(CONSTANTS);
        });
        new FactorsPage(pages, looks, session);
        onTop.topControl = card;
        // Tab leaves the card as it leaves every other control.
        card.addListener(SWT.Traverse, e -> e.doit |= e.detail == SWT.TRAVERSE_TAB_NEXT || e.detail == SWT.TRAVERSE_TAB_PREVIOUS);
        reason = looks.field(Names.name(new Text(this, SWT.BORDER), Messages.Card_reasonName));
        reason.setMessage(Messages.Card_reason);
        reason.setToolTipText(Messages.Card_reasonTip);
        reason.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
        reason.addListener(SWT.Modify, e -> enable());
        reason.addListener(SWT.DefaultSelection, e -> pickThis());
        // One line, unless the words need more.
        Composite foot = looks.area(this);
        foot.setLayoutData(new GridData(SWT.FILL, SWT.BOTTOM, true, false));
        RowLayout line = new RowLayout(SWT.HORIZONTAL);
        line.center = true;
        line.spacing = 2 * Looks.STEP;
        line.marginLeft = 0;
        line.marginTop = 0;
        line.marginBottom = 0;
        foot.setLayout(line);
        pick = looks.button(foot, Messages.Card_pick, this::pickThis);
        pick.setLayoutData(new RowData());
        unpick = looks.button(foot, Messages.Card_unpick, this::leaveIt);
        unpick.setLayoutData(new RowData());
        unpick.setToolTipText(Messages.Card_unpickTip);
        open = Names.name(looks.link(foot, Messages.Card_open, () -> Published.ofSelected(session)
                .ifPresent(correlation -> cards.open(getShell(), correlation))), Messages.Card_openName);
        open.setToolTipText(Messages.Card_openTip);
        session.onOutcome(this::show);
        session.onSelection(this::show);
        session.onStudy(this::showPage);
        session.onRequest(this::enable);
        show();
    }

    private void turnTo(int page) {
        onTop.topControl = pages.getChildren()[page];
        showPage();
        pages.layout();
    }

    private void showPage() {
        if (onTop.topControl instanceof CardPage page) {
            page.show();
        }
        if (onTop.topControl != constants) {
            // What could not be read there must not be counted any longer than it matters.
            constants.dropStale();
        }
    }

    private void show() {
        Optional<Row> row = session.selected();
        Outcome outcome = session.outcome().orElse(null);
        CardText text = outcome == null ? CardText.NOTHING : CardText.of(outcome, row);
        if (!card.getText().equals(text.words())) {
            boolean same = row.map(Row::key).equals(Optional.ofNullable(card.getData()));
            int top = card.getTopPixel();
            card.setText(text.words());
            card.setStyleRanges(text.styles());
            card.setTopPixel(same ? top : 0);
        }
        if (!row.map(Row::key).equals(Optional.ofNullable(card.getData()))) {
            // A reason speaks of the candidate that it was typed for.
            reason.setText("");
        }
        row.map(Row::key).ifPresentOrElse(card::setData, () -> card.setData(null));
        showPage();
        enable();
    }

    /** A reason is asked for whoever is not recommended; only candidates of the case's own family can be picked. */
    private void enable() {
        Optional<Row> row = session.selected();
        boolean pickable = row.filter(r -> r.familyId().equals(session.familyId()) && r.correlation().isPresent()
                && r.role() != Role.CHOSEN).isPresent();
        boolean asked = pickable && row.get().role() != Role.RECOMMENDED;
        boolean chosen = session.current().map(c -> Picks.get(c, session.view().quantity().id()).isPresent()
                || Amounts.get(c.getAmounts(), Choices.givenField(session.view().quantity())).isPresent()).orElse(false);
        boolean missing = asked && reason.getText().isBlank();
        showLink();
        reason.setEnabled(session.fresh());
        pick.setEnabled(pickable && session.fresh() && !missing);
        pick.setToolTipText(missing ? Messages.Card_reasonTip : null);
        // While the numbers are on their way everything keeps its place.
        boolean moved = shown(unpick, chosen) | shown(pick, !row.map(Row::role).equals(Optional.of(Role.CHOSEN))) | shown(reason, asked);
        if (moved) {
            layout(true, true);
        }
    }

    /** What its words open: of a candidate with constants of the case's own the card of that which it was made from. */
    private void showLink() {
        Optional<Correlation> of = Published.ofSelected(session);
        boolean changed = of.isPresent() && !session.selected().map(Row::correlationId).equals(of.map(Correlation::id));
        String words = !changed ? Messages.Card_open
                : of.get().citation().hasSource() ? Messages.Card_openPublished : Messages.Card_openShipped;
        open.setEnabled(of.isPresent());
        if (!open.getText().equals(Looks.act(words))) {
            open.setText(Looks.act(words));
            open.requestLayout();
        }
    }

    /** Shows or hides what may take part in a layout; says whether that changed anything. */
    private boolean shown(Control control, boolean wanted) {
        boolean excluded = control.getLayoutData() instanceof GridData grid ? grid.exclude : ((RowData) control.getLayoutData()).exclude;
        if (excluded != wanted) {
            return false;
        }
        if (!wanted && control.isFocusControl()) {
            card.setFocus();
        }
        if (control.getLayoutData() instanceof GridData grid) {
            grid.exclude = !wanted;
        } else {
            ((RowData) control.getLayoutData()).exclude = !wanted;
        }
        control.setVisible(wanted);
        return true;
    }

    private void pickThis() {
        if (pick.isEnabled()) {
            Row row = session.selected().orElseThrow();
            String words = reason.getText().strip();
            reason.setText("");
            edits.pick(theCase(), quantity(), row.correlationId(), words);
        }
    }

    private void leaveIt() {
        edits.unpick(theCase(), quantity());
    }

    private Case theCase() {
        return session.current().orElseThrow();
    }

    private Quantity quantity() {
        return session.view().quantity();
    }
}
