package stirwright.trust.internal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.BasicFileAttributes;
import java.nio.file.attribute.FileTime;
import java.util.Objects;

/**
 * What tells that a file may have another content, without reading it. A content that changes behind an equal stamp is not
 * noticed; it is not run either, since what runs is the framework's copy of the bytes that were hashed.
 *
 * @param key the file's number where the file system has one; a file that is replaced gets another
 */
record Stamp(FileTime modified, long size, Object key, boolean folder) {
    static final Stamp MISSING = new Stamp(FileTime.fromMillis(0), -1, null, false);

    static Stamp of(Path file) {
        try {
            BasicFileAttributes read = Files.readAttributes(file, BasicFileAttributes.class);
            return new Stamp(read.lastModifiedTime(), read.size(), Objects.toString(read.fileKey(), null), read.isDirectory());
        } catch (IOException gone) {
            return MISSING;
        }
    }
}
