package stirwright.chart.internal;

import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Layout;

/** Places SWTChart's plot area where the scene has its plot; its own layout would leave no column for names. */
final class PlotLayout extends Layout {
    private final Board board;
    private final Control plotArea;

    PlotLayout(Board board, Control plotArea) {
        this.board = board;
        this.plotArea = plotArea;
    }

    @Override
    protected Point computeSize(Composite composite, int widthHint, int heightHint, boolean flushCache) {
        return new Point(widthHint < 0 ? 640 : widthHint, heightHint < 0 ? 400 : heightHint);
    }

    @Override
    protected void layout(Composite composite, boolean flushCache) {
        Scene scene = board.scene();
        plotArea.setBounds(scene.empty() ? new Rectangle(0, 0, 0, 0) : scene.plot());
    }
}
