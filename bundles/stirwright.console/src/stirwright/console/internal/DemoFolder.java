package stirwright.console.internal;

import java.io.IOException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFileAttributeView;
import java.nio.file.attribute.PosixFileAttributes;
import java.nio.file.attribute.PosixFilePermissions;

/** The folder for the demo's files, among everybody's temporary ones: nobody but the user can put anything into it. */
record DemoFolder(Path temporary, String user) {
    private static final String NAME = "stirwright-demo-";

    /** The same at every run; another one when that name belongs to somebody else. */
    Path make() throws IOException {
        Path usual = temporary.resolve(NAME + user);
        boolean posix = Files.getFileAttributeView(temporary, PosixFileAttributeView.class) != null;
        try {
            return posix ? Files.createDirectory(usual, PosixFilePermissions.asFileAttribute(
                    PosixFilePermissions.fromString("rwx------"))) : Files.createDirectory(usual);
        } catch (FileAlreadyExistsException there) {
            boolean own = posix ? isOwn(usual) : Files.isDirectory(usual, LinkOption.NOFOLLOW_LINKS);
            return own ? usual : Files.createTempDirectory(temporary, NAME);
        }
    }

    /** A folder, not a link to one, that belongs to whom this program's files belong to and that others cannot write to. */
    private boolean isOwn(Path folder) throws IOException {
        Path probe = Files.createTempFile(temporary, NAME, null);
        try {
            PosixFileAttributes seen = Files.readAttributes(folder, PosixFileAttributes.class, LinkOption.NOFOLLOW_LINKS);
            return seen.isDirectory() && seen.owner().equals(Files.getOwner(probe))
                    && PosixFilePermissions.toString(seen.permissions()).matches("....-..-.");
        } finally {
            Files.delete(probe);
        }
    }
}
