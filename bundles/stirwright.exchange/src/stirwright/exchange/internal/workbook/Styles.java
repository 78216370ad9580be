package stirwright.exchange.internal.workbook;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;

/** Which styles of cells show their number as a date: a spreadsheet may have made one of 9.10. */
final class Styles {
    private final List<Boolean> dates = new ArrayList<>();

    Styles(byte[] part) throws XMLStreamException {
        if (part.length == 0) {
            return;
        }
        XMLStreamReader xml = Xml.read(part);
        Map<String, String> formats = new HashMap<>();
        boolean cells = false;
        while (xml.hasNext()) {
            int event = xml.next();
            if (event == XMLStreamConstants.START_ELEMENT) {
                switch (xml.getLocalName()) {
                    case "numFmt" -> formats.put(Xml.attribute(xml, "numFmtId"), Xml.attribute(xml, "formatCode"));
                    case "cellXfs" -> cells = true;
                    case "xf" -> {
                        if (cells) {
                            dates.add(isDate(Xml.attribute(xml, "numFmtId"), formats));
                        }
                    }
                    default -> { }
                }
            } else if (event == XMLStreamConstants.END_ELEMENT && xml.getLocalName().equals("cellXfs")) {
                cells = false;
            }
        }
    }

    /** The built-in formats 14 to 17 and 22 have days in them (ECMA-376 part 1, 18.8.30). */
    private static boolean isDate(String id, Map<String, String> formats) {
        String code = formats.get(id);
        if (code == null) {
            return List.of("14", "15", "16", "17", "22").contains(id);
        }
        String bare = code.replaceAll("\"[^\"]*\"|\\\\.|\\[[^\\]]*\\]|_.|\\*.", "").toLowerCase(Locale.ROOT);
        return bare.indexOf('d') >= 0 || bare.indexOf('y') >= 0 || bare.contains("mmm");
    }

    boolean isDate(String style) {
        try {
            return !style.isEmpty() && dates.get(Integer.parseInt(style));
        } catch (NumberFormatException | IndexOutOfBoundsException noSuchStyle) {
            return false;
        }
    }
}
