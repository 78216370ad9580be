package stirwright.workbench.internal.widgets;

import java.util.stream.Stream;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;

/** A label that ends in an ellipsis where its text does not fit; the whole text is its tooltip then, before any reason. */
public final class FittedLabel {
    private final Label label;
    private final Shortened shortened = new Shortened();
    private String text = "";
    private String reason = "";

    public FittedLabel(Composite parent, Looks looks) {
        label = looks.label(parent, SWT.NONE, "");
        label.addListener(SWT.Resize, e -> fit());
    }

    public Label label() {
        return label;
    }

    public void setText(String words) {
        setText(words, "");
    }

    /** @param why what stands behind the text, shown on hovering; may be empty */
    public void setText(String words, String why) {
        if (!words.equals(text) || !why.equals(reason)) {
            text = words;
            reason = why;
            fit();
        }
    }

    /** The whole text, shown or not. */
    public String text() {
        return text;
    }

    private void fit() {
        GC gc = new GC(label);
        gc.setFont(label.getFont());
        String shown = shortened.fit(gc, text, label.getSize().x);
        gc.dispose();
        String literal = Looks.literal(shown);
        if (!label.getText().equals(literal)) {
            label.setText(literal);
        }
        String tip = String.join("\n", Stream.of(shown.equals(text) ? "" : text, reason).filter(t -> !t.isEmpty()).toList());
        label.setToolTipText(tip.isEmpty() ? null : tip);
    }
}
