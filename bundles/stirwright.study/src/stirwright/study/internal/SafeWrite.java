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
import java.util.UUID;

/** Replaces a file as a whole or not at all. */
public final class SafeWrite {

    private SafeWrite() {}

    /** A link stays one: what it leads to is replaced. */
    public static void replace(Path file, byte[] bytes) throws IOException {
        Path target = Files.exists(file) ? file.toRealPath() : file.toAbsolutePath();
        if (Files.isDirectory(target)) {
            throw new IOException("it is a folder");
        }
        if (!Files.isDirectory(target.getParent())) {
            throw new FileNotFoundException("the folder " + target.getParent() + " does not exist");
        }
        // Not File.createTempFile, whose files nobody but their owner can read.
        Path part = target.resolveSibling("." + target.getFileName() + "." + UUID.randomUUID() + ".part");
        try {
            write(part, bytes);
            move(part, target);
        } finally {
            Files.deleteIfExists(part);
        }
    }

    /** Onto the disk before it takes the old file's place, so that a power cut leaves one of the two. */
    private static void write(Path part, byte[] bytes) throws IOException {
        try (FileChannel channel = FileChannel.open(part, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE)) {
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
