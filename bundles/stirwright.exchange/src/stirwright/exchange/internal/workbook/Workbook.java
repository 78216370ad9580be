package stirwright.exchange.internal.workbook;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.NoSuchElementException;
import java.util.Set;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;
import stirwright.exchange.UnusableFileException;
import stirwright.exchange.internal.table.SourceRow;
import stirwright.exchange.internal.table.SourceSheet;

/** The sheets of a workbook, in their order. */
public final class Workbook {

    private Workbook() {}

    /**
     * @param mostCells of all sheets together
     * @throws UnusableFileException when it is another kind of archive, broken or too large
     */
    public static List<SourceSheet> read(String shown, byte[] bytes, int mostCells) {
        ZipParts parts = new ZipParts(shown, bytes);
        if (!parts.has("xl/workbook.xml")) {
            throw new UnusableFileException(shown, (parts.has("xl/workbook.bin") ? "is a workbook in a binary format"
                    : new String(parts.part("mimetype"), StandardCharsets.US_ASCII).contains("opendocument")
                            ? "is an OpenDocument file" : "is an archive without a workbook in it")
                    + "; save it as .xlsx or as CSV in UTF-8");
        }
        try {
            SheetReader reader = new SheetReader(SharedTexts.read(parts.part("xl/sharedStrings.xml")),
                    new Styles(parts.part("xl/styles.xml")), mostCells);
            List<SourceSheet> sheets = new ArrayList<>();
            Set<String> hidden = new HashSet<>();
            for (Map.Entry<String, String> sheet : paths(parts, hidden).entrySet()) {
                if (parts.has(sheet.getValue())) {
                    List<Integer> hiddenRows = new ArrayList<>();
                    List<SourceRow> rows = reader.read(parts.part(sheet.getValue()), hiddenRows);
                    sheets.add(new SourceSheet(sheet.getKey(), rows, hidden.contains(sheet.getKey()), hiddenRows));
                }
            }
            if (reader.count() >= mostCells) {
                throw new UnusableFileException(shown, "has more than " + mostCells + " cells; save the part with the flow curve by itself");
            }
            if (sheets.isEmpty()) {
                throw new UnusableFileException(shown, "is a workbook without sheets; open it in a spreadsheet and save it again");
            }
            return sheets;
        } catch (XMLStreamException | NoSuchElementException broken) {
            throw new UnusableFileException(shown, "is a broken workbook; open it in a spreadsheet and save it again", broken);
        }
    }

    /** Name of each sheet and the part that holds it; adds the names of those that are not shown. */
    private static Map<String, String> paths(ZipParts parts, Set<String> hidden) throws XMLStreamException {
        Map<String, String> targets = new HashMap<>();
        if (parts.has("xl/_rels/workbook.xml.rels")) {
            XMLStreamReader xml = Xml.read(parts.part("xl/_rels/workbook.xml.rels"));
            while (xml.hasNext()) {
                if (xml.next() == XMLStreamConstants.START_ELEMENT && xml.getLocalName().equals("Relationship")) {
                    String target = Xml.attribute(xml, "Target");
                    targets.put(Xml.attribute(xml, "Id"), target.startsWith("/") ? target.substring(1) : "xl/" + target);
                }
            }
        }
        Map<String, String> paths = new LinkedHashMap<>();
        XMLStreamReader xml = Xml.read(parts.part("xl/workbook.xml"));
        while (xml.hasNext()) {
            if (xml.next() == XMLStreamConstants.START_ELEMENT && xml.getLocalName().equals("sheet")) {
                String id = Xml.attribute(xml, "id");
                if (Xml.attribute(xml, "state").toLowerCase(Locale.ROOT).endsWith("hidden")) {
                    hidden.add(Xml.attribute(xml, "name"));
                }
                paths.put(Xml.attribute(xml, "name"), targets.getOrDefault(id, "xl/worksheets/sheet" + (paths.size() + 1) + ".xml"));
            }
        }
        return paths;
    }
}
