package stirwright.console.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Lines of cells set under each other: text to the left, numbers to the right. */
final class Columns {
    private final boolean[] right;
    private final List<String[]> lines = new ArrayList<>();

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
        lines.add(cells);
        return this;
    }

    /** Appends the lines with an indent and two spaces between columns; no trailing spaces. */
    void appendTo(StringBuilder text, String indent) {
        int[] widths = new int[right.length];
        for (String[] line : lines) {
            for (int i = 0; i < widths.length; i++) {
                widths[i] = Math.max(widths[i], line[i].length());
            }
        }
        for (String[] line : lines) {
            int start = text.length();
            text.append(indent);
            for (int i = 0; i < widths.length; i++) {
                int gap = widths[i] - line[i].length();
                text.append(right[i] ? " ".repeat(gap) + line[i] : line[i] + " ".repeat(gap));
                text.append(i < widths.length - 1 ? "  " : "");
            }
            int end = text.length();
            while (end > start && text.charAt(end - 1) == ' ') {
                end--;
            }
            text.setLength(end);
            text.append('\n');
        }
    }

    /** Appends a paragraph broken at spaces to fit a width, later lines indented further. */
    static void appendWrapped(StringBuilder text, String indent, String paragraph, int width) {
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
