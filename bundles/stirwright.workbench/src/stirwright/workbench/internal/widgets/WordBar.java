package stirwright.workbench.internal.widgets;

import java.util.List;
import java.util.function.IntConsumer;
import org.eclipse.swt.SWT;
import org.eclipse.swt.accessibility.ACC;
import org.eclipse.swt.accessibility.AccessibleControlAdapter;
import org.eclipse.swt.accessibility.AccessibleControlEvent;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.widgets.Canvas;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Event;

/** Words side by side of which one is chosen: by the mouse, or with the arrow keys once it has the focus. */
public final class WordBar extends Canvas {
    private static final int GAP = 5 * Looks.STEP;
    private static final int UNDERLINE = 2;

    private final Looks looks;
    private final List<String> words;
    private final IntConsumer chosen;
    private int current;

    /** @param chosen receives the index of a word when another is chosen by hand */
    public WordBar(Composite parent, Looks looks, String name, List<String> words, IntConsumer chosen) {
        super(parent, SWT.DOUBLE_BUFFERED);
        this.looks = looks;
        this.words = List.copyOf(words);
        this.chosen = chosen;
        looks.onPage(this);
        Names.name(this, name);
        addListener(SWT.Paint, e -> paint(e.gc));
        addListener(SWT.MouseDown, this::press);
        addListener(SWT.KeyDown, this::key);
        addListener(SWT.Traverse, e -> e.doit = e.detail != SWT.TRAVERSE_ARROW_NEXT && e.detail != SWT.TRAVERSE_ARROW_PREVIOUS
                && e.detail != SWT.TRAVERSE_RETURN);
        addListener(SWT.FocusIn, e -> redraw());
        addListener(SWT.FocusOut, e -> redraw());
        getAccessible().addAccessibleControlListener(new AccessibleControlAdapter() {
            @Override
            public void getRole(AccessibleControlEvent event) {
                event.detail = ACC.ROLE_COMBOBOX;
            }

            @Override
            public void getValue(AccessibleControlEvent event) {
                event.result = WordBar.this.words.get(current);
            }
        });
    }

    /** Shows which word is chosen, without telling anybody. */
    public void setCurrent(int index) {
        current = index;
        redraw();
    }

    public int current() {
        return current;
    }

    @Override
    public Point computeSize(int widthHint, int heightHint, boolean changed) {
        GC gc = new GC(this);
        int width = words.stream().mapToInt(w -> gc.textExtent(w).x + GAP).sum();
        int height = gc.getFontMetrics().getHeight() + 3 * Looks.STEP;
        gc.dispose();
        return new Point(width, height);
    }

    private void paint(GC gc) {
        gc.setAntialias(SWT.ON);
        int x = 0;
        int height = gc.getFontMetrics().getHeight();
        for (int i = 0; i < words.size(); i++) {
            int width = gc.textExtent(words.get(i)).x;
            gc.setForeground(i == current ? looks.palette().text() : looks.palette().quiet());
            gc.drawText(words.get(i), x, Looks.STEP, true);
            if (i == current) {
                gc.setBackground(looks.palette().accent());
                gc.fillRectangle(x, Looks.STEP + height + 1, width, UNDERLINE);
                if (isFocusControl()) {
                    gc.setForeground(looks.palette().accent());
                    gc.setLineStyle(SWT.LINE_DOT);
                    gc.drawRectangle(Math.max(0, x - 2), 1, width + 3, height + Looks.STEP + UNDERLINE);
                }
            }
            x += width + GAP;
        }
    }

    private void press(Event event) {
        setFocus();
        GC gc = new GC(this);
        int x = 0;
        for (int i = 0; i < words.size(); i++) {
            int width = gc.textExtent(words.get(i)).x;
            if (event.x >= x - GAP / 2 && event.x < x + width + GAP / 2) {
                choose(i);
                break;
            }
            x += width + GAP;
        }
        gc.dispose();
    }

    private void key(Event event) {
        switch (event.keyCode) {
            case SWT.ARROW_LEFT, SWT.ARROW_UP -> choose(Math.max(0, current - 1));
            case SWT.ARROW_RIGHT, SWT.ARROW_DOWN -> choose(Math.min(words.size() - 1, current + 1));
            case SWT.HOME -> choose(0);
            case SWT.END -> choose(words.size() - 1);
            default -> {
                // Other keys mean nothing here.
            }
        }
    }

    private void choose(int index) {
        if (index != current) {
            setCurrent(index);
            chosen.accept(index);
        }
    }
}
