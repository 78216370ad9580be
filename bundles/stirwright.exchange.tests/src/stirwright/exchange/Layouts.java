package stirwright.exchange;

import static stirwright.exchange.Tongue.DOWN;
import static stirwright.exchange.Tongue.INTERVAL;
import static stirwright.exchange.Tongue.JOINED;
import static stirwright.exchange.Tongue.POINT;
import static stirwright.exchange.Tongue.RATE;
import static stirwright.exchange.Tongue.SAMPLE;
import static stirwright.exchange.Tongue.SPEED;
import static stirwright.exchange.Tongue.STATUS;
import static stirwright.exchange.Tongue.STRESS;
import static stirwright.exchange.Tongue.TEMPERATURE;
import static stirwright.exchange.Tongue.TIME;
import static stirwright.exchange.Tongue.TORQUE;
import static stirwright.exchange.Tongue.UP;
import static stirwright.exchange.Tongue.VISCOSITY;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import stirwright.exchange.InventedCurve.Point;

/** Writes the invented curve in the layouts A to E of files that people have. */
final class Layouts {
    private static final BigDecimal THOUSAND = new BigDecimal(1000);

    private Layouts() {}

    /** Text in blocks: a pre-shear, up, down; names, an empty row, units in brackets, rows that begin with an empty cell. */
    static String a(Tongue t) {
        StringBuilder text = new StringBuilder("Project:\tinvented\r\nOperator:\t-\r\n\r\n");
        List<Point> rest = new ArrayList<>();
        for (int i = 0; i < 15; i++) {
            rest.add(new Point(new BigDecimal(50), new BigDecimal("33.5").subtract(new BigDecimal(i).movePointLeft(1))));
        }
        List<List<Point>> blocks = List.of(rest, InventedCurve.up(), InventedCurve.down());
        for (int b = 0; b < blocks.size(); b++) {
            text.append(t.word(INTERVAL)).append(":\t").append(b + 1).append("\r\n");
            row(text, "\t", "", t.word(POINT), t.word(TIME), t.word(RATE), t.word(STRESS), t.word(VISCOSITY), t.word(TEMPERATURE), t.word(STATUS));
            text.append("\r\n");
            row(text, "\t", "", "", "[s]", "[1/s]", "[Pa]", "[mPa\u00B7s]", "[\u00B0C]", "");
            int i = 0;
            for (Point p : blocks.get(b)) {
                row(text, "\t", "", String.valueOf(++i), String.valueOf(5 * i), t.number(p.rate()), t.number(p.stress()),
                        t.number(p.viscosity().multiply(THOUSAND)), t.number(new BigDecimal("25.1")), "ok");
            }
            row(text, "\t", "", String.valueOf(++i), "", t.comma() ? "ung\u00FCltig" : "invalid", t.comma() ? "ung\u00FCltig" : "invalid", "",
                    t.number(new BigDecimal("25.1")), "");
            text.append("\r\n");
        }
        return text.toString();
    }

    /** Semicolons, "quantity in unit", segment and point in one cell, blanks for what a segment does not measure. */
    static String b(Tongue t) {
        String in = " in ";
        StringBuilder text = new StringBuilder("invented\r\n\r\n");
        row(text, ";", t.word(JOINED), t.word(TIME) + in + "s", t.word(RATE) + in + "1/s", t.word(STRESS) + in + "Pa",
                t.word(VISCOSITY) + in + "Pa\u00B7s", t.word(TEMPERATURE) + in + "\u00B0C");
        for (int i = 1; i <= 5; i++) {
            row(text, ";", "1|" + i, String.valueOf(i), "", "", "", t.number(new BigDecimal("25.1")));
        }
        List<List<Point>> blocks = List.of(InventedCurve.up(), InventedCurve.down());
        for (int b = 0; b < blocks.size(); b++) {
            int i = 0;
            for (Point p : blocks.get(b)) {
                row(text, ";", (b + 2) + "|" + ++i, String.valueOf(10 * i), t.number(p.rate()), t.number(p.stress()), t.number(p.viscosity()),
                        t.number(new BigDecimal("25.1")));
            }
        }
        return text.toString();
    }

    /** A workbook: details as keys and values, then a sheet for each ramp with title, names and units. */
    static byte[] c(Tongue t, boolean numbersAsText) {
        Map<String, List<List<Object>>> sheets = new LinkedHashMap<>();
        sheets.put("Details", List.of(List.of("Name", "invented"), List.of("Gap [mm]", new BigDecimal("1.000")), List.of("Steps", new BigDecimal(2))));
        List<List<Point>> blocks = List.of(InventedCurve.up(), InventedCurve.down());
        for (int b = 0; b < 2; b++) {
            List<List<Object>> rows = new ArrayList<>();
            rows.add(List.of("Flow sweep - " + (b + 1)));
            rows.add(List.of(t.word(STRESS), t.word(RATE), t.word(VISCOSITY), t.word(TIME), t.word(TEMPERATURE)));
            rows.add(List.of("Pa", "1/s", "Pa.s", "min", "\u00B0C"));
            for (Point p : blocks.get(b)) {
                List<Object> row = new ArrayList<>();
                for (BigDecimal value : List.of(p.stress(), p.rate(), p.viscosity(), new BigDecimal("0.5"), new BigDecimal("25.1"))) {
                    row.add(numbersAsText ? t.number(value) : value);
                }
                rows.add(row);
            }
            sheets.put(t.word(b == 0 ? UP : DOWN), rows);
        }
        return Xlsx.write(sheets);
    }

    /** A bench viscometer: stress in dyn/cm2, viscosity in cP; zeros below its range, full-scale numbers above it. */
    static String d(Tongue t) {
        String s = t.comma() ? ";" : ",";
        StringBuilder text = new StringBuilder();
        row(text, s, t.comma() ? "Schritt" : "Step", t.word(POINT), t.word(TIME) + " [s]", t.word(VISCOSITY) + " [cP]", t.word(TORQUE) + " [%]",
                t.word(SPEED) + " [rpm]", t.word(STRESS) + " [dyn/cm2]", t.word(RATE) + " [1/s]", t.word(TEMPERATURE) + " [\u00B0C]");
        row(text, s, "1", "1", "10", "0", "0", t.number(new BigDecimal("0.01")), "0", t.number(new BigDecimal("0.05")), "25");
        int i = 1;
        for (Point p : InventedCurve.up()) {
            row(text, s, "1", String.valueOf(++i), String.valueOf(10 * i), t.number(p.viscosity().multiply(THOUSAND)),
                    t.number(new BigDecimal(10 + i)), t.number(p.rate().movePointLeft(1)), t.number(p.stress().multiply(BigDecimal.TEN)),
                    t.number(p.rate()), "25");
        }
        row(text, s, "1", String.valueOf(++i), String.valueOf(10 * i), "99999", t.number(new BigDecimal("99.9")), "100", "9999", "1000", "25");
        row(text, s, "1", String.valueOf(++i), String.valueOf(10 * i), "51", "101", "200", "1020", "2000", "25");
        return text.toString();
    }

    /** By hand: a merged header over two samples, units in a line of their own, a remark among the cells. */
    static String e(Tongue t) {
        StringBuilder text = new StringBuilder("Pasted from an invented report\n");
        row(text, "\t", t.word(SAMPLE) + " A", "", t.word(SAMPLE) + " B", "");
        row(text, "\t", t.word(RATE), t.word(STRESS), t.word(RATE), t.word(STRESS));
        row(text, "\t", "(1/s)", "(Pa)", "(1/s)", "(Pa)");
        List<Point> a = InventedCurve.up();
        List<Point> b = a.subList(2, 10).stream().map(p -> p.times("2")).toList();
        for (int i = 0; i < a.size(); i++) {
            boolean more = i < b.size();
            row(text, "\t", t.number(a.get(i).rate()), t.number(a.get(i).stress()), more ? t.number(b.get(i).rate()) : "",
                    !more ? "" : i == 3 ? "spilled" : t.number(b.get(i).stress()));
        }
        return text.append("measured twice\n").toString();
    }

    private static void row(StringBuilder text, String separator, String... cells) {
        text.append(String.join(separator, cells)).append("\r\n");
    }
}
