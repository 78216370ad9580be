package stirwright.chart.internal;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Event;

/** What the keyboard does: everything that the mouse does, but for the rectangle. */
public final class Keys {
    private static final int FAST = 10;
    private static final int FASTER = 50;
    private static final double STEP = 1.25;
    private final Board board;

    public Keys(Board board) {
        this.board = board;
        board.plotArea().addListener(SWT.KeyDown, this::pressed);
        board.plotArea().addListener(SWT.Traverse, event -> event.doit = event.detail == SWT.TRAVERSE_TAB_NEXT
                || event.detail == SWT.TRAVERSE_TAB_PREVIOUS);
    }

    private void pressed(Event event) {
        Scene scene = board.scene();
        if (scene.empty()) {
            return;
        }
        Rectangle plot = scene.plot();
        int step = (event.stateMask & SWT.SHIFT) != 0 ? FASTER : (event.stateMask & SWT.CTRL) != 0 ? FAST : 1;
        switch (event.keyCode) {
            case SWT.ARROW_LEFT -> move(-step);
            case SWT.ARROW_RIGHT -> move(step);
            case SWT.ARROW_UP -> board.point(cursor().stepped(scene, -1));
            case SWT.ARROW_DOWN -> board.point(cursor().stepped(scene, 1));
            case SWT.HOME -> board.point(Cursor.at(scene, plot.x, cursor().y()));
            case SWT.END -> board.point(Cursor.at(scene, plot.x + plot.width, cursor().y()));
            case SWT.ESC -> board.point(null);
            case SWT.CR, SWT.KEYPAD_CR -> board.select(cursor().nearestId());
            default -> sign(event.character);
        }
    }

    private void sign(char sign) {
        switch (sign) {
            case '+', '=' -> Pointer.zoom(board, cursor().x(), cursor().y(), STEP);
            case '-' -> Pointer.zoom(board, cursor().x(), cursor().y(), 1 / STEP);
            case '0' -> board.fit();
            default -> { }
        }
    }

    private void move(int pixels) {
        Cursor from = cursor();
        board.point(board.cursor() == null ? from : Cursor.at(board.scene(), from.x() + pixels, from.y()));
    }

    /** Where it is, or the middle for a first key. */
    private Cursor cursor() {
        Rectangle plot = board.scene().plot();
        return board.cursor() != null ? board.cursor()
                : Cursor.at(board.scene(), plot.x + plot.width / 2.0, plot.y + plot.height / 2.0);
    }
}
