package stirwright.workbench.internal.flowpage;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StyleRange;
import org.eclipse.swt.custom.StyledText;
import stirwright.workbench.internal.flow.Section;

/** Headings and lines in a text that scrolls. */
final class Sections {

    private Sections() {}

    /** @param same whether it is still about the same thing, so that the reader keeps the place */
    static void show(StyledText text, List<Section> sections, boolean same) {
        StringBuilder words = new StringBuilder();
        List<StyleRange> headings = new ArrayList<>();
        for (Section section : sections) {
            if (words.length() > 0) {
                words.append('\n');
            }
            headings.add(new StyleRange(words.length(), section.title().length(), null, null, SWT.BOLD));
            words.append(section.title()).append('\n');
            section.lines().forEach(line -> words.append(line).append('\n'));
        }
        if (!text.getText().equals(words.toString())) {
            int top = text.getTopPixel();
            text.setText(words.toString());
            text.setStyleRanges(headings.toArray(StyleRange[]::new));
            text.setTopPixel(same ? top : 0);
        }
    }
}
