package stirwright.trust.internal;

import java.util.List;
import stirwright.trust.Approval;
import stirwright.trust.DropIn;

/** What everybody sees at a moment. */
record Snapshot(List<DropIn> list, List<String> problems, List<Approval> approved) {
    static final Snapshot EMPTY = new Snapshot(List.of(), List.of(), List.of());
}
