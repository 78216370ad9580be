package stirwright.exchange;

import static java.nio.charset.StandardCharsets.UTF_16BE;
import static java.nio.charset.StandardCharsets.UTF_16LE;
import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static stirwright.exchange.Refusals.assertUnusable;

import java.nio.charset.Charset;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import stirwright.rheology.FlowCurve;

/** The plain table of shear rate and stress, and what is said when it cannot be read. */
class CurveImportTest {
    private static final double[] RATES = {0.5, 10, 100};
    private static final double[] STRESSES = {2.5, 7.25, 20};

    @TempDir
    Path folder;

    private CurveImport read(String text) {
        return CurveFiles.read(folder, "ketchup 7.txt", text.getBytes(UTF_8));
    }

    private static void assertCurve(CurveImport read) {
        FlowCurve curve = read.requireCurves().get(0).points();
        assertArrayEquals(RATES, curve.shearRates());
        assertArrayEquals(STRESSES, curve.stresses());
        assertTrue(read.counts().addUp(), read.counts().words());
    }

    @ParameterizedTest
    @ValueSource(strings = {
        "shear_rate_1_s,shear_stress_Pa\n0.5,2.5\n10,7.25\n100,20\n",
        "shear_stress_Pa,shear_rate_1_s\n2.5,0.5\n7.25,10\n20,100\n",
        "# invented\n\nTime;Shear rate [1/s];Temp;Shear stress [Pa]\n1;0,5;20,1;2,5\n2;10;20,2;7,25\n3;100;20,1;20\n",
        "0.5\t2.5\n10\t7.25\n100\t20\n",
        "0,5;2,5\n10;7,25\n100;20\n",
        "0.5,2.5\n10,7.25\n100,20",
        "0.5 2.5\n10 7.25\n100 20\n",
        "shear_rate_1_s   shear_stress_Pa\n0,5   2,5\n10   7,25\n100    20\n",
        "\"0,5\",\"2,5\"\n10,\"7,25\"\n100,20\n",
        "\uFEFFpoint,rate,stress\nfirst,0.5,2.5\nsecond,10,7.25\nthird,100,20\n",
        "100,20\n0.5,2.5\n10,7.25\n",
        "Shear rate;Viscosity\n1/s;Pa s\n0.5;5\n10;0.725\n100;0.2\n",
        "shear rate in 1/s|shear stress in kPa\n0.5|0.0025\n10|0.00725\n100|0.02\n",
        "Schergeschwindigkeit / 1/s;Schubspannung / mPa\n0,5;2500\n10;7250\n100;20000\n",
        "Vitesse de cisaillement (s^-1);Contrainte (dyn/cm2)\n0,5;25\n10;72,5\n100;200\n",
        "Velocidad de corte [s\u207B\u00B9];Esfuerzo cortante [N/m\u00B2]\n0,5;2,5\n10;7,25\n100;20\n",
        "\u03B3\u0307 [1/s]\t\u03C4 [Pa]\n0.5\t2.5\n10\t7.25\n100\t20\n"})
    void oneCurveHoweverItIsWritten(String text) {
        CurveImport read = read(text.replace('|', '\t'));
        assertCurve(read);
        assertEquals("ketchup 7", read.curves().get(0).label());
        assertEquals("ketchup 7.txt", read.curves().get(0).measurement().source());
    }

    @Test
    void betweenVerticalBars() {
        assertCurve(read("Shear rate (1/s)|Shear stress (Pa)\n0.5|2.5\n10|7.25\n100|20\n"));
        CurveImport drawn = read("| Shear rate (1/s) | Shear stress (Pa) |\n|:---|---:|\n| 0.5 | 2.5 |\n| 10 | 7.25 |\n| 100 | 20 |\n");
        assertCurve(drawn);
        assertEquals(List.of(), drawn.dropped());
    }

    @Test
    void whatWasFoundIsReported() {
        String report = String.join("\n", read("a;shear rate;stress\nx;0,5;2,5\nx;1;2\nx;2;3\n").report());
        assertTrue(report.contains("ketchup 7.txt: separator: semicolon"), report);
        assertTrue(report.contains("decimal comma"), report);
        assertTrue(report.contains("column 2 'shear rate': shear rate in 1/s"), report);
        assertTrue(report.contains("Pa is assumed"), report);
    }

    @Test
    void everyDroppedPointIsNamed() {
        String header = "shear_rate_1_s;shear_stress_Pa\n1.5;2.5\n2;3.5\n3;4\n";
        assertDropped(header + "# c\n2;x7\n", 6, "shear_stress_Pa", "'x7'", "word");
        assertDropped(header + "0;4\n", 5, "shear_rate_1_s", "'0'", "greater than 0");
        assertDropped(header + "2;-4\n", 5, "shear_stress_Pa", "'-4'", "negative");
        assertDropped(header + "2\n", 5, "shear_stress_Pa", "blank");
        assertDropped(header + "2;1e999\n", 5, "'1e999'", "precision");
        assertDropped(header + "2;NaN\n", 5, "'NaN'", "word");
        assertDropped(header + "2;1e200\n", 5, "'1e200'", "beyond");
        assertDropped(header + "2;\"4\n", 5, "shear_stress_Pa", "'\"4'");
        assertDropped(header + "2;1.234,5\n", 5, "'1.234,5'", "thousands");
        assertDropped(header + "2;1,5\n", 5, "'1,5'", "decimal comma");
        assertDropped(header + "2;2026-10-09\n", 5, "'2026-10-09'", "date");
        assertDropped(header.replace(';', ',') + "2,1,5\n", 5, "column 3", "'5'", "quotes");
    }

    private void assertDropped(String text, int line, String... words) {
        CurveImport read = read(text);
        assertEquals(1, read.dropped().size(), read.messages().toString());
        DroppedPoint dropped = read.dropped().get(0);
        assertEquals(line, dropped.place().line());
        for (String word : words) {
            assertTrue(dropped.reason().contains(word), dropped.reason());
        }
        assertEquals(3, read.requireCurves().get(0).points().size());
        assertTrue(read.counts().addUp(), read.counts().words());
    }

    @Test
    void tooFewPoints() {
        assertUnusable(() -> read("1,2\n2,3\n").requireCurves(), "ketchup 7.txt", "3 points", "2");
        assertUnusable(() -> read("1;2\n2;z\n3;4\n").requireCurves(), "3 points", "line 2", "column 2", "'z'");
        assertUnusable(() -> read("shear_rate_1_s,shear_stress_Pa\n").requireCurves(), "no points");
    }

    @Test
    void whatCannotBeTold() {
        assertUnusable(() -> read("0,1,5,2\n1,2,5,3\n2,1,6,2\n").requireCurves(), "line 1", "4 cells", "header");
        assertUnusable(() -> read("a,b\nx,1\ny,2\n").requireCurves(), "two numbers");
        assertUnusable(() -> read("shear_rate_1_s,temperature\n1,2\n2,3\n3,4\n").requireCurves(), "shear stress", "shear_stress_Pa");
        assertUnusable(() -> read("speed_rpm,viscosity_cP\n1,2\n2,3\n3,4\n").requireCurves(), "shear rate", "geometry");
        assertUnusable(() -> read("rate;stress\n0,5;1\n1.5;2\n2;3\n").requireCurves(), "line 2", "'0,5'", "line 3", "'1.5'");
        CurveImport chosen = CurveImport.of(CurveSource.clipboard("rate;stress\n0,5;1\n1.5;2\n2;3\n3;4\n"),
                ImportChoice.DETECT.withDecimalSign(Optional.of(DecimalSign.COMMA)));
        assertEquals(3, chosen.requireCurves().get(0).points().size());
    }

    @ParameterizedTest
    @ValueSource(strings = {"shear stress [ozf/in2]", "stress in foo", "Shear stress [MPA]"})
    void unknownUnitsAreNamedAndNotTaken(String column) {
        assertUnusable(() -> read("shear_rate_1_s;" + column + "\n1;2\n2;3\n3;4\n").requireCurves(), "shear stress");
        assertTrue(read("shear_rate_1_s;" + column + "\n1;2\n2;3\n3;4\n").report().toString().contains("is not known for a shear stress"));
    }

    @Test
    void thousandsSignsAreAskedFor() {
        assertUnusable(() -> read("shear rate;shear stress\n100;1,234\n200;2,345\n300;3,456\n").requireCurves(), "three digits", "'1,234'", "choose");
        assertUnusable(() -> read("shear rate;viscosity mPas\n1;1.860\n2;1.420\n5;980\n10;745\n").requireCurves(), "three digits", "'1.860'");
        assertUnusable(() -> read("rate,viscosity cP\n1,\"16,000\"\n2,\"8,732\"\n5,\"4,051\"\n").requireCurves(), "three digits", "'16,000'");
        CurveImport chosen = CurveImport.of(CurveSource.clipboard("rate;stress\n100;1,234\n200;2,345\n300;3,456\n"),
                ImportChoice.DETECT.withDecimalSign(Optional.of(DecimalSign.COMMA)));
        assertArrayEquals(new double[] {1.234, 2.345, 3.456}, chosen.requireCurves().get(0).points().stresses());
    }

    @Test
    void oneNumberThatIsNoThousandsSettlesTheSign() {
        for (String settled : new String[] {"rate;stress\n0.5;1.234\n2;2.345\n3;3.456\n", "rate;stress;x\n1;1.234;0.1\n2;2.345;1\n3;3.456;2\n"}) {
            assertArrayEquals(new double[] {1.234, 2.345, 3.456}, read(settled).requireCurves().get(0).points().stresses());
            assertEquals(1, read(settled).curves().get(0).measurement().warnings().stream().filter(w -> !w.contains("decade")).count());
        }
        CurveImport commas = read("rate,stress\n1,1.234\n10,2.345\n100,3.456\n");
        assertArrayEquals(new double[] {1.234, 2.345, 3.456}, commas.requireCurves().get(0).points().stresses());
        assertTrue(commas.curves().get(0).measurement().warnings().toString().contains("commas stand between"), commas.messages().toString());
    }

    @Test
    void aDoubtOfTheSignReachesTheCurve() {
        CurveImport read = read("rate;stress\n0.5;1.25\n2;2.5\n3;3.5\n4;4,5\n");
        assertTrue(read.requireCurves().get(0).measurement().warnings().toString().contains("'4,5'"), read.messages().toString());
    }

    @Test
    void encodings() {
        String text = "Temperatur \u00B0C;Schergef\u00E4lle [1/s];Schubspannung [Pa]\r\n20;0,5;2,5\r\n20;10;7,25\r\n20;100;20\r\n";
        for (Charset charset : new Charset[] {UTF_8, UTF_16LE, UTF_16BE, Charset.forName("windows-1252")}) {
            assertEncoding(charset.name(), text.getBytes(charset));
        }
        assertEncoding("UTF-16LE", ("\uFEFF" + text).getBytes(UTF_16LE));
        assertEncoding("UTF-16BE", ("\uFEFF" + text).getBytes(UTF_16BE));
        CurveImport chosen = CurveImport.of(CurveSource.file(CurveFiles.write(folder, "x.txt", text.getBytes(Charset.forName("IBM850")))),
                ImportChoice.DETECT.withEncoding(Optional.of("IBM850")));
        assertCurve(chosen);
        assertTrue(chosen.findings().stream().anyMatch(f -> f.value().equals("IBM850") && f.overruled()));
        assertUnusable(() -> CurveImport.of(CurveSource.file(folder.resolve("x.txt")), ImportChoice.DETECT.withEncoding(Optional.of("none such"))),
                "x.txt", "none such");
    }

    private void assertEncoding(String expected, byte[] bytes) {
        CurveImport read = CurveFiles.read(folder, "e.txt", bytes);
        assertCurve(read);
        assertTrue(read.findings().stream().anyMatch(f -> f.topic() == Finding.Topic.ENCODING && f.value().equals(expected)),
                read.findings().toString());
    }

    @Test
    void clipboard() {
        CurveImport read = CurveImport.of(CurveSource.clipboard("\"Shear rate\n[1/s]\"\tShear stress [Pa]\n0.5\t2.5\n10\t7.25\n100\t20\n"),
                ImportChoice.DETECT);
        assertCurve(read);
        assertEquals("clipboard", read.curves().get(0).measurement().source());
        // FIPS 180-4, example of one block: the digest of abc.
        assertEquals("ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad", CurveSource.clipboard("abc").sha256());
        assertUnusable(() -> CurveSource.clipboard(" \n"), "clipboard", "copy");
    }

    @Test
    void otherFiles() {
        assertUnusable(() -> CurveFiles.read(folder, "a.xls", new byte[] {(byte) 0xD0, (byte) 0xCF, 0x11, (byte) 0xE0, 0, 0}), "a.xls", "old", ".xlsx");
        assertUnusable(() -> CurveFiles.read(folder, "a.pdf", "%PDF-1.7".getBytes(UTF_8)), "a.pdf", "PDF", "CSV");
        for (String page : new String[] {"<html><table><tr><td>1</td></tr></table></html>", "\n<!DOCTYPE html>\n<p>", "\uFEFF<?xml version='1.0'?><Workbook/>"}) {
            assertUnusable(() -> CurveFiles.read(folder, "a.xls", page.getBytes(UTF_8)), "a.xls", "web page", ".xlsx");
        }
        assertUnusable(() -> CurveFiles.read(folder, "a.xlsx", new byte[] {(byte) 0x89, 'P', 'N', 'G', 13, 10}), "a.xlsx", "picture");
        assertUnusable(() -> CurveFiles.read(folder, "a.bin", new byte[4000]), "a.bin", "no text");
        assertUnusable(() -> CurveFiles.read(folder, "a.csv", new byte[0]), "a.csv", "empty");
        assertUnusable(() -> CurveSource.file(folder.resolve("none.csv")), "none.csv", "no such file");
        assertUnusable(() -> CurveSource.file(folder), "folder");
    }
}
