package stirwright.chart;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.function.Consumer;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.ImageLoader;
import org.eclipse.swt.graphics.RGB;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Shell;

/**
 * Shows invented curves in a window; with a folder as argument it writes pictures there instead: light, dark and grey, as
 * captured from the screen, and as painted for a screen of 200 %.
 */
public final class ChartDemo {
    private final Display display = new Display();
    private final Shell shell = new Shell(display);
    private final ChartView view = new ChartView(shell, Palette.of(display));

    private ChartDemo() {
        shell.setLayout(new FillLayout());
        shell.setText("Invented curves");
        shell.setSize(900, 600);
        view.show(Invented.few());
        shell.open();
    }

    public static void main(String... args) throws IOException {
        ChartDemo demo = new ChartDemo();
        if (args.length == 0) {
            while (!demo.shell.isDisposed()) {
                if (!demo.display.readAndDispatch()) {
                    demo.display.sleep();
                }
            }
        } else {
            demo.write(Files.createDirectories(Path.of(args[0])));
        }
        demo.display.dispose();
    }

    private void write(Path folder) throws IOException {
        for (Palette palette : new Palette[] {Palette.light(), Palette.dark()}) {
            String theme = palette.isDark() ? "dark" : "light";
            view.setPalette(palette);
            save(folder, palette, theme + "-few", Invented.few(), none -> { });
            save(folder, palette, theme + "-few-hover", Invented.few(), chart -> point(chart, 300, 220));
            save(folder, palette, theme + "-many", Invented.many(25), none -> { });
            save(folder, palette, theme + "-many-hover", Invented.many(25), chart -> point(chart, 420, 260));
            save(folder, palette, theme + "-linear-hover", Invented.linear(), chart -> point(chart, 600, 150));
            save(folder, palette, theme + "-empty", 
                    Picture.empty("No candidate has a curve for this case. Choose an impeller in the case to see its curves."), none -> { });
        }
    }

    private void save(Path folder, Palette palette, String name, Picture picture, Consumer<ChartView> act) throws IOException {
        view.reset();
        view.show(picture);
        act.accept(view);
        settle(display);
        ImageData data = capture(view);
        write(folder.resolve(name + ".png"), data);
        write(folder.resolve(name + "-grey.png"), grey(data));
        write(folder.resolve(name + "-200.png"), view.image(900, 600, 2, palette));
    }

    private static void write(Path file, ImageData data) {
        ImageLoader loader = new ImageLoader();
        loader.data = new ImageData[] {data};
        loader.save(file.toString(), SWT.IMAGE_PNG);
    }

    static void settle(Display display) {
        for (int quiet = 0; quiet < 20;) {
            quiet = display.readAndDispatch() ? 0 : quiet + 1;
            if (quiet > 0) {
                try {
                    Thread.sleep(2);
                } catch (InterruptedException stop) {
                    Thread.currentThread().interrupt();
                    return;
                }
            }
        }
    }

    /** The pointer at a place of the plot area. */
    static void point(ChartView view, int x, int y) {
        send(view, SWT.MouseMove, x, y, 0);
    }

    static void send(ChartView view, int type, int x, int y, int button) {
        Event event = new Event();
        event.x = x;
        event.y = y;
        event.button = button;
        event.count = 1;
        SwtWindow.plotArea(view).notifyListeners(type, event);
    }

    /** What is on the screen, with all its pixels. */
    static ImageData capture(ChartView view) {
        Rectangle area = view.getBounds();
        Image image = new Image(view.getDisplay(), area.width, area.height);
        GC gc = new GC(view);
        gc.copyArea(image, 0, 0);
        gc.dispose();
        ImageData data = image.getImageData();
        image.dispose();
        return data;
    }

    /** The same without colour, by the luma weights of ITU-R BT.601. */
    static ImageData grey(ImageData data) {
        ImageData grey = (ImageData) data.clone();
        for (int y = 0; y < data.height; y++) {
            for (int x = 0; x < data.width; x++) {
                RGB rgb = data.palette.getRGB(data.getPixel(x, y));
                int luma = (int) Math.round(0.299 * rgb.red + 0.587 * rgb.green + 0.114 * rgb.blue);
                grey.setPixel(x, y, grey.palette.getPixel(new RGB(luma, luma, luma)));
            }
        }
        return grey;
    }
}
