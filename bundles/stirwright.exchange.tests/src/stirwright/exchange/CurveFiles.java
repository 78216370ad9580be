package stirwright.exchange;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** Files of flow curves in a folder of a test. */
final class CurveFiles {

    private CurveFiles() {}

    static Path write(Path folder, String name, byte[] bytes) {
        try {
            return Files.write(folder.resolve(name), bytes);
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }

    static CurveImport read(Path folder, String name, byte[] bytes) {
        return CurveImport.of(CurveSource.file(write(folder, name, bytes)), ImportChoice.DETECT);
    }
}
