package stirwright.console.internal;

import java.io.File;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import stirwright.trust.DropIn;
import stirwright.trust.DropIns;

/** What a run tells of jars in the drop-in folder, a line each. Running and declined ones are no news. */
record Door(DropIns dropIns) {

    List<String> problems() {
        return dropIns.problems();
    }

    List<String> news() {
        List<String> lines = new ArrayList<>(problems());
        for (DropIn dropIn : dropIns.list()) {
            switch (dropIn.state()) {
                case ASKS -> lines.add(dropIn.file() + " (" + dropIn.bundle() + ") does not run: its content is not approved;"
                        + " where you trust it: stirwright trust " + quoted(dropIn.file()));
                case UNUSABLE -> lines.add(dropIn.file() + ": " + dropIn.message());
                case RUNNING, DECLINED -> { }
            }
        }
        return lines;
    }

    private static String quoted(Path file) {
        return quoted(file.toString(), File.separatorChar == '\\');
    }

    /** As the system's shell takes it for one word; no name of a file on Windows has a quote in it. */
    static String quoted(String path, boolean windows) {
        if (path.matches("[\\w./:\\\\@%+=,-]+")) {
            return path;
        }
        return windows ? '"' + path + '"' : "'" + path.replace("'", "'\\''") + "'";
    }
}
