package stirwright.workbench.internal.importing;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import stirwright.exchange.BlockChoice;
import stirwright.exchange.BlockUse;
import stirwright.exchange.CurveBlock;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;
import stirwright.workbench.internal.widgets.Shortened;

/** The blocks of the source: the check mark takes one as a curve, the list below says what the selected one is. */
final class BlockList extends Composite {
    private static final int POINTS_WIDTH = 60;
    /** Of what the points leave, in per cent. */
    private static final int NAME_SHARE = 52;

    /** What a cell keeps free beside its text, without and with a check mark. */
    private static final int CELL_MARGIN = 12;
    private static final int CHECK_WIDTH = 34;

    private final Shortened shortened = new Shortened();
    private final Looks looks;
    private final ImportSession session;
    private final Table table;
    private final Combo use;
    private final Label reason;
    private List<CurveBlock> blocks = List.of();

    BlockList(Composite parent, Looks looks, ImportSession session) {
        super(parent, SWT.NONE);
        this.looks = looks;
        this.session = session;
        looks.onPage(this);
        setBackgroundMode(SWT.INHERIT_FORCE);
        GridLayout layout = new GridLayout(2, false);
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        layout.verticalSpacing = Looks.STEP;
        setLayout(layout);
        table = Names.name(looks.table(new Table(this, SWT.CHECK | SWT.FULL_SELECTION | SWT.SINGLE | SWT.VIRTUAL)), ImportWords.Blocks_name);
        table.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true, 2, 1));
        for (String head : List.of(ImportWords.Blocks_block, ImportWords.Blocks_use, ImportWords.Blocks_points)) {
            new TableColumn(table, head.equals(ImportWords.Blocks_points) ? SWT.RIGHT : SWT.LEFT).setText(head);
        }
        table.addListener(SWT.SetData, e -> fill((TableItem) e.item, table.indexOf((TableItem) e.item)));
        table.addListener(SWT.Selection, this::selected);
        table.addListener(SWT.Resize, e -> fit());
        looks.quiet(this, SWT.NONE, ImportWords.Blocks_is);
        use = Names.name(new Combo(this, SWT.READ_ONLY | SWT.DROP_DOWN), ImportWords.Blocks_useName);
        use.setItems(Arrays.stream(BlockUse.values()).map(BlockUse::words).toArray(String[]::new));
        use.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
        use.addListener(SWT.Selection, e -> at().ifPresent(b ->
                choose(b, Optional.of(BlockUse.values()[use.getSelectionIndex()]), Optional.empty())));
        use.addListener(SWT.MouseVerticalWheel, e -> e.doit = false);
        reason = looks.quiet(this, SWT.WRAP, "");
        reason.setFont(looks.small());
        GridData data = new GridData(SWT.FILL, SWT.TOP, true, false, 2, 1);
        data.widthHint = 200;
        data.heightHint = 3 * reason.computeSize(SWT.DEFAULT, SWT.DEFAULT).y;
        reason.setLayoutData(data);
    }

    void show() {
        blocks = session.found().map(f -> f.blocks()).orElse(List.of());
        int before = Math.max(0, table.getSelectionIndex());
        table.setItemCount(blocks.size());
        table.clearAll();
        if (!blocks.isEmpty()) {
            table.setSelection(Math.min(before, blocks.size() - 1));
        }
        fit();
        showSelected();
    }

    private void fill(TableItem item, int index) {
        CurveBlock block = blocks.get(index);
        GC gc = new GC(table);
        gc.setFont(table.getFont());
        item.setText(new String[] {shortened.fit(gc, name(block), table.getColumn(0).getWidth() - CHECK_WIDTH),
            shortened.fit(gc, block.use().words(), table.getColumn(1).getWidth() - CELL_MARGIN), block.usable() + "/" + block.points().size()});
        gc.dispose();
        item.setChecked(block.taken());
        item.setForeground(block.taken() ? looks.palette().text() : looks.palette().quiet());
    }

    private static String name(CurveBlock block) {
        return block.name().isEmpty() ? String.valueOf(block.number()) : block.name();
    }

    private void fit() {
        int left = table.getClientArea().width - POINTS_WIDTH;
        if (left > 0) {
            table.getColumn(0).setWidth(left * NAME_SHARE / 100);
            table.getColumn(1).setWidth(left - left * NAME_SHARE / 100);
            table.getColumn(2).setWidth(POINTS_WIDTH);
            table.clearAll();
        }
    }

    private Optional<CurveBlock> at() {
        int index = table.getSelectionIndex();
        return index >= 0 && index < blocks.size() ? Optional.of(blocks.get(index)) : Optional.empty();
    }

    private void selected(Event event) {
        if (event.detail == SWT.CHECK) {
            CurveBlock block = blocks.get(table.indexOf((TableItem) event.item));
            choose(block, said(block).flatMap(BlockChoice::use), Optional.of(((TableItem) event.item).getChecked()));
        } else {
            showSelected();
        }
    }

    private void showSelected() {
        Optional<CurveBlock> block = at();
        use.setEnabled(block.isPresent());
        block.ifPresentOrElse(b -> use.select(b.use().ordinal()), use::deselectAll);
        reason.setText(block.map(b -> Looks.literal(String.join(" ", b.warnings().isEmpty() ? List.of(sentence(b.reason()))
                : List.of(sentence(b.reason()), String.join("; ", b.warnings()))))).orElse(""));
        reason.setToolTipText(reason.getText().isEmpty() ? null : reason.getText());
    }

    private static String sentence(String words) {
        return Messages.bind(ImportWords.Blocks_reason, FoundPane.capital(words));
    }

    private Optional<BlockChoice> said(CurveBlock block) {
        return session.choice().blocks().stream().filter(c -> c.block() == block.number()).findFirst();
    }

    private void choose(CurveBlock block, Optional<BlockUse> as, Optional<Boolean> taken) {
        session.choose(session.choice().with(new BlockChoice(block.number(), as, taken)));
    }
}
