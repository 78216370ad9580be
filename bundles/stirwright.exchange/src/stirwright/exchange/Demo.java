package stirwright.exchange;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Arrays;
import stirwright.study.Study;
import stirwright.study.StudyFiles;

/** The invented scenario to start from, as a case table and as a study with the same cases. */
public final class Demo {

    /** The file name of the case table. */
    public static final String TABLE = "glaze-slip.csv";

    /** The file name of the study. */
    public static final String STUDY = "glaze-slip.stir";

    private static final String SET_ASIDE = "before-";

    private Demo() {}

    /**
     * Writes table and study into a folder, which is made when it is missing. A file of that name that somebody changed
     * is kept once, with {@code before-} in front of its name.
     *
     * @return the study
     * @throws UnusableFileException when nothing can be written there
     */
    public static Path copyTo(Path folder) {
        copy(TABLE, folder);
        return copy(STUDY, folder);
    }

    /** The study, which stands in no file. */
    public static Study study() {
        return StudyFiles.read(bytes(STUDY), STUDY);
    }

    private static byte[] bytes(String name) {
        try (InputStream in = Demo.class.getResourceAsStream("/demo/" + name)) {
            return in.readAllBytes();
        } catch (IOException damaged) {
            throw new UncheckedIOException("the installation is damaged: " + damaged.getMessage(), damaged);
        }
    }

    private static Path copy(String name, Path folder) {
        Path file = folder.resolve(name);
        byte[] bytes = bytes(name);
        try {
            Files.createDirectories(folder);
            if (!Files.exists(file)) {
                Files.write(file, bytes);
            } else if (!Arrays.equals(Files.readAllBytes(file), bytes)) {
                Files.move(file, folder.resolve(SET_ASIDE + name), StandardCopyOption.REPLACE_EXISTING);
                Files.write(file, bytes);
            }
            return file;
        } catch (IOException unwritable) {
            throw new UnusableFileException(file, "cannot be written: " + unwritable.getMessage(), unwritable);
        }
    }
}
