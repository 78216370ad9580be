package stirwright.exchange.internal.workbook;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;
import stirwright.exchange.DecimalSign;
import stirwright.exchange.internal.table.Numbers;
import stirwright.exchange.internal.table.SourceRow;

/** The rows of one sheet. A cell's text is its number as it is stored, its words, or the date that it shows. */
final class SheetReader {
    /** As many columns as a flow curve's sheet can have with samples side by side; cells beyond are not read. */
    private static final int MOST_COLUMNS = 1_000;

    private final List<String> texts;
    private final Styles styles;
    private final int mostCells;
    private int count;

    SheetReader(List<String> texts, Styles styles, int mostCells) {
        this.texts = texts;
        this.styles = styles;
        this.mostCells = mostCells;
    }

    /** How many cells were read, of all sheets. */
    int count() {
        return count;
    }

    /** @param hidden to which lines of rows are added that a spreadsheet does not show, for instance filtered ones */
    List<SourceRow> read(byte[] part, List<Integer> hidden) throws XMLStreamException {
        List<SourceRow> rows = new ArrayList<>();
        XMLStreamReader xml = Xml.read(part);
        int line = 0;
        while (xml.hasNext() && count < mostCells) {
            if (xml.next() == XMLStreamConstants.START_ELEMENT && xml.getLocalName().equals("row")) {
                int said = number(Xml.attribute(xml, "r"));
                line = said > line ? said : line + 1;
                boolean shown = !Xml.attribute(xml, "hidden").matches("1|true");
                SourceRow row = row(xml, line);
                if (shown) {
                    rows.add(row);
                } else if (!row.blank()) {
                    hidden.add(line);
                }
            }
        }
        return rows;
    }

    private SourceRow row(XMLStreamReader xml, int line) throws XMLStreamException {
        List<String> cells = new ArrayList<>();
        BitSet typed = new BitSet();
        int next = 0;
        while (xml.hasNext()) {
            int event = xml.next();
            if (event == XMLStreamConstants.END_ELEMENT && xml.getLocalName().equals("row")) {
                break;
            }
            if (event == XMLStreamConstants.START_ELEMENT && xml.getLocalName().equals("c")) {
                int column = Math.max(next, column(Xml.attribute(xml, "r"), next));
                next = column + 1;
                String type = Xml.attribute(xml, "t");
                String style = Xml.attribute(xml, "s");
                String cell = cell(xml, type, style);
                if (column < MOST_COLUMNS) {
                    count += column + 1 - cells.size();
                    while (cells.size() < column) {
                        cells.add("");
                    }
                    cells.add(cell);
                    typed.set(column, (type.isEmpty() || type.equals("n")) && Numbers.isNumber(cell));
                }
            }
        }
        return new SourceRow(line, cells, typed);
    }

    private String cell(XMLStreamReader xml, String type, String style) throws XMLStreamException {
        String value = "";
        boolean formula = false;
        while (xml.hasNext()) {
            int event = xml.next();
            if (event == XMLStreamConstants.END_ELEMENT && xml.getLocalName().equals("c")) {
                break;
            }
            if (event == XMLStreamConstants.START_ELEMENT) {
                switch (xml.getLocalName()) {
                    case "v" -> value = xml.getElementText();
                    case "is" -> value = SharedTexts.text(xml, "is");
                    case "f" -> formula = true;
                    default -> { }
                }
            }
        }
        if (value.isEmpty()) {
            return formula ? "formula without a value" : "";
        }
        return switch (type) {
            case "s" -> shared(value);
            case "b" -> value.equals("1") ? "TRUE" : "FALSE";
            case "", "n" -> styles.isDate(style) ? date(value) : SharedTexts.oneLine(value);
            default -> SharedTexts.oneLine(value);
        };
    }

    private String shared(String index) {
        int at = number(index);
        return at >= 0 && at < texts.size() ? texts.get(at) : "text " + index + " that is not there";
    }

    /** Days are counted from 1899-12-30 on, which makes up for a leap day in 1900 that never was. */
    private static String date(String serial) {
        double days = Numbers.parse(serial, DecimalSign.POINT);
        try {
            return Double.isNaN(days) ? serial : LocalDate.of(1899, 12, 30).plusDays((long) days).toString();
        } catch (DateTimeException | ArithmeticException beyond) {
            return serial;
        }
    }

    /** From 0; what follows the last cell where none is said. */
    private static int column(String reference, int otherwise) {
        int column = 0;
        int at = 0;
        while (at < reference.length() && at < 4 && reference.charAt(at) >= 'A' && reference.charAt(at) <= 'Z') {
            column = 26 * column + reference.charAt(at++) - 'A' + 1;
        }
        return at == 0 ? otherwise : column - 1;
    }

    private static int number(String text) {
        return text.matches("[0-9]{1,9}") ? Integer.parseInt(text) : -1;
    }
}
