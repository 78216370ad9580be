package stirwright.workbench.internal.widgets;

import java.util.HashMap;
import java.util.Map;
import java.util.function.Consumer;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.ImageDataProvider;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.PaletteData;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.graphics.Transform;
import org.eclipse.swt.widgets.Control;
import stirwright.chart.CurveStyle;
import stirwright.chart.Palette;

/**
 * Samples of the curves' styles as images. A table draws images by itself; were they painted in its cells, every cell of
 * every row would go through a listener at each keystroke.
 */
public final class Swatches {
    private static final Rectangle PLACE = new Rectangle(0, 0, 40, 14);

    private static final Rectangle MARK = new Rectangle(0, 0, 14, 14);

    private final Map<Integer, Image> images = new HashMap<>();
    private final Map<Integer, Image> marks = new HashMap<>();
    private final Control owner;
    private final Palette palette;

    /** @param owner with whose end the images end */
    public Swatches(Control owner, Palette palette) {
        this.owner = owner;
        this.palette = palette;
        owner.addDisposeListener(e -> {
            images.values().forEach(Image::dispose);
            marks.values().forEach(Image::dispose);
        });
    }

    public Image of(int style, boolean pick) {
        return images.computeIfAbsent(pick ? -1 - style : style,
                key -> new Image(owner.getDisplay(), (ImageDataProvider) zoom -> painted(style, pick, zoom)));
    }

    /** The mark of measured points. */
    public Image mark(int style, boolean used) {
        return marks.computeIfAbsent(used ? style : -1 - style, key -> new Image(owner.getDisplay(), (ImageDataProvider) zoom ->
                painted(zoom, gc -> CurveStyle.paintMark(gc, MARK, style, used, palette), MARK)));
    }

    private ImageData painted(int style, boolean pick, int zoom) {
        return painted(zoom, gc -> CurveStyle.paintSwatch(gc, PLACE, style, pick, palette), PLACE);
    }

    private ImageData painted(int zoom, Consumer<GC> paint, Rectangle place) {
        int width = place.width * zoom / 100;
        int height = place.height * zoom / 100;
        ImageData blank = new ImageData(width, height, 24, new PaletteData(0xFF0000, 0xFF00, 0xFF));
        blank.alphaData = new byte[width * height];
        Image image = new Image(owner.getDisplay(), blank);
        GC gc = new GC(image);
        Transform larger = new Transform(owner.getDisplay());
        larger.scale(zoom / 100f, zoom / 100f);
        gc.setTransform(larger);
        paint.accept(gc);
        larger.dispose();
        gc.dispose();
        ImageData data = image.getImageData();
        image.dispose();
        return data;
    }
}
