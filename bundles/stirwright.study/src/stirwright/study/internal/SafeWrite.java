package stirwright.study.internal;

import java.io.FileNotFoundException;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.FileAttribute;
import java.nio.file.attribute.PosixFileAttributeView;
import java.nio.file.attribute.PosixFilePermission;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.Optional;
import java.util.Set;
import java.util.UUID;

/** Replaces a file as a whole or not at all. */
public final class SafeWrite {

    private SafeWrite() {}

    private static final int MOST_LINKS = 40;

    /** A link stays one: what it leads to is replaced. Who may read and write the old file may do so with the new one. */
    public static void replace(Path file, byte[] bytes) throws IOException {
        Path target = target(file);
        if (Files.isDirectory(target)) {
            throw new IOException("it is a folder");
        }
        if (!Files.isDirectory(target.getParent())) {
            throw new FileNotFoundException("the folder " + target.getParent() + " does not exist");
        }
        // Not File.createTempFile, whose files nobody but their owner can read.
        Path part = target.resolveSibling("." + target.getFileName() + "." + UUID.randomUUID() + ".part");
        try {
            write(part, bytes, rights(target));
            move(part, target);
        } finally {
            Files.deleteIfExists(part);
        }
    }

    /** Also of a link to what is not there yet. */
    private static Path target(Path file) throws IOException {
        if (Files.exists(file)) {
            return file.toRealPath();
        }
        Path target = file.toAbsolutePath();
        for (int links = 0; Files.isSymbolicLink(target); links++) {
            if (links == MOST_LINKS) {
                throw new IOException("its links lead nowhere");
            }
            target = target.resolveSibling(Files.readSymbolicLink(target));
        }
        return target;
    }

    /** Of the file that is replaced; empty when there is none, or the system knows no such rights. */
    private static Optional<Set<PosixFilePermission>> rights(Path target) throws IOException {
        PosixFileAttributeView view = Files.getFileAttributeView(target, PosixFileAttributeView.class);
        return view != null && Files.exists(target) ? Optional.of(view.readAttributes().permissions()) : Optional.empty();
    }

    /** Onto the disk before it takes the old file's place, so that a power cut leaves one of the two. */
    private static void write(Path part, byte[] bytes, Optional<Set<PosixFilePermission>> rights) throws IOException {
        FileAttribute<?>[] made = rights.map(PosixFilePermissions::asFileAttribute).stream().toArray(FileAttribute[]::new);
        try (FileChannel channel = FileChannel.open(part, Set.of(StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE), made)) {
            if (rights.isPresent()) {
                // The user's mask may have taken some away.
                Files.setPosixFilePermissions(part, rights.get());
            }
            ByteBuffer rest = ByteBuffer.wrap(bytes);
            while (rest.hasRemaining()) {
                channel.write(rest);
            }
            channel.force(true);
        }
    }

    private static void move(Path part, Path target) throws IOException {
        try {
            Files.move(part, target, StandardCopyOption.ATOMIC_MOVE);
        } catch (AtomicMoveNotSupportedException otherwise) {
            Files.move(part, target, StandardCopyOption.REPLACE_EXISTING);
        }
    }
}
