package stirwright.equinox.tests;

import java.io.IOException;
import java.nio.file.Files;
import java.util.List;
import java.util.Locale;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;

/**
 * The steps by which DEVELOPERS.md adds a correlation of one's own, as they stand there.
 *
 * @param method added to the template's class
 * @param entry added to its list of correlations
 * @param file the reference file
 */
record Recipe(String method, String entry, String file) {
    private static final String CHAPTER = "## Add a correlation in ten minutes";
    private static final Pattern BLOCK = Pattern.compile("(?ms)^ *```(java|csv)\n(.*?)^ *```$");
    private static final String CLASS = "bundles/stirwright.family.inhouse/src/stirwright/family/inhouse/InHouse.java";
    private static final String LIST = "return List.of(\n";

    static Recipe ofTheManual() throws IOException {
        String manual = Files.readString(SourceTree.root().resolve("DEVELOPERS.md"));
        int start = manual.indexOf(CHAPTER);
        int end = manual.indexOf("\n## ", start + 1);
        List<MatchResult> blocks = BLOCK.matcher(manual.substring(start, end)).results().toList();
        List<String> languages = blocks.stream().map(block -> block.group(1).toLowerCase(Locale.ROOT)).toList();
        if (!languages.equals(List.of("java", "java", "csv"))) {
            throw new AssertionError("the recipe is a method, a line and a reference file, but it has " + languages);
        }
        List<String> texts = blocks.stream().map(block -> block.group(2).stripTrailing().stripIndent() + "\n").toList();
        return new Recipe(texts.get(0), texts.get(1), texts.get(2));
    }

    /** The same with one piece of the method put otherwise. */
    Recipe withMethod(String piece, String otherwise) {
        return new Recipe(changed(method, piece, otherwise), entry, file);
    }

    /** The same with one piece of the reference file put otherwise. */
    Recipe withFile(String piece, String otherwise) {
        return new Recipe(method, entry, changed(file, piece, otherwise));
    }

    private static String changed(String text, String piece, String otherwise) {
        if (!text.contains(piece)) {
            throw new AssertionError("no '" + piece + "' in:\n" + text);
        }
        return text.replace(piece, otherwise);
    }

    /** How many lines of Java there are to write. */
    long lines() {
        return (method + entry).lines().filter(line -> !line.isBlank()).count();
    }

    /** The template's class once the steps are done. */
    String java() throws IOException {
        String template = Files.readString(SourceTree.root().resolve(CLASS));
        int end = template.lastIndexOf('}');
        return changed(template.substring(0, end) + method + template.substring(end), LIST, LIST + entry);
    }
}
