package stirwright.exchange.internal.cases;

import java.util.LinkedHashMap;
import java.util.Map;
import stirwright.core.CaseRefusedException;
import stirwright.exchange.DecimalSign;
import stirwright.exchange.internal.table.Numbers;
import stirwright.exchange.internal.table.Texts;

/** The constants that a case changes, in one cell: {@code id name=value name=value; other-id name=value}. */
final class ConstantsText {
    private static final String EXAMPLE = "; write 'id name=value', for instance invented.ks.author k=6.5, more names"
            + " behind a blank and more ids behind a semicolon";

    private final Cells cells;
    private final Map<String, Map<String, Double>> read = new LinkedHashMap<>();

    private ConstantsText(Cells cells) {
        this.cells = cells;
    }

    /**
     * The values by correlation and name, in the order of the cell.
     *
     * @throws CaseRefusedException naming the column, the value and the word that cannot be read
     */
    static Map<String, Map<String, Double>> read(Cells cells) {
        ConstantsText text = new ConstantsText(cells);
        for (String entry : cells.text(CaseColumns.CONSTANTS).split(";")) {
            if (!entry.isBlank()) {
                text.take(entry.strip().replaceAll("\\s*=\\s*", "=").split("\\s+"));
            }
        }
        return text.read;
    }

    /** @param words the id, then what is changed of it */
    private void take(String[] words) {
        String id = words[0];
        if (id.contains("=")) {
            throw refusal("has " + quoted(id) + " where the id of a correlation belongs");
        }
        if (words.length == 1) {
            throw refusal("says no constant of " + quoted(id));
        }
        Map<String, Double> values = read.computeIfAbsent(id, first -> new LinkedHashMap<>());
        for (int i = 1; i < words.length; i++) {
            int sign = words[i].indexOf('=');
            if (sign < 1) {
                throw refusal("has " + quoted(words[i]) + " where a name and a value belong");
            }
            if (values.put(words[i].substring(0, sign), value(words[i], words[i].substring(sign + 1))) != null) {
                throw refusal("gives " + quoted(words[i].substring(0, sign)) + " of " + quoted(id) + " twice");
            }
        }
        read.put(id, values);
    }

    private double value(String word, String number) {
        DecimalSign decimal = cells.decimal();
        double value = Numbers.parse(number, decimal);
        if (Double.isNaN(value)) {
            throw refusal("has " + quoted(word) + ", whose value " + Numbers.problem(number, decimal));
        }
        return value;
    }

    private CaseRefusedException refusal(String what) {
        return cells.refusal(CaseColumns.CONSTANTS, what + EXAMPLE);
    }

    private static String quoted(String word) {
        return "'" + Texts.show(word) + "'";
    }
}
