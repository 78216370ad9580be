package stirwright.exchange.internal.workbook;

import java.util.ArrayList;
import java.util.List;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;
import stirwright.exchange.internal.table.Texts;

/** The texts that cells point to by number. */
final class SharedTexts {

    private SharedTexts() {}

    static List<String> read(byte[] part) throws XMLStreamException {
        List<String> texts = new ArrayList<>();
        if (part.length == 0) {
            return texts;
        }
        XMLStreamReader xml = Xml.read(part);
        while (xml.hasNext()) {
            if (xml.next() == XMLStreamConstants.START_ELEMENT && xml.getLocalName().equals("si")) {
                texts.add(text(xml, "si"));
            }
        }
        return texts;
    }

    /** The runs of a text until its element ends, without readings (phonetic runs), on one line. */
    static String text(XMLStreamReader xml, String element) throws XMLStreamException {
        StringBuilder text = new StringBuilder();
        int phonetic = 0;
        while (xml.hasNext()) {
            int event = xml.next();
            if (event == XMLStreamConstants.START_ELEMENT) {
                phonetic += xml.getLocalName().equals("rPh") ? 1 : 0;
                if (xml.getLocalName().equals("t") && phonetic == 0) {
                    text.append(xml.getElementText());
                }
            } else if (event == XMLStreamConstants.END_ELEMENT) {
                phonetic -= xml.getLocalName().equals("rPh") ? 1 : 0;
                if (xml.getLocalName().equals(element)) {
                    break;
                }
            }
        }
        return oneLine(text.toString());
    }

    static String oneLine(String text) {
        return Texts.trim(text.indexOf('\n') < 0 && text.indexOf('\r') < 0 ? text : text.replaceAll("\\s*\\R\\s*", " "));
    }
}
