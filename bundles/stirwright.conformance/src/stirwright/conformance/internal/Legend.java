package stirwright.conformance.internal;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/**
 * The sources that a reference file names once on top, "# [c] Author, work", and by a letter in its
 * rows. A line without a letter goes on with the one before when it is indented.
 */
final class Legend {
    private static final Pattern ENTRY = Pattern.compile("#\\s*\\[(\\w+)]\\s*(.*?)\\.?");
    private static final Pattern FURTHER = Pattern.compile("#\\s{3,}(.*?)\\.?");
    private static final Pattern LETTER = Pattern.compile("\\[(\\w+)]");

    private final Map<String, String> entries = new LinkedHashMap<>();

    private Legend() {}

    static Legend of(String file) {
        Legend legend = new Legend();
        String current = "";
        for (String line : file.lines().takeWhile(l -> l.startsWith("#")).toList()) {
            Matcher entry = ENTRY.matcher(line);
            Matcher further = FURTHER.matcher(line);
            if (entry.matches()) {
                current = entry.group(1);
                legend.entries.put(current, entry.group(2));
            } else if (further.matches() && !current.isEmpty()) {
                legend.entries.merge(current, further.group(1), (before, more) -> before + " " + more);
            } else {
                current = "";
            }
        }
        return legend;
    }

    /** A row's source with what its letters stand for: in their place at the start, else behind. */
    String resolve(String source) {
        Matcher start = LETTER.matcher(source);
        if (start.lookingAt() && entries.containsKey(start.group(1))) {
            String rest = source.substring(start.end()).strip();
            return resolve(rest, entries.get(start.group(1)) + (rest.isEmpty() ? "" : "; "));
        }
        return resolve(source, "");
    }

    private String resolve(String rest, String before) {
        String behind = LETTER.matcher(rest).results().map(m -> m.group(1)).distinct().filter(entries::containsKey)
                .map(letter -> "; [" + letter + "] " + entries.get(letter)).collect(Collectors.joining());
        return before + rest + behind;
    }
}
