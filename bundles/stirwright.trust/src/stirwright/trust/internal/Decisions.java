package stirwright.trust.internal;

import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.stream.Stream;
import stirwright.trust.Approval;

/** The user's word on contents: two lists in the user's folder. Where a hash is on both, the approval counts. */
final class Decisions {
    private static final List<String> APPROVED_HEAD = List.of(
            "# Bundles that this user lets run in Stirwright, by the SHA-256 of the jar; they run with all rights of the user.",
            "# A line is: hash, name and version, date. Only the hash counts. 'stirwright trust' writes this list.");
    private static final List<String> DECLINED_HEAD = List.of(
            "# Bundles that this user does not want to be asked about again, by the SHA-256 of the jar.");

    private final ListFile approved;
    private final ListFile declined;

    Decisions(Path folder) {
        approved = new ListFile(folder.resolve("approved.txt"));
        declined = new ListFile(folder.resolve("declined.txt"));
    }

    /** Reads what has changed. @return whether anything was read */
    boolean refresh() {
        // Both, whatever the first says.
        return approved.refresh() | declined.refresh();
    }

    boolean approves(String sha256) {
        return approved.text().holds(sha256);
    }

    boolean declines(String sha256) {
        return declined.text().holds(sha256);
    }

    List<Approval> approved() {
        return approved.text().entries();
    }

    List<String> problems() {
        return Stream.concat(approved.problems().stream(), declined.problems().stream()).toList();
    }

    void approve(String sha256, String bundle) {
        add(approved, sha256, bundle, APPROVED_HEAD);
        remove(declined, sha256);
    }

    // In this order a crash between the two leaves a hash that is not approved.
    void decline(String sha256, String bundle) {
        remove(approved, sha256);
        add(declined, sha256, bundle, DECLINED_HEAD);
    }

    /** @return whether it was on a list */
    boolean forget(String sha256) {
        return remove(approved, sha256) | remove(declined, sha256);
    }

    private static void add(ListFile list, String sha256, String bundle, List<String> head) {
        String words = bundle.isBlank() ? "(unnamed)" : bundle;
        list.update(held -> held.holds(sha256) ? null : held.with(new Approval(sha256, words, LocalDate.now()), head));
    }

    private static boolean remove(ListFile list, String sha256) {
        return list.exists() && list.update(held -> held.holds(sha256) ? held.without(sha256) : null);
    }
}
