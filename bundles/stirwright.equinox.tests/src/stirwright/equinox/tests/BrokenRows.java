package stirwright.equinox.tests;

import static stirwright.equinox.tests.Specimen.HEADER;
import static stirwright.equinox.tests.Specimen.POWER;
import static stirwright.equinox.tests.Specimen.POWER_ROW;
import static stirwright.equinox.tests.Specimen.sound;
import static stirwright.equinox.tests.Specimen.subject;

import java.util.List;
import stirwright.core.Catalogue;
import stirwright.correlation.Measure;
import stirwright.equinox.tests.BrokenContributionsTest.Broken;

/** Reference rows that are missing, unreadable or not met. */
final class BrokenRows {

    private BrokenRows() {}

    static List<Broken> all() {
        String good = Specimen.row(POWER, "formula,2.1,a source", "100,,");
        return List.of(
                file("no provenance", HEADER.substring(HEADER.indexOf('\n') + 1) + POWER_ROW, "rows.csv", "provenance"),
                file("an unknown column", HEADER.replace("flow_index", "flow_idx") + POWER_ROW, "rows.csv", "'flow_idx'"),
                file("a column twice", HEADER.replace("flow_index", "reynolds") + POWER_ROW, "'reynolds' twice"),
                row("too many cells", good.replace("100,,", "100,,,7"), "rows.csv", "cannot be read"),
                row("an unknown correlation", good.replace(POWER, "specimen.np.other"),
                        "rows.csv line 4", "'correlation'", "'specimen.np.other'"),
                row("another family", good.replace(",,formula", ",gate,formula"), "line 4", "'family'", "'gate'"),
                row("an unknown kind", good.replace("formula", "guess"), "line 4", "'kind'", "'guess'"),
                row("not a number", good.replace("2.1", "2_1"), "line 4", "'expected'", "'2_1'"),
                row("not a number among the variables", good.replace("100,,", "1OO,,"), "'reynolds'", "'1OO'"),
                row("no source", good.replace("a source", ""), "line 4", "'source'"),
                row("another mark", good.replace("source,", "source,no"), "line 4", "'outside'", "'no'"),
                row("a variable left blank that is read", good.replace("100,,", ",,"), "line 4", "'reynolds'"),
                row("a dimension left blank that has no default", good.replace(",4,", ",,"), "line 4", "baffle_count"),
                row("a dimension that cannot be", good.replace("100,,", "100,,99"), "line 4", "impeller_count"),
                new Broken("rows cover", "no row", subject("", sound(Specimen.power())), POWER, "no reference row"),
                new Broken("rows cover", "no row within the bounds", subject(good.replace("source,", "source,yes"),
                        sound(Specimen.power().range(Measure.H_OVER_T, 2, 3))), POWER, "no reference row"),
                new Broken("rows cover", "no row for the second family", subject(
                        List.of(Specimen.family("specimen").build(), Specimen.family("second").build()),
                        HEADER + good.replace(",,formula", ",specimen,formula"), Catalogue.of(List.of()),
                        sound(Specimen.power().families("second"))), POWER, "second"),
                new Broken("rows inside", "a row beyond a bound", subject(POWER_ROW + good
                        .replace("2.1", "1.5001").replace("100,,", "6e5,,"), sound(Specimen.power())),
                        "rows.csv line 4", "Reynolds number 1 to 100000", "600000"),
                new Broken("rows inside", "a row where the modifier does not apply", subject(Specimen.FACTOR_ROW
                        + Specimen.row(Specimen.FACTOR, "formula,0.9,1 * 0.9", "100,,1"),
                        Specimen.whenSeveral(Specimen.factor()).build()), "line 4", "more than one impeller"),
                new Broken("rows inside", "a mark for nothing", subject(POWER_ROW + good.replace("source,", "source,yes"),
                        sound(Specimen.power())), "rows.csv line 4", "marked outside"),
                // 2.1 is right: 0.6 %, 2.5 %, 16 % and 0.6 % above it are each beyond their kind.
                missed("formula", "2.113"), missed("table", "2.152"), missed("chart", "2.5"), missed("recalled", "2.113"));
    }

    private static Broken file(String what, String text, String... words) {
        return new Broken("rows read", what, subject(List.of(Specimen.family("specimen").build()), text,
                Catalogue.of(List.of()), sound(Specimen.power())), words);
    }

    /** A good row first, so that no other check misses one. */
    private static Broken row(String what, String row, String... words) {
        return file(what, HEADER + POWER_ROW + row, words);
    }

    private static Broken missed(String kind, String expected) {
        return new Broken("rows met", "a " + kind + " that is missed",
                subject(Specimen.row(POWER, kind + "," + expected + ",a source", "100,,"), sound(Specimen.power())),
                "rows.csv line 3", POWER, kind, "2.1 where " + expected);
    }
}
