package stirwright.exchange.internal.write;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.nio.file.AccessDeniedException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.UUID;
import java.util.function.Function;
import stirwright.exchange.Output;
import stirwright.exchange.UnusableFileException;

/** Writes beside the file and moves the whole over it at the end, so that no half a file is ever seen. */
public final class FileOutput<T> implements Output<T> {
    private final Path named;
    private final Path target;
    private final Path part;
    private final Writer writer;
    private final Output<T> content;
    private boolean finished;

    /**
     * @param named as the user named it
     * @param content starts what is written to a writer
     * @throws UnusableFileException when there is no such folder or nothing may be written there
     */
    public FileOutput(Path named, Function<Writer, Output<T>> content) {
        this.named = named;
        try {
            this.target = Files.exists(named) ? named.toRealPath() : named.toAbsolutePath();
            requirePlace();
            // Not File.createTempFile, whose files nobody but their owner can read.
            this.part = target.resolveSibling("." + target.getFileName() + "." + UUID.randomUUID() + ".part");
            this.writer = Files.newBufferedWriter(part, StandardOpenOption.CREATE_NEW);
        } catch (IOException failure) {
            throw cannot(failure);
        }
        try {
            this.content = content.apply(writer);
        } catch (UncheckedIOException failure) {
            close();
            throw cannot(failure.getCause());
        }
    }

    private void requirePlace() {
        if (Files.isDirectory(target)) {
            throw new UnusableFileException(named, "is a folder; name a file in it");
        }
        Path folder = target.getParent();
        if (!Files.isDirectory(folder)) {
            throw new UnusableFileException(named, "the folder " + folder + " does not exist; create it first");
        }
        if (!Files.isWritable(folder)) {
            throw new UnusableFileException(named, "nothing may be written to the folder " + folder);
        }
    }

    private UnusableFileException cannot(IOException failure) {
        String reason = failure instanceof AccessDeniedException ? "you have no permission" : failure.getMessage();
        return new UnusableFileException(named, "cannot be written: " + reason, failure);
    }

    @Override
    public void add(T item) {
        try {
            content.add(item);
        } catch (UncheckedIOException failure) {
            throw cannot(failure.getCause());
        }
    }

    @Override
    public void finish() {
        try {
            content.finish();
            writer.close();
            move();
            finished = true;
        } catch (UncheckedIOException failure) {
            throw cannot(failure.getCause());
        } catch (IOException failure) {
            throw cannot(failure);
        }
    }

    private void move() throws IOException {
        try {
            Files.move(part, target, StandardCopyOption.ATOMIC_MOVE);
        } catch (AtomicMoveNotSupportedException otherwise) {
            Files.move(part, target, StandardCopyOption.REPLACE_EXISTING);
        }
    }

    @Override
    public void close() {
        if (finished) {
            return;
        }
        try (writer) {
            Files.deleteIfExists(part);
        } catch (IOException failure) {
            throw cannot(failure);
        }
    }
}
