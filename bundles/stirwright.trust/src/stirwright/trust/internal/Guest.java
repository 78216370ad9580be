package stirwright.trust.internal;

import java.nio.file.Path;
import java.util.concurrent.Future;
import java.util.regex.Pattern;
import org.osgi.framework.Bundle;
import stirwright.trust.DropIn;
import stirwright.trust.DropIn.State;

/** A file in the folder with what is known of it, and its bundle when it was installed. Used by one thread at a time. */
final class Guest {
    /** What a terminal would obey instead of showing it; messages quote what the jar says. */
    private static final Pattern UNSEEN = Pattern.compile("[\\p{Cc}\\p{Cf}\\p{Zl}\\p{Zp}]+");

    private final Path file;
    private final Stamp stamp;
    private final JarContent facts;
    private Bundle bundle;
    private String trouble = "";
    private Future<?> start;

    /** @param facts without their bytes */
    Guest(Path file, Stamp stamp, JarContent facts) {
        this.file = file;
        this.stamp = stamp;
        this.facts = facts;
    }

    Path file() {
        return file;
    }

    Stamp stamp() {
        return stamp;
    }

    JarContent facts() {
        return facts;
    }

    /** Null when nothing of it is installed. */
    Bundle bundle() {
        return bundle;
    }

    void became(Bundle installed) {
        bundle = installed;
        start = null;
    }

    void starts(Future<?> begun) {
        start = begun;
    }

    /** Whether a start was begun that has not come to an end. */
    boolean hangs() {
        return start != null && !start.isDone();
    }

    /** @param words why it does not run, as the rest of a sentence about the file; empty when it does */
    void troubled(String words) {
        trouble = words;
    }

    boolean mayRun(Decisions decisions) {
        return facts.refusal().isEmpty() && decisions.approves(facts.sha256());
    }

    /** A bundle that is activated when it is first used counts as running. */
    boolean runs() {
        return bundle != null && (bundle.getState() == Bundle.ACTIVE || bundle.getState() == Bundle.STARTING && !hangs());
    }

    DropIn seenBy(Decisions decisions) {
        if (!mayRun(decisions)) {
            return view(file, facts, decisions);
        }
        return runs() ? dropIn(file, facts, State.RUNNING, "")
                : dropIn(file, facts, State.UNUSABLE, trouble.isEmpty() ? "was stopped" : trouble);
    }

    /** What a content is that does not run. */
    static DropIn view(Path file, JarContent facts, Decisions decisions) {
        State state = !facts.refusal().isEmpty() ? State.UNUSABLE
                : decisions.declines(facts.sha256()) ? State.DECLINED : State.ASKS;
        return dropIn(file, facts, state, facts.refusal());
    }

    private static DropIn dropIn(Path file, JarContent facts, State state, String message) {
        return new DropIn(file, facts.name(), facts.version(), facts.sha256(), state, UNSEEN.matcher(message).replaceAll(" "));
    }
}
