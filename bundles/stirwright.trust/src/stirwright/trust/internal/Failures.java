package stirwright.trust.internal;

import java.util.List;
import java.util.Objects;
import java.util.stream.Stream;

/** Why a bundle does not start, in words. */
final class Failures {
    private static final String UNRESOLVED = "Unresolved requirement:";

    private Failures() {}

    /** What is missing when that is why, else the first cause. */
    static String words(Throwable failure) {
        // The framework tells what is missing in its message alone.
        List<String> missing = String.valueOf(failure.getMessage()).lines().map(String::strip)
                .filter(line -> line.startsWith(UNRESOLVED))
                .map(line -> line.substring(UNRESOLVED.length()).strip()).distinct().toList();
        if (!missing.isEmpty()) {
            return "cannot be resolved; nothing that is installed provides " + String.join(" and ", missing);
        }
        Throwable first = Stream.<Throwable>iterate(failure, Objects::nonNull, Throwable::getCause)
                .reduce(failure, (outer, inner) -> inner);
        return "cannot be started: " + (first == failure ? failure.getMessage() : first);
    }
}
