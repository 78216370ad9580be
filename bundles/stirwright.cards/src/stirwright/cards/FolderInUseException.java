package stirwright.cards;

import java.io.IOException;
import java.nio.file.Path;

/** A folder that somebody else's pages stand in; nothing of them was touched. */
public final class FolderInUseException extends IOException {
    private static final long serialVersionUID = 1;

    FolderInUseException(Path folder, Path file) {
        super(folder + " holds a " + file.getFileName() + " that is not of our cards; name another folder");
    }
}
