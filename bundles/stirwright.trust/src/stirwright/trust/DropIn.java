package stirwright.trust;

import java.nio.file.Path;

/**
 * A jar that was dropped in, as it stood when it was last read.
 *
 * @param file where it is
 * @param name the bundle's symbolic name by its own manifest; empty when that cannot be read
 * @param version the bundle's version by its own manifest; empty when that cannot be read
 * @param sha256 of its content, 64 hexadecimal digits in lower case; empty when the content could not be read
 * @param message for {@link State#UNUSABLE} what is wrong, in words; else empty
 */
public record DropIn(Path file, String name, String version, String sha256, State state, String message) {

    /** What became of it. */
    public enum State {
        /** Approved and started. */
        RUNNING,
        /** Waits for the user's word; nothing of it was installed or run. */
        ASKS,
        /** The user does not want it; nothing of it was installed or run. It can be approved later. */
        DECLINED,
        /** Cannot run, approved or not; the message says why. */
        UNUSABLE
    }

    /** Name and version as people read them; empty when the manifest cannot be read. */
    public String bundle() {
        return (name + " " + version).strip();
    }
}
