package stirwright.cards;

import java.io.IOException;
import java.nio.file.Path;

/** A folder that somebody else's pages stand in; nothing of them was touched. */
public final class FolderInUseException extends IOException {
    private static final long serialVersionUID = 1;

    FolderInUseException(Path folder, Path index) {
        super(folder + " holds " + index.getFileName() + " that is not an index of cards; name another folder");
    }
}
