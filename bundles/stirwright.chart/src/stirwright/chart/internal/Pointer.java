package stirwright.chart.internal;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;

/** What the mouse does: reads, selects, zooms about the pointer or to a rectangle, moves what is in view. */
public final class Pointer {
    private static final int DRAG = 5;
    private static final int NEAR = 8;
    private static final double STEP = 1.25;

    private final Board board;
    private Point start;
    private int button;
    private Span startX;
    private Span startY;

    public Pointer(Board board) {
        this.board = board;
        Control plot = board.plotArea();
        plot.addListener(SWT.MouseMove, this::moved);
        plot.addListener(SWT.MouseExit, event -> left());
        plot.addListener(SWT.MouseDown, this::pressed);
        plot.addListener(SWT.MouseUp, this::released);
        plot.addListener(SWT.MouseDoubleClick, event -> board.fit());
        plot.addListener(SWT.MouseVerticalWheel, this::turned);
        board.chart().addListener(SWT.MouseMove, event -> tip(board.chart(), event.x, event.y));
        board.chart().addListener(SWT.MouseUp, this::named);
    }

    private Point place(Event event) {
        Point origin = board.plotArea().getLocation();
        return new Point(event.x + origin.x, event.y + origin.y);
    }

    private void moved(Event event) {
        Point at = place(event);
        if (start != null && button == 1 && far(at)) {
            board.rubber(new Rectangle(Math.min(start.x, at.x), Math.min(start.y, at.y), Math.abs(at.x - start.x),
                    Math.abs(at.y - start.y)));
        } else if (start != null && button != 1) {
            Rectangle plot = board.scene().plot();
            board.zoom(startX.panned((start.x - at.x) / (double) plot.width), startY.panned((at.y - start.y) / (double) plot.height));
        } else if (!board.scene().empty()) {
            board.point(Cursor.at(board.scene(), at.x, at.y));
            tip(board.plotArea(), at.x, at.y);
        }
    }

    private void left() {
        if (start == null) {
            board.point(null);
        }
    }

    private void pressed(Event event) {
        board.plotArea().forceFocus();
        start = place(event);
        button = event.button;
        startX = board.scene().x().span();
        startY = board.scene().y().span();
    }

    private void released(Event event) {
        Point at = place(event);
        Point from = start;
        start = null;
        board.rubber(null);
        if (from == null || button != 1) {
            return;
        }
        Scene scene = board.scene();
        if (Math.abs(at.x - from.x) > DRAG && Math.abs(at.y - from.y) > DRAG) {
            double atX = scene.x().clamp(at.x);
            double atY = scene.y().clamp(at.y);
            board.zoom(startX.between(scene.x().value(from.x), scene.x().value(atX)),
                    startY.between(scene.y().value(from.y), scene.y().value(atY)));
        } else if (event.count < 2) {
            Trace near = scene.near(at.x, at.y, NEAR);
            board.select(near == null ? null : near.curve().id());
        }
    }

    private boolean far(Point at) {
        return Math.abs(at.x - start.x) > DRAG || Math.abs(at.y - start.y) > DRAG;
    }

    private void turned(Event event) {
        Point at = place(event);
        zoom(board, at.x, at.y, Math.pow(STEP, Math.signum(event.count)));
        event.doit = false;
    }

    static void zoom(Board board, double x, double y, double factor) {
        Scene scene = board.scene();
        board.zoom(scene.x().span().zoomed(scene.x().value(x), factor), scene.y().span().zoomed(scene.y().value(y), factor));
    }

    private void named(Event event) {
        Hint hint = board.scene().hintAt(event.x, event.y);
        board.select(hint == null ? null : hint.curveId());
    }

    private void tip(Control control, int x, int y) {
        Hint hint = board.scene().hintAt(x, y);
        String full = hint == null || hint.full().isEmpty() ? null : hint.full();
        if (!java.util.Objects.equals(full, control.getToolTipText())) {
            control.setToolTipText(full);
        }
    }
}
