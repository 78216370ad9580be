package stirwright.workbench.internal.flow;

import java.util.List;

/** A heading and the lines below it. */
public record Section(String title, List<String> lines) {
    public Section {
        lines = List.copyOf(lines);
    }
}
