package stirwright.workbench.internal.widgets;

import org.eclipse.jface.resource.FontDescriptor;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Font;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Link;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.Text;
import stirwright.chart.Palette;

/** Colours, fonts and distances of the whole window. Lives as long as the display. */
public final class Looks {
    /** The step of all distances, in points. */
    public static final int STEP = 4;

    private final Palette palette;
    private final Font strong;
    private final Font small;
    private final Font smallStrong;

    public Looks(Display display) {
        palette = Palette.of(display);
        FontDescriptor system = FontDescriptor.createFrom(display.getSystemFont());
        strong = system.setStyle(SWT.BOLD).createFont(display);
        small = system.increaseHeight(-1).createFont(display);
        smallStrong = system.increaseHeight(-1).setStyle(SWT.BOLD).createFont(display);
        display.disposeExec(() -> {
            strong.dispose();
            small.dispose();
            smallStrong.dispose();
        });
    }

    public Palette palette() {
        return palette;
    }

    /** For headings. */
    public Font strong() {
        return strong;
    }

    /** For captions and remarks. */
    public Font small() {
        return small;
    }

    /** For what matters among captions. */
    public Font smallStrong() {
        return smallStrong;
    }

    /** Puts a control on the page. */
    public <C extends Control> C onPage(C control) {
        control.setBackground(palette.page());
        control.setForeground(palette.text());
        return control;
    }

    /** Raises a field above the page, which it would else take its colour from. */
    public Text field(Text text) {
        text.setBackground(palette.surface());
        text.setForeground(palette.text());
        return text;
    }

    /** A table with its header, raised above the page, in letters that let many rows be seen. */
    public Table table(Table table) {
        table.setHeaderVisible(true);
        table.setFont(small);
        table.setBackground(palette.surface());
        table.setForeground(palette.text());
        return table;
    }

    /** An empty area of the page. */
    public Composite area(Composite parent) {
        Composite area = onPage(new Composite(parent, SWT.NONE));
        area.setBackgroundMode(SWT.INHERIT_FORCE);
        return area;
    }

    public Label label(Composite parent, int style, String text) {
        Label label = onPage(new Label(parent, style));
        label.setText(text);
        return label;
    }

    /** Text of people's own for a label, which would take a single ampersand for the mark of a key. */
    public static String literal(String words) {
        return words.replace("&", "&&");
    }

    /** Words that recede. */
    public Label quiet(Composite parent, int style, String text) {
        Label label = label(parent, style, text);
        label.setForeground(palette.quiet());
        return label;
    }

    /** Words that act, in place of a button where there are many. */
    public Link link(Composite parent, String text, Runnable action) {
        Link link = onPage(new Link(parent, SWT.NONE));
        link.setText(act(text));
        link.setLinkForeground(palette.accent());
        link.addListener(SWT.Selection, e -> action.run());
        return link;
    }

    /** Words as a link takes them. */
    public static String act(String words) {
        return "<a>" + words + "</a>";
    }

    public Button button(Composite parent, String verb, Runnable action) {
        Button button = new Button(parent, SWT.PUSH);
        button.setText(verb);
        button.addListener(SWT.Selection, e -> action.run());
        return button;
    }
}
