package stirwright.exchange;

import static java.nio.charset.StandardCharsets.UTF_8;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;

/** Writes small workbooks (ECMA-376 part 1) for tests: words as shared texts, numbers as numbers. */
final class Xlsx {
    private static final String MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
    private static final String RELATIONS = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";

    private Xlsx() {}

    /** @param sheets rows of texts and {@link BigDecimal}s; a {@link LocalDate} is a number that is shown as a date */
    static byte[] write(Map<String, List<List<Object>>> sheets) {
        return write(sheets, List.of(), List.of());
    }

    /**
     * @param hidden names of sheets that are not shown
     * @param hiddenRows lines of the first sheet that are not shown
     */
    static byte[] write(Map<String, List<List<Object>>> sheets, List<String> hidden, List<Integer> hiddenRows) {
        List<String> texts = new ArrayList<>();
        StringBuilder names = new StringBuilder();
        StringBuilder relations = new StringBuilder();
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ZipOutputStream zip = new ZipOutputStream(bytes)) {
            int i = 0;
            for (Map.Entry<String, List<List<Object>>> sheet : sheets.entrySet()) {
                i++;
                names.append("<sheet name=\"" + sheet.getKey() + "\" sheetId=\"" + i + (hidden.contains(sheet.getKey()) ? "\" state=\"hidden" : "") + "\" r:id=\"rId" + i + "\"/>");
                relations.append("<Relationship Id=\"rId" + i + "\" Type=\"" + RELATIONS + "/worksheet\" Target=\"worksheets/s" + i + ".xml\"/>");
                put(zip, "xl/worksheets/s" + i + ".xml", sheet(sheet.getValue(), texts, i == 1 ? hiddenRows : List.of()));
            }
            put(zip, "xl/workbook.xml", "<workbook xmlns=\"" + MAIN + "\" xmlns:r=\"" + RELATIONS + "\"><sheets>" + names + "</sheets></workbook>");
            put(zip, "xl/_rels/workbook.xml.rels", "<Relationships>" + relations + "</Relationships>");
            put(zip, "xl/styles.xml", "<styleSheet xmlns=\"" + MAIN + "\"><cellXfs><xf numFmtId=\"0\"/><xf numFmtId=\"14\"/></cellXfs></styleSheet>");
            StringBuilder shared = new StringBuilder("<sst xmlns=\"" + MAIN + "\">");
            texts.forEach(t -> shared.append("<si><t>").append(t.replace("&", "&amp;").replace("<", "&lt;")).append("</t></si>"));
            put(zip, "xl/sharedStrings.xml", shared.append("</sst>").toString());
        } catch (IOException impossible) {
            throw new UncheckedIOException(impossible);
        }
        return bytes.toByteArray();
    }

    private static String sheet(List<List<Object>> rows, List<String> texts, List<Integer> hidden) {
        StringBuilder xml = new StringBuilder("<worksheet xmlns=\"" + MAIN + "\"><sheetData>");
        for (int r = 0; r < rows.size(); r++) {
            xml.append("<row r=\"" + (r + 1) + (hidden.contains(r + 1) ? "\" hidden=\"1" : "") + "\">");
            for (int c = 0; c < rows.get(r).size(); c++) {
                Object cell = rows.get(r).get(c);
                String at = "<c r=\"" + (char) ('A' + c) + (r + 1) + "\"";
                if (cell instanceof BigDecimal number) {
                    xml.append(at + "><v>" + number.toPlainString() + "</v></c>");
                } else if (cell instanceof LocalDate date) {
                    xml.append(at + " s=\"1\"><v>" + (date.toEpochDay() + 25569) + "</v></c>");
                } else if (!cell.toString().isEmpty()) {
                    xml.append(at + " t=\"s\"><v>" + texts.size() + "</v></c>");
                    texts.add(cell.toString());
                }
            }
            xml.append("</row>");
        }
        return xml.append("</sheetData></worksheet>").toString();
    }

    private static void put(ZipOutputStream zip, String name, String xml) throws IOException {
        zip.putNextEntry(new ZipEntry(name));
        zip.write(xml.getBytes(UTF_8));
    }
}
