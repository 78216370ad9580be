package stirwright.exchange.internal.curves;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** Rows of points of one sample under one head. */
final class Stretch {
    final Layout layout;
    final Group group;
    final String sheet;
    final Heads heads;
    final List<WorkRow> rows = new ArrayList<>();

    Stretch(Layout layout, Group group, String sheet, Heads heads) {
        this.layout = layout;
        this.group = group;
        this.sheet = sheet;
        this.heads = heads;
    }

    /**
     * What the heads above call it.
     *
     * @param own a number of its own that is its label; empty without
     * @param sample the sample's name
     * @param run the run's or test's name
     * @param block the interval's name
     */
    record Heads(String own, String sample, String run, String block) {
        static final Heads NONE = new Heads("", "", "", "");

        /** All of it in one line. */
        String words() {
            return String.join(", ", List.of(own, sample, run, block).stream().filter(w -> !w.isEmpty()).toList());
        }
    }

    /** What its sample is called, by its head or by the header of its columns. */
    String sample() {
        return group.label().isEmpty() || layout.groups().size() == 1 ? heads.sample() : group.label();
    }

    /** What tells its sample from others of the source; empty where nothing does. Equal names are one sample. */
    String sampleName() {
        String place = sample().isEmpty() && layout.groups().size() > 1 ? "sample " + group.sample() : "";
        return Stream.of(heads.own(), sample(), place).filter(w -> !w.isEmpty()).collect(Collectors.joining(" "));
    }
}
