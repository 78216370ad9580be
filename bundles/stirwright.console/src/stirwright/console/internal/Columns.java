package stirwright.console.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Lines of cells set under each other, text to the left and numbers to the right; sentences may
 * stand under a line.
 */
final class Columns {
    private static final String UNDER = "      ";

    private final boolean[] right;
    private final List<Line> lines = new ArrayList<>();

    private record Line(String[] cells, List<String> under) {}

    /** @param alignment one character a column, {@code l} or {@code r} */
    Columns(String alignment) {
        right = new boolean[alignment.length()];
        for (int i = 0; i < right.length; i++) {
            right[i] = alignment.charAt(i) == 'r';
        }
    }

    Columns add(String... cells) {
        if (cells.length != right.length) {
            throw new IllegalArgumentException(cells.length + " cells for " + right.length + " columns");
        }
        lines.add(new Line(cells, new ArrayList<>()));
        return this;
    }

    /** A sentence under the line that was added last. */
    Columns under(String sentence) {
        lines.getLast().under().add(sentence);
        return this;
    }

    /** Appends the lines with an indent and two spaces between columns; no trailing spaces. */
    void appendTo(StringBuilder text, String indent, int width) {
        int[] widths = new int[right.length];
        for (Line line : lines) {
            for (int i = 0; i < widths.length; i++) {
                widths[i] = Math.max(widths[i], line.cells()[i].length());
            }
        }
        for (Line line : lines) {
            text.append(indent);
            set(text, line.cells(), widths);
            text.append('\n');
            line.under().forEach(sentence -> appendWrapped(text, indent + UNDER, sentence, width));
        }
    }

    private void set(StringBuilder text, String[] cells, int[] widths) {
        for (int i = 0; i < widths.length; i++) {
            int gap = widths[i] - cells[i].length();
            if (right[i]) {
                text.repeat(' ', gap).append(cells[i]);
            } else {
                text.append(cells[i]).repeat(' ', gap);
            }
            text.append("  ");
        }
        while (text.charAt(text.length() - 1) == ' ') {
            text.setLength(text.length() - 1);
        }
    }

    /** Appends a paragraph broken at spaces to fit a width, later lines indented further. */
    static void appendWrapped(StringBuilder text, String indent, String paragraph, int width) {
        if (indent.length() + paragraph.length() <= width) {
            text.append(indent).append(paragraph).append('\n');
            return;
        }
        String further = indent + "  ";
        StringBuilder line = new StringBuilder(indent);
        int least = indent.length();
        for (String word : Arrays.asList(paragraph.split(" "))) {
            if (line.length() > least && line.length() + 1 + word.length() > width) {
                text.append(line).append('\n');
                line = new StringBuilder(further);
                least = further.length();
            }
            line.append(line.length() > least ? " " : "").append(word);
        }
        text.append(line).append('\n');
    }
}
