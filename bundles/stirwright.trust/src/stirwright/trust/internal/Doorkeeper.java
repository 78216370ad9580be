package stirwright.trust.internal;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Stream;

/**
 * Compares the folder and the user's lists with what runs, and lets in or turns out. Nothing is installed but bytes that were
 * read at that moment and whose hash is approved. Used by one thread at a time.
 */
final class Doorkeeper {
    private final FolderWatch watch;
    private final Decisions decisions;
    private final Host host;
    private final SortedMap<Path, Guest> guests = new TreeMap<>();

    Doorkeeper(FolderWatch watch, Decisions decisions, Host host) {
        this.watch = watch;
        this.decisions = decisions;
        this.host = host;
    }

    /** @param atOnce takes every file as it is, also one that may still be written */
    Snapshot look(boolean atOnce) {
        boolean told = decisions.refresh();
        Map<Path, Stamp> files = watch.look(atOnce);
        boolean left = turnOut(files);
        if (left) {
            host.settle();
        }
        boolean came = letIn(files);
        // Elsewhere first: it must be asked every time.
        if (host.changedElsewhere() || told || left || came) {
            startWhatCan();
        }
        return new Snapshot(guests.values().stream().map(guest -> guest.seenBy(decisions)).toList(),
                Stream.of(decisions.problems(), host.problems(), List.of(watch.problem())).flatMap(List::stream)
                        .filter(problem -> !problem.isEmpty()).toList(),
                decisions.approved());
    }

    /** Stops everything; used when nobody watches any more. */
    void close() {
        guests.values().stream().filter(Guest::runs).forEach(host::stop);
    }

    /** @return whether a file has gone or changed, or a bundle may no longer run */
    private boolean turnOut(Map<Path, Stamp> files) {
        boolean left = false;
        for (Guest guest : List.copyOf(guests.values())) {
            boolean other = !guest.stamp().equals(files.get(guest.file()));
            if (other) {
                guests.remove(guest.file());
            }
            if (other || guest.bundle() != null && !guest.mayRun(decisions)) {
                host.remove(guest);
                left = true;
            }
        }
        return left;
    }

    private boolean letIn(Map<Path, Stamp> files) {
        boolean came = false;
        for (Map.Entry<Path, Stamp> file : files.entrySet()) {
            if (!guests.containsKey(file.getKey())) {
                JarContent content = JarContent.read(file.getKey());
                Guest guest = new Guest(file.getKey(), file.getValue(), content.withoutBytes());
                guests.put(guest.file(), guest);
                if (guest.mayRun(decisions)) {
                    host.install(guest, content);
                }
                came = true;
            }
        }
        return came;
    }

    /** One that started may be what another one waits for, so it goes round until nothing more starts. */
    private void startWhatCan() {
        boolean again = true;
        while (again) {
            again = false;
            for (Guest guest : guests.values()) {
                if (guest.mayRun(decisions) && !guest.runs() && !guest.hangs()) {
                    again |= tryToStart(guest);
                }
            }
        }
    }

    private boolean tryToStart(Guest guest) {
        if (guest.bundle() == null) {
            JarContent content = JarContent.read(guest.file());
            if (!content.sha256().equals(guest.facts().sha256())) {
                // Overwritten since the last look; the next one finds a new stamp.
                return false;
            }
            host.install(guest, content);
        }
        return guest.bundle() != null && host.start(guest);
    }
}
