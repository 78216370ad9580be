package stirwright.workbench.internal.importing;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StyleRange;
import org.eclipse.swt.custom.StyledText;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Composite;
import stirwright.exchange.ImportMessage;
import stirwright.exchange.ImportMessage.Weight;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;

/** What somebody should see before taking anything: problems first, then what can make the numbers wrong, then the rest. */
final class MessageLines extends Composite {
    private static final int MOST_LINES = 4;

    private final Looks looks;
    private final StyledText text;

    MessageLines(Composite parent, Looks looks) {
        super(parent, SWT.NONE);
        this.looks = looks;
        setLayout(new FillLayout());
        text = Names.name(new StyledText(this, SWT.READ_ONLY | SWT.WRAP | SWT.V_SCROLL), ImportWords.Messages_name);
        text.setAlwaysShowScrollBars(false);
        text.setMargins(3 * Looks.STEP, Looks.STEP, Looks.STEP, Looks.STEP);
        text.setBackground(looks.palette().surface());
        text.setForeground(looks.palette().text());
        text.addListener(SWT.Traverse, e -> e.doit |= e.detail == SWT.TRAVERSE_TAB_NEXT || e.detail == SWT.TRAVERSE_TAB_PREVIOUS);
        // A bar at its edge says how much the worst of them matters.
        text.addListener(SWT.Paint, e -> {
            e.gc.setBackground((Color) text.getData());
            e.gc.fillRectangle(0, 0, Looks.STEP, text.getSize().y);
        });
        text.setData(looks.palette().hairline());
    }

    /** Says whether it needs another height now. */
    boolean show(ImportSession session) {
        List<ImportMessage> all = new ArrayList<>();
        session.reading().filter(r -> !r.problem().isEmpty()).ifPresent(r -> all.add(new ImportMessage(Weight.PROBLEM, r.problem())));
        session.found().ifPresent(f -> f.messages().stream().sorted((a, b) -> b.weight().compareTo(a.weight())).forEach(all::add));
        StringBuilder words = new StringBuilder();
        List<StyleRange> styles = new ArrayList<>();
        for (ImportMessage message : all) {
            String word = word(message.weight());
            if (!word.isEmpty()) {
                styles.add(new StyleRange(words.length(), word.length(), colour(message.weight()), null, SWT.BOLD));
            }
            words.append(word).append(word.isEmpty() ? "" : " ").append(message.words()).append('\n');
        }
        text.setText(words.toString().stripTrailing());
        text.setStyleRanges(styles.toArray(StyleRange[]::new));
        text.setData(all.isEmpty() ? looks.palette().hairline() : colour(all.get(0).weight()));
        text.redraw();
        GridData data = (GridData) getLayoutData();
        int height = Math.min(text.computeSize(Math.max(100, getParent().getClientArea().width - 8 * Looks.STEP), SWT.DEFAULT).y,
                MOST_LINES * text.getLineHeight() + 2 * Looks.STEP);
        boolean moved = data.exclude != all.isEmpty() || data.heightHint != height;
        data.exclude = all.isEmpty();
        data.heightHint = height;
        setVisible(!all.isEmpty());
        return moved;
    }

    private static String word(Weight weight) {
        return switch (weight) {
            case PROBLEM -> ImportWords.Weight_problem;
            case WARNING -> ImportWords.Weight_warning;
            case NOTE -> "";
        };
    }

    private Color colour(Weight weight) {
        return switch (weight) {
            case PROBLEM -> looks.palette().outside();
            case WARNING -> looks.palette().near();
            case NOTE -> looks.palette().hairline();
        };
    }
}
