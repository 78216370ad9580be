package stirwright.chart;

import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.RGB;

/** Measures lines in a captured image. */
final class Pixels {
    private final ImageData data;
    private final RGB page;

    Pixels(ImageData data, Palette palette) {
        this.data = data;
        page = palette.page().getRGB();
    }

    RGB at(int x, int y) {
        return data.palette.getRGB(data.getPixel(x, y));
    }

    /** How much of a pixel a colour covers on the page: 0 for the page, 1 for the colour. */
    double covered(int x, int y, Color colour) {
        RGB is = at(x, y);
        RGB full = colour.getRGB();
        double red = page.red - full.red;
        double green = page.green - full.green;
        double blue = page.blue - full.blue;
        return ((page.red - is.red) * red + (page.green - is.green) * green + (page.blue - is.blue) * blue)
                / (red * red + green * green + blue * blue);
    }

    /** The thickness of a level line in one column: what it covers from one row to the other. */
    double thickness(int x, int fromY, int toY, Color colour) {
        double sum = 0;
        for (int y = fromY; y <= toY; y++) {
            sum += covered(x, y, colour);
        }
        return sum;
    }

    /** How many pixels of a rectangle are not the page. */
    int inked(int fromX, int fromY, int toX, int toY) {
        int count = 0;
        for (int y = fromY; y < toY; y++) {
            for (int x = fromX; x < toX; x++) {
                count += at(x, y).equals(page) ? 0 : 1;
            }
        }
        return count;
    }
}
