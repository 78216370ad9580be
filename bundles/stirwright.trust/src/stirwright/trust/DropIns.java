package stirwright.trust;

import java.nio.file.Path;
import java.util.List;

/**
 * The bundles in the folder {@code families}, and the user's word on them. An OSGi service; thread-safe. An approved bundle
 * runs with all rights of this program and of its user; approving says whom the user trusts, it does not confine anybody.
 *
 * <p>Methods that write throw {@link java.io.UncheckedIOException} with a message for people when the list cannot be written,
 * and {@link IllegalArgumentException} when {@code sha256} is not 64 hexadecimal digits.
 */
public interface DropIns {

    /** The folder that is watched; it need not exist. */
    Path folder();

    /** What is in the folder at this moment, by file name; a snapshot. */
    List<DropIn> list();

    /** What is wrong with the folder or with the user's lists as such, a sentence each; empty when nothing is. */
    List<String> problems();

    /** The user's list of approved bundles, as it stood when it was last read. */
    List<Approval> approved();

    /**
     * Lets bundles with this content run, now and at later starts. Returns when the list is written; the bundle starts a
     * moment later and the listeners are told.
     */
    void approve(String sha256);

    /** Like {@link #approve(String)} for a bundle that need not be in the folder. */
    void approve(DropIn bundle);

    /** Stops asking for this content, and stops it when it runs. It stays listed and can be approved later. */
    void decline(String sha256);

    /**
     * Takes a hash off the lists: it stops and asks again.
     *
     * @return whether it was on a list
     */
    boolean forget(String sha256);

    /**
     * Reads a jar anywhere without installing or running anything of it. Its state is what it would be in the folder before
     * it is started: {@code ASKS} also stands for an approved one.
     */
    DropIn read(Path file);

    /**
     * @param changed called after {@link #list()}, {@link #problems()} or {@link #approved()} has changed, on any thread; it
     *     should return soon
     * @return ends the calls when it is closed
     */
    AutoCloseable listen(Runnable changed);
}
