package stirwright.chart.internal;

import java.util.Arrays;
import java.util.Comparator;

/** Keeps labels in a column from overlapping. */
public final class Spread {
    private Spread() { }

    /**
     * Places for labels of one height that overlap nowhere, keep the order of what was wanted and move as little as
     * needed: labels that would overlap become a block about their common middle.
     *
     * @param wanted the middles that the labels would like
     * @param height of a label, with the air about it
     * @param top the least top of a label
     * @param bottom the largest bottom; wins no room when the labels need more than there is
     * @return the middles they get
     */
    public static double[] apart(double[] wanted, double height, double top, double bottom) {
        Integer[] order = new Integer[wanted.length];
        Arrays.setAll(order, i -> i);
        Arrays.sort(order, Comparator.comparingDouble(i -> wanted[i]));
        double[] middle = new double[wanted.length];
        int[] size = new int[wanted.length];
        int blocks = 0;
        for (int i : order) {
            middle[blocks] = within(wanted[i], 1, height, top, bottom);
            size[blocks++] = 1;
            while (blocks > 1 && middle[blocks - 1] - middle[blocks - 2] < (size[blocks - 1] + size[blocks - 2]) * height / 2) {
                int merged = size[blocks - 2] + size[blocks - 1];
                double mean = (middle[blocks - 2] * size[blocks - 2] + middle[blocks - 1] * size[blocks - 1]) / merged;
                size[blocks - 2] = merged;
                middle[blocks - 2] = within(mean, merged, height, top, bottom);
                blocks--;
            }
        }
        double[] placed = new double[wanted.length];
        int next = 0;
        for (int block = 0; block < blocks; block++) {
            for (int i = 0; i < size[block]; i++) {
                placed[order[next++]] = middle[block] + (i - (size[block] - 1) / 2.0) * height;
            }
        }
        return placed;
    }

    private static double within(double middle, int size, double height, double top, double bottom) {
        double half = size * height / 2;
        return Math.max(top + half, Math.min(bottom - half, middle));
    }
}
