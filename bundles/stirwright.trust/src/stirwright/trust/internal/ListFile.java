package stirwright.trust.internal;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.List;
import java.util.stream.Stream;

/** A list in the user's folder that several processes read and write. */
final class ListFile {
    private final Path file;
    private Stamp stamp;
    private volatile ListText text = ListText.EMPTY;
    private volatile String unreadable = "";

    ListFile(Path file) {
        this.file = file;
    }

    boolean exists() {
        return Files.exists(file);
    }

    /** As it stood at the last {@link #refresh()}. */
    ListText text() {
        return text;
    }

    /** Reads it when its stamp has changed, or it could not be read. @return whether there is something new */
    synchronized boolean refresh() {
        Stamp now = Stamp.of(file);
        if (now.equals(stamp)) {
            return false;
        }
        ListText known = text;
        String told = unreadable;
        stamp = now;
        try {
            text = ListText.parse(Files.readAllBytes(file));
            unreadable = "";
        } catch (NoSuchFileException none) {
            text = ListText.EMPTY;
            unreadable = "";
        } catch (IOException failed) {
            // What cannot be read approves nothing, also not what it said before. It is tried again at the next look.
            stamp = null;
            text = ListText.EMPTY;
            unreadable = file + ": cannot be read, so it counts as empty: " + words(failed);
        }
        return !text.equals(known) || !unreadable.equals(told);
    }

    List<String> problems() {
        return Stream.concat(Stream.of(unreadable).filter(p -> !p.isEmpty()),
                text.damaged().stream().map(number -> file + ", line " + number
                        + ": is not a SHA-256, a bundle's name and a date such as 2030-01-31; the line counts for nothing"
                        + ", mend or delete it")).toList();
    }

    /**
     * Changes what the file holds at this moment, under a lock between processes; readers see the old or the new text, never
     * a part.
     *
     * @param change gives null to leave the file alone
     * @return whether it was written
     */
    synchronized boolean update(Change change) {
        try {
            Files.createDirectories(file.getParent());
            try (FileChannel lockFile = FileChannel.open(file.resolveSibling(file.getFileName() + ".lock"),
                    StandardOpenOption.CREATE, StandardOpenOption.WRITE); FileLock lock = lockFile.lock()) {
                String changed = change.apply(Files.exists(file) ? ListText.parse(Files.readAllBytes(file)) : ListText.EMPTY);
                if (changed != null) {
                    replace(changed);
                }
                return changed != null;
            }
        } catch (IOException failed) {
            throw new UncheckedIOException(file + " cannot be written, so nothing was changed: " + words(failed), failed);
        }
    }

    private static String words(IOException failed) {
        if (failed instanceof FileAlreadyExistsException other) {
            return other.getFile() + " is a file where a folder belongs";
        }
        return failed instanceof AccessDeniedException denied ? "access to " + denied.getFile() + " is denied"
                : failed.getMessage();
    }

    private void replace(String content) throws IOException {
        // Some keep their settings elsewhere and link to them; the link stays.
        Path target = Files.exists(file) ? file.toRealPath() : file;
        Path written = Files.createTempFile(target.getParent(), file.getFileName().toString(), ".new");
        try {
            try (FileChannel out = FileChannel.open(written, StandardOpenOption.WRITE)) {
                ByteBuffer bytes = StandardCharsets.UTF_8.encode(content);
                while (bytes.hasRemaining()) {
                    out.write(bytes);
                }
                out.force(true);
            }
            Files.move(written, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } finally {
            Files.deleteIfExists(written);
        }
    }

    /** From what the file holds to what it shall hold. */
    @FunctionalInterface
    interface Change {
        String apply(ListText held);
    }
}
