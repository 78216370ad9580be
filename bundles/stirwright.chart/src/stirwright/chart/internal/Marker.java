package stirwright.chart.internal;

import org.eclipse.swt.graphics.GC;

/** Shapes that tell curves apart without colour. Filled with the background colour of the GC, so that they read as hollow. */
public enum Marker {
    CIRCLE, SQUARE, TRIANGLE, DIAMOND, CROSS, DOWNWARD, PLUS, BAR;

    private static final int[] SHAPE = new int[8];

    /** Draws one about a point, some 7 pixels wide, in the colours of the GC. Only for the UI thread. */
    public void draw(GC gc, int x, int y) {
        switch (this) {
            case CIRCLE -> {
                gc.fillOval(x - 3, y - 3, 6, 6);
                gc.drawOval(x - 3, y - 3, 6, 6);
            }
            case SQUARE -> {
                gc.fillRectangle(x - 3, y - 3, 6, 6);
                gc.drawRectangle(x - 3, y - 3, 6, 6);
            }
            case TRIANGLE -> polygon(gc, x, y - 4, x + 4, y + 3, x - 4, y + 3, x, y - 4);
            case DIAMOND -> polygon(gc, x, y - 4, x + 4, y, x, y + 4, x - 4, y);
            case DOWNWARD -> polygon(gc, x, y + 4, x + 4, y - 3, x - 4, y - 3, x, y + 4);
            case CROSS -> {
                gc.drawLine(x - 3, y - 3, x + 3, y + 3);
                gc.drawLine(x - 3, y + 3, x + 3, y - 3);
            }
            case PLUS -> {
                gc.drawLine(x - 4, y, x + 4, y);
                gc.drawLine(x, y - 4, x, y + 4);
            }
            case BAR -> gc.drawLine(x, y - 4, x, y + 4);
        }
    }

    /** Four corners, in an array that is used again and again, since a chart paints hundreds of these. */
    private static void polygon(GC gc, int x1, int y1, int x2, int y2, int x3, int y3, int x4, int y4) {
        SHAPE[0] = x1;
        SHAPE[1] = y1;
        SHAPE[2] = x2;
        SHAPE[3] = y2;
        SHAPE[4] = x3;
        SHAPE[5] = y3;
        SHAPE[6] = x4;
        SHAPE[7] = y4;
        gc.fillPolygon(SHAPE);
        gc.drawPolygon(SHAPE);
    }
}
