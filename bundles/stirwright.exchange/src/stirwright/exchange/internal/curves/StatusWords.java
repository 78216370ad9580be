package stirwright.exchange.internal.curves;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import stirwright.exchange.CurveQuantity;
import stirwright.exchange.Finding;
import stirwright.exchange.internal.table.Texts;

/**
 * What instruments write beside points. What most points have is taken for the normal state; a word that says that a
 * point is bad drops it; any other is told.
 *
 * @param normal the most frequent word; empty where most points have none
 * @param bad those that say that a point is bad
 */
record StatusWords(String normal, Optional<Finding> finding, Set<String> bad) {
    /** Whole words, between spaces; "overshoot" says nothing bad. */
    private static final List<String> BAD = Stream.of("invalid", "error", "errors", "over", "under", "overrange", "underrange",
            "overload", "overloaded", "overflow", "underflow", "out of range", "exceed", "exceeds", "exceeded", "exceeding", "fail", "fails",
            "failed", "failure", "bad", "unstable", "not steady", "not reached", "not stable", "limit", "limits", "limited", "ungultig",
            "ungultige", "ungueltig", "fehler", "uber", "unter", "ueber", "uberlast", "uberlauf", "uberschritten", "unterschritten",
            "messbereichsuberschreitung", "messbereichsunterschreitung", "instabil", "nicht stationar", "nicht stabil", "nicht erreicht",
            "grenze", "grenzwert", "erreur", "depassement", "depasse", "depassee", "instable", "hors", "invalide", "invalido", "invalida",
            "fuera", "inestable", "errore", "nan").map(w -> " " + w + " ").toList();

    static StatusWords of(List<Stretch> stretches) {
        Map<String, Integer> counts = new HashMap<>();
        for (Stretch stretch : stretches) {
            Column column = stretch.group.column(CurveQuantity.STATUS);
            for (WorkRow row : column == null ? List.<WorkRow>of() : stretch.rows) {
                counts.merge(row.row.cell(column.position()), 1, Integer::sum);
            }
        }
        if (counts.isEmpty() || counts.size() == 1 && counts.containsKey("")) {
            return new StatusWords("", Optional.empty(), Set.of());
        }
        String normal = counts.entrySet().stream()
                .max(Map.Entry.<String, Integer>comparingByValue().thenComparing(Map.Entry.comparingByKey())).orElseThrow().getKey();
        return new StatusWords(normal, Optional.of(new Finding(Finding.Topic.STATUS,
                normal.isEmpty() ? "no word is the normal state" : "'" + Texts.show(normal) + "' is the normal state",
                "most points have it; " + (counts.size() - 1) + " other words", false)),
                counts.keySet().stream().filter(StatusWords::saysBad).collect(Collectors.toSet()));
    }

    boolean isBad(String status) {
        return bad.contains(status);
    }

    static boolean saysBad(String status) {
        if (status.isEmpty()) {
            return false;
        }
        String folded = Folded.of(Texts.show(status)).text();
        return BAD.stream().anyMatch(word -> folded.contains(word));
    }

    boolean isNormal(String status) {
        return status.isEmpty() || status.equals(normal);
    }
}
