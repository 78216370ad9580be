package stirwright.trust.internal;

import java.nio.charset.StandardCharsets;
import java.time.DateTimeException;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import stirwright.trust.Approval;

/**
 * The text of a list: lines of hash, bundle and date, comments after {@code #}, blank lines. A line is taken whole or not at
 * all.
 *
 * @param lines as they stand, so that writing the list keeps what people wrote
 * @param entries of the lines that are sound
 * @param damaged the numbers of the lines that are not, from 1
 */
record ListText(List<String> lines, List<Approval> entries, List<Integer> damaged) {
    static final ListText EMPTY = new ListText(List.of(), List.of(), List.of());

    // What is not text in UTF-8 becomes the replacement character, which no sound line holds.
    private static final Pattern LINE =
            Pattern.compile("([0-9a-fA-F]{64})\\s+([^\\s\\p{Cntrl}\uFFFD][^\\p{Cntrl}\uFFFD]*?)\\s+(\\d{4}-\\d{2}-\\d{2})\\s*");

    static ListText parse(byte[] content) {
        List<String> lines = new String(content, StandardCharsets.UTF_8).lines().toList();
        List<Approval> entries = new ArrayList<>();
        List<Integer> damaged = new ArrayList<>();
        for (int i = 0; i < lines.size(); i++) {
            String line = lines.get(i);
            if (!line.isBlank() && !line.startsWith("#")) {
                int number = i + 1;
                entry(line).ifPresentOrElse(entries::add, () -> damaged.add(number));
            }
        }
        return new ListText(lines, List.copyOf(entries), List.copyOf(damaged));
    }

    private static Optional<Approval> entry(String line) {
        Matcher parts = LINE.matcher(line);
        if (!parts.matches()) {
            return Optional.empty();
        }
        try {
            return Optional.of(new Approval(parts.group(1).toLowerCase(Locale.ROOT), parts.group(2),
                    LocalDate.parse(parts.group(3))));
        } catch (DateTimeException noDate) {
            return Optional.empty();
        }
    }

    boolean holds(String sha256) {
        return entries.stream().anyMatch(entry -> entry.sha256().equals(sha256));
    }

    /** The text with an entry more, after {@code head} when it had nothing. */
    String with(Approval added, List<String> head) {
        List<String> all = new ArrayList<>(lines.isEmpty() ? head : lines);
        all.add(added.sha256() + "  " + added.bundle().replaceAll("[\\s\\p{Cntrl}\uFFFD]+", " ").strip() + "  " + added.date());
        return text(all);
    }

    String without(String sha256) {
        return text(lines.stream().filter(line -> entry(line).filter(e -> e.sha256().equals(sha256)).isEmpty()).toList());
    }

    private static String text(List<String> lines) {
        return lines.isEmpty() ? "" : String.join("\n", lines) + "\n";
    }
}
