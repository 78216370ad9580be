package stirwright.chart;

import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.swtchart.Chart;

/** A chart view in a real window of 900 by 600 pixels. */
final class SwtWindow implements AutoCloseable {
    final Display display = Display.getDefault();
    final Shell shell = new Shell(display);
    final ChartView view;

    SwtWindow(Palette palette) {
        shell.setLayout(new FillLayout());
        view = new ChartView(shell, palette);
        shell.setSize(900, 600);
        shell.open();
        ChartDemo.settle(display);
    }

    void show(Picture picture) {
        view.show(picture);
        ChartDemo.settle(display);
    }

    Control plotArea() {
        return plotArea(view);
    }

    static Control plotArea(Composite view) {
        return ((Chart) view.getChildren()[0]).getPlotArea().getControl();
    }

    @Override
    public void close() {
        shell.dispose();
        ChartDemo.settle(display);
    }
}
