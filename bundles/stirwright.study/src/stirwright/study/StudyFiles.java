package stirwright.study;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Locale;
import stirwright.study.internal.NoStudyException;
import stirwright.study.internal.SafeWrite;
import stirwright.study.internal.StudyReader;
import stirwright.study.internal.StudyWriter;

/**
 * Studies in files: XMI in UTF-8, the same bytes for the same study. Nothing but the file itself is ever read, whatever
 * it refers to.
 */
public final class StudyFiles {

    /** How the names of studies end. */
    public static final String ENDING = ".stir";

    /** The version of the file format that is written; later ones are refused. */
    public static final int FORMAT = 1;

    /** Room for a hundred thousand cases; more is a mistaken file rather than a study. */
    private static final int MOST_BYTES = 64 << 20;

    private StudyFiles() {}

    /** Whether a file's name says that it is a study. */
    public static boolean isNamedAsStudy(Path file) {
        Path name = file.getFileName();
        return name != null && name.toString().toLowerCase(Locale.ROOT).endsWith(ENDING);
    }

    /** @throws StudyFileException when it cannot be read, is no study, or not one of this version */
    public static Study read(Path file) {
        return read(load(file), file.toString());
    }

    /**
     * Of bytes that need stand in no file.
     *
     * @param name what messages call them
     * @throws StudyFileException when they are no study, or not one of this version
     */
    public static Study read(byte[] bytes, String name) {
        try {
            return StudyReader.read(bytes, FORMAT);
        } catch (NoStudyException problem) {
            throw new StudyFileException(name, problem.getMessage(), problem.getCause());
        }
    }

    /**
     * Writes beside the file and moves the whole over it; when that fails the old file stays as it was.
     *
     * @throws StudyFileException when nothing can be written there, or no file could hold the study
     */
    public static void write(Study study, Path file) {
        try {
            SafeWrite.replace(file, StudyWriter.bytes(study, FORMAT));
        } catch (NoStudyException problem) {
            throw new StudyFileException(file, problem.getMessage(), problem.getCause());
        } catch (AccessDeniedException denied) {
            throw new StudyFileException(file, "you have no permission to write there; save it elsewhere", denied);
        } catch (IOException failure) {
            throw new StudyFileException(file, "cannot be written (" + failure.getMessage() + "); save it elsewhere", failure);
        }
    }

    /**
     * What {@link #write} writes. The study stays as it is.
     *
     * @throws StudyFileException when no file could hold the study
     */
    public static byte[] bytes(Study study) {
        try {
            return StudyWriter.bytes(study, FORMAT);
        } catch (NoStudyException problem) {
            throw new StudyFileException("the study", problem.getMessage(), problem.getCause());
        }
    }

    private static byte[] load(Path file) {
        if (Files.isDirectory(file)) {
            throw new StudyFileException(file, "is a folder; name a study, a file that ends in " + ENDING);
        }
        try (InputStream in = Files.newInputStream(file)) {
            byte[] bytes = in.readNBytes(MOST_BYTES + 1);
            if (bytes.length > MOST_BYTES) {
                throw new StudyFileException(file, "is larger than " + (MOST_BYTES >> 20) + " MB and hardly a study");
            }
            return bytes;
        } catch (NoSuchFileException missing) {
            throw new StudyFileException(file, "there is no such file; check the name and the folder", missing);
        } catch (AccessDeniedException denied) {
            throw new StudyFileException(file, "you have no permission to read it; ask its owner", denied);
        } catch (IOException failure) {
            throw new StudyFileException(file, "cannot be read (" + failure.getMessage() + "); try a copy of it", failure);
        }
    }
}
