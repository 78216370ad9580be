package stirwright.exchange;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static stirwright.exchange.Refusals.assertUnusable;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What workbooks hold beside numbers, and archives that are none. */
class WorkbookTest {

    @TempDir
    Path folder;

    private CurveImport read(byte[] bytes) {
        return CurveFiles.read(folder, "book.xlsx", bytes);
    }

    private static List<List<Object>> rows(Object... more) {
        List<List<Object>> rows = new ArrayList<>(List.of(List.of("Shear rate [1/s]", "Shear stress [Pa]")));
        for (int i = 1; i < 5; i++) {
            rows.add(List.of(new BigDecimal(i * i), new BigDecimal("0.1").add(new BigDecimal(i))));
        }
        rows.add(List.of(more));
        return rows;
    }

    @Test
    void datesWordsAndErrorsAreNamed() {
        for (Object wrong : List.of(LocalDate.of(2026, 10, 9), "#DIV/0!", "n/a", "1,234.5")) {
            CurveImport read = read(Xlsx.write(Map.of("flow", rows(new BigDecimal(30), wrong))));
            assertEquals(4, read.requireCurves().get(0).points().size());
            assertEquals(1.1, read.curves().get(0).points().stress(0));
            DroppedPoint dropped = read.dropped().get(0);
            assertEquals(new PointPlace("flow", 6, 1), dropped.place());
            assertTrue(dropped.reason().contains("'" + wrong + "'"), dropped.reason());
        }
        assertTrue(read(Xlsx.write(Map.of("flow", rows(new BigDecimal(30), LocalDate.of(2026, 10, 9))))).dropped().get(0).reason().contains("9.10"));
    }

    @Test
    void sheetsAreChosen() {
        byte[] book = Layouts.c(Tongue.ENGLISH, false);
        CurveSource source = CurveSource.file(CurveFiles.write(folder, "book.xlsx", book));
        CurveImport down = CurveImport.of(source, ImportChoice.DETECT.withSheets(List.of("Down")));
        assertEquals(List.of(Ramp.DOWN), down.requireCurves().stream().map(c -> c.measurement().ramp()).toList());
        assertTrue(down.findings().stream().anyMatch(f -> f.topic() == Finding.Topic.SHEETS && f.overruled()));
        assertUnusable(() -> CurveImport.of(source, ImportChoice.DETECT.withSheets(List.of("Sideways"))), "book.xlsx", "Sideways", "Up, Down");
        CurveImport columns = CurveImport.of(source, ImportChoice.DETECT
                .with(new ColumnChoice("Down", 1, Optional.of(CurveQuantity.SHEAR_STRESS), "kPa")));
        assertEquals(1000 * down.curves().get(0).points().stress(0), columns.curves().get(1).points().stress(0), 1e-9);
        assertEquals(15.5, columns.curves().get(0).points().stress(3));
    }

    @Test
    void otherArchives() throws IOException {
        assertUnusable(() -> read(zip("mimetype", "application/vnd.oasis.opendocument.spreadsheet", 1)), "book.xlsx", "OpenDocument", ".xlsx");
        assertUnusable(() -> read(zip("xl/workbook.bin", "x", 1)), "binary", ".xlsx");
        assertUnusable(() -> read(zip("readme.txt", "x", 1)), "without a workbook");
        assertUnusable(() -> read(zip("xl/workbook.xml", "<workbook><sheets></workbook>", 1)), "broken workbook");
        assertUnusable(() -> read(zip("xl/workbook.xml", "<workbook><sheets/></workbook>", 1)), "without sheets");
        byte[] book = Layouts.c(Tongue.ENGLISH, false);
        assertUnusable(() -> read(Arrays.copyOf(book, book.length / 2)), "broken");
    }

    /** A document type could pull in files, or grow without end. */
    @Test
    void documentTypesAreNotFollowed() {
        assertUnusable(() -> read(zip("xl/workbook.xml", "<!DOCTYPE w [<!ENTITY e SYSTEM \"file:///etc/hostname\">]><workbook>"
                + "<sheets><sheet name=\"&e;\"/></sheets></workbook>", 1)), "broken workbook");
    }

    @Test
    void archivesThatGrowWithoutEnd() {
        String megabyte = " ".repeat(1 << 20);
        assertUnusable(() -> read(zip("xl/worksheets/sheet1.xml", megabyte, 200)), "128 MB", "CSV");
        assertUnusable(() -> read(zip("picture.png", megabyte, 200)), "128 MB");
    }

    @Test
    void farCellsDoNotFillTheMemory() throws IOException {
        StringBuilder sheet = new StringBuilder("<worksheet><sheetData>");
        for (int i = 1; i <= 20_000; i++) {
            sheet.append("<row r=\"" + i + "\"><c r=\"ALL" + i + "\"><v>1</v></c><c r=\"XFD" + i + "\"><v>1</v></c></row>");
        }
        assertUnusable(() -> read(zip(Map.of("xl/workbook.xml", "<workbook><sheets><sheet name=\"a\"/></sheets></workbook>",
                "xl/worksheets/sheet1.xml", sheet.append("</sheetData></worksheet>").toString()))), "1200000 cells");
    }

    private static byte[] zip(Map<String, String> parts) throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ZipOutputStream zip = new ZipOutputStream(bytes)) {
            for (Map.Entry<String, String> part : parts.entrySet()) {
                zip.putNextEntry(new ZipEntry(part.getKey()));
                zip.write(part.getValue().getBytes(UTF_8));
            }
        }
        return bytes.toByteArray();
    }

    private static byte[] zip(String name, String text, int times) throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ZipOutputStream zip = new ZipOutputStream(bytes)) {
            zip.putNextEntry(new ZipEntry(name));
            for (int i = 0; i < times; i++) {
                zip.write(text.getBytes(UTF_8));
            }
        }
        return bytes.toByteArray();
    }
}
