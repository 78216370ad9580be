package stirwright.exchange.internal.curves;

import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import stirwright.exchange.internal.curves.Stretch.Heads;
import stirwright.exchange.internal.table.SourceRow;
import stirwright.exchange.internal.table.Texts;

/** Tells rows that open a sample, a run or an interval by their first word. */
final class HeadWords {
    private static final Set<String> SAMPLE = Set.of("sample", "probe", "echantillon", "muestra", "product", "produkt", "produit",
            "batch", "charge", "lot", "campione", "amostra", "monster", "fluid");
    private static final Set<String> RUN = Set.of("run", "test", "versuch", "essai", "ensayo", "measurement", "messung", "mesure",
            "medicion", "data", "messdaten", "serie", "series", "curve", "kurve", "courbe", "curva", "replicate", "wiederholung",
            "repetition", "repeticion");
    private static final Set<String> INTERVAL = Set.of("interval", "segment", "step", "section", "block", "ramp", "abschnitt",
            "intervall", "schritt", "rampe", "intervalle", "etape", "intervalo", "paso", "tramo", "rampa", "preshear",
            "vorscherung", "phase", "fase");

    /** A longer line is a remark; common practice, no source. */
    private static final int LONGEST_TITLE = 60;

    private HeadWords() {}

    /** What the heads are with this row, which is not blank; empty when it is no head. */
    static Optional<Heads> read(SourceRow row, Heads before) {
        int first = 0;
        while (row.cell(first).isEmpty()) {
            first++;
        }
        if (!Character.isLetter(row.cell(first).charAt(0))) {
            return Optional.empty();
        }
        String word = Folded.of(Texts.show(row.cell(first))).words().split(" ")[0];
        String name = words(row);
        if (SAMPLE.contains(word)) {
            return Optional.of(new Heads("", name, "", "", ""));
        }
        if (RUN.contains(word)) {
            return Optional.of(new Heads("", before.sample(), name, "", before.title()));
        }
        return INTERVAL.contains(word) || name.toLowerCase(Locale.ROOT).startsWith("pre-shear")
                ? Optional.of(new Heads("", before.sample(), before.run(), name, before.title())) : Optional.empty();
    }

    /**
     * Whether a row is one short line of words, or a temperature alone.
     *
     * @param before the place of the first column that is read: a word further right is a cell of a point
     */
    static boolean isTitle(SourceRow row, int before) {
        if (row.filled() != 1 || !SheetSorter.noNumbers(row) || row.cells().indexOf(words(row)) > before) {
            return false;
        }
        String words = words(row);
        if (StatusWords.saysBad(words) || words.length() < 2 || words.startsWith("sep=")) {
            return false;
        }
        return words.length() <= LONGEST_TITLE && (Character.isLetter(words.charAt(0)) || NameWords.temperatureAlone(words));
    }

    /** The cells that are filled, in one line. */
    static String words(SourceRow row) {
        return Texts.show(String.join(" ", row.cells().stream().filter(c -> !c.isEmpty()).limit(6).toList()));
    }
}
