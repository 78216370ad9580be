package stirwright.exchange;

import java.nio.file.Path;
import java.util.List;
import stirwright.exchange.internal.curves.TemplateFolder;

/** Choices kept by name, a plain text file each. Single points are not kept: they belong to one file. */
public final class ImportTemplates {
    private final TemplateFolder folder;

    /** @param folder where they are kept; it is made when the first one is saved */
    public ImportTemplates(Path folder) {
        this.folder = new TemplateFolder(folder);
    }

    /** Their names in alphabetical order; empty without the folder. */
    public List<String> list() {
        return folder.list();
    }

    /**
     * Keeps a choice, replacing one of the same name.
     *
     * @param name of letters, digits, spaces, hyphens and underscores, at most 60 characters
     * @throws UnusableFileException when the name does not fit or the file cannot be written
     */
    public void save(String name, ImportChoice choice) {
        folder.save(name, choice);
    }

    /** @throws UnusableFileException when there is none of this name, or a line of it cannot be read */
    public ImportChoice load(String name) {
        return folder.load(name);
    }

    /**
     * A template from a file of its own, for instance a colleague's.
     *
     * @throws UnusableFileException when it cannot be read, or a line of it
     */
    public static ImportChoice read(Path file) {
        return TemplateFolder.read(file);
    }

    /** Does nothing when there is none. */
    public void remove(String name) {
        folder.remove(name);
    }
}
