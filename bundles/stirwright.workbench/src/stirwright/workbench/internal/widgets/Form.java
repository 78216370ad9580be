package stirwright.workbench.internal.widgets;

import java.util.List;
import java.util.function.Consumer;
import java.util.function.IntConsumer;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;
import stirwright.workbench.internal.Units;

/** A column of labelled fields: labels flush right, fields, units in grey. */
public final class Form extends Composite {
    /** A short caption, the rest of a caption, the field, its unit. */
    private static final int COLUMNS = 4;
    private static final int LABEL_WIDTH = 33 * Looks.STEP;
    private static final int UNIT_WIDTH = 14 * Looks.STEP;
    private static final int FIELD_WIDTH = 20 * Looks.STEP;

    private final Looks looks;
    private final int labelWidth;

    public Form(Composite parent, Looks looks) {
        this(parent, looks, LABEL_WIDTH);
    }

    /** @param labelWidth in points */
    public Form(Composite parent, Looks looks, int labelWidth) {
        super(parent, SWT.NONE);
        this.looks = looks;
        this.labelWidth = labelWidth;
        looks.onPage(this);
        setBackgroundMode(SWT.INHERIT_FORCE);
        GridLayout layout = new GridLayout(COLUMNS, false);
        layout.marginWidth = 3 * Looks.STEP;
        layout.marginHeight = 2 * Looks.STEP;
        layout.verticalSpacing = Looks.STEP / 2;
        layout.horizontalSpacing = 2 * Looks.STEP;
        setLayout(layout);
    }

    public Looks looks() {
        return looks;
    }

    /** A heading with, at its end, the words that act on the group. */
    public Composite heading(String title) {
        Composite line = looks.area(this);
        GridData data = new GridData(SWT.FILL, SWT.CENTER, true, false, COLUMNS, 1);
        data.verticalIndent = getChildren().length > 1 ? 2 * Looks.STEP : 0;
        line.setLayoutData(data);
        GridLayout layout = new GridLayout(4, false);
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        line.setLayout(layout);
        Label label = looks.label(line, SWT.NONE, title);
        label.setFont(looks.strong());
        label.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
        return line;
    }

    /** For a control of the caller's own that has a line for itself. */
    public static GridData wholeLine() {
        return new GridData(SWT.FILL, SWT.CENTER, true, false, COLUMNS, 1);
    }

    /** A sentence in place of fields. */
    public Label sentence(String words) {
        Label label = looks.label(this, SWT.WRAP, words);
        GridData data = new GridData(SWT.FILL, SWT.TOP, true, false, COLUMNS, 1);
        data.widthHint = labelWidth + FIELD_WIDTH;
        label.setLayoutData(data);
        return label;
    }

    /** A caption alone; what belongs to it fills the two places behind it. */
    public void captioned(String title, String meaning) {
        FittedLabel caption = new FittedLabel(this, looks);
        caption.label().setAlignment(SWT.RIGHT);
        caption.setText(title, meaning);
        GridData data = new GridData(SWT.FILL, SWT.CENTER, false, false, 2, 1);
        data.widthHint = labelWidth;
        caption.label().setLayoutData(data);
    }

    /** A line of words that cannot be changed. */
    public void readOnly(String title, String words) {
        caption(title, "");
        Label label = looks.label(this, SWT.WRAP, Looks.literal(words));
        GridData data = new GridData(SWT.FILL, SWT.CENTER, true, false, 2, 1);
        data.widthHint = FIELD_WIDTH;
        label.setLayoutData(data);
    }

    /** A choice among words; the unit's column stays empty. */
    public Combo choice(String title, List<String> words, int current, IntConsumer chosen) {
        caption(title, "");
        return combo(2, FIELD_WIDTH + UNIT_WIDTH, title, words, current, chosen);
    }

    /** A choice among long words: its caption is short and leaves it the room. */
    public Combo wideChoice(String title, List<String> words, int current, IntConsumer chosen) {
        looks.label(this, SWT.NONE, title).setLayoutData(new GridData(SWT.LEFT, SWT.CENTER, false, false));
        return combo(3, labelWidth, title, words, current, chosen);
    }

    private Combo combo(int columns, int width, String title, List<String> words, int current, IntConsumer chosen) {
        Combo combo = Names.name(new Combo(this, SWT.READ_ONLY | SWT.DROP_DOWN), title);
        combo.setItems(words.toArray(String[]::new));
        if (current >= 0) {
            combo.select(current);
        }
        combo.addListener(SWT.Selection, e -> chosen.accept(combo.getSelectionIndex()));
        // The wheel scrolls the form; it must not change a case in passing.
        combo.addListener(SWT.MouseVerticalWheel, e -> e.doit = false);
        GridData data = new GridData(SWT.FILL, SWT.CENTER, true, false, columns, 1);
        data.widthHint = width;
        combo.setLayoutData(data);
        return combo;
    }

    /**
     * A line of plain text.
     *
     * @param name for those who hear the window, where the title alone says too little
     */
    public Text text(String title, String name, String value) {
        caption(title, "");
        Text text = looks.field(Names.name(new Text(this, SWT.BORDER), name));
        text.setText(value);
        GridData data = new GridData(SWT.FILL, SWT.CENTER, true, false, 2, 1);
        data.widthHint = FIELD_WIDTH;
        text.setLayoutData(data);
        return text;
    }

    /**
     * A field for a number with the unit behind it.
     *
     * @param meaning shown by the caption on hovering
     */
    Text number(String title, String unit, String meaning) {
        // The name that is heard keeps plain letters, which voices and keyboards know.
        String heard = Units.brief(unit);
        Text text = field(title, heard.isEmpty() ? title : title + ", " + heard, meaning);
        Label behind = looks.quiet(this, SWT.NONE, Units.show(unit));
        GridData unitData = new GridData(SWT.LEFT, SWT.CENTER, false, false);
        unitData.widthHint = UNIT_WIDTH;
        behind.setLayoutData(unitData);
        return text;
    }

    /** A field for a number with words behind it that act on it. */
    Text number(String title, String name, String act, Runnable action) {
        Text text = field(title, name, "");
        Names.name(looks.link(this, act, action), act + ", " + name).setLayoutData(new GridData(SWT.LEFT, SWT.CENTER, false, false));
        return text;
    }

    private Text field(String title, String name, String meaning) {
        caption(title, meaning);
        Text text = looks.field(Names.name(new Text(this, SWT.BORDER | SWT.RIGHT), name));
        GridData data = new GridData(SWT.FILL, SWT.CENTER, true, false);
        data.widthHint = FIELD_WIDTH;
        data.minimumWidth = FIELD_WIDTH;
        text.setLayoutData(data);
        return text;
    }

    /** A line of words below a field, hidden while it has nothing to say. */
    Label remark() {
        Label label = looks.label(this, SWT.WRAP, "");
        label.setFont(looks.small());
        GridData data = new GridData(SWT.FILL, SWT.TOP, true, false, COLUMNS, 1);
        data.exclude = true;
        data.widthHint = labelWidth + FIELD_WIDTH;
        label.setLayoutData(data);
        label.setVisible(false);
        return label;
    }

    /** Something to switch on and off. */
    public Button check(String words, boolean on, Consumer<Boolean> switched) {
        Button button = looks.onPage(new Button(this, SWT.CHECK | SWT.WRAP));
        button.setText(words);
        button.setSelection(on);
        button.addListener(SWT.Selection, e -> switched.accept(button.getSelection()));
        GridData data = new GridData(SWT.FILL, SWT.CENTER, true, false, COLUMNS, 1);
        data.horizontalIndent = labelWidth < LABEL_WIDTH ? 0 : 6 * Looks.STEP;
        // Long words take a second line instead of room that is not there.
        data.widthHint = labelWidth + FIELD_WIDTH;
        button.setLayoutData(data);
        return button;
    }

    private void caption(String title, String meaning) {
        Label label = looks.label(this, SWT.RIGHT, title);
        GridData data = new GridData(SWT.RIGHT, SWT.CENTER, false, false, 2, 1);
        data.widthHint = labelWidth;
        label.setLayoutData(data);
        label.setToolTipText(meaning.isEmpty() ? null : meaning);
    }
}
