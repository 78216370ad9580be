package stirwright.exchange;

import static java.nio.charset.StandardCharsets.ISO_8859_1;
import static java.nio.charset.StandardCharsets.UTF_16BE;
import static java.nio.charset.StandardCharsets.UTF_16LE;
import static java.nio.charset.StandardCharsets.UTF_8;
import static stirwright.exchange.Refusals.assertAccepted;
import static stirwright.exchange.Refusals.assertUnusable;

import java.nio.charset.Charset;
import java.nio.file.Path;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The contract asks for UTF-8 with or without a byte-order mark; anything else is told by its kind. */
class UnusableFileTest {
    private static final String GOOD = Sheet.good().text();

    @TempDir
    Path folder;

    private void assertUnusableBytes(byte[] bytes, String... words) {
        Path file = Sheet.file(folder, bytes);
        assertUnusable(() -> CaseTable.read(file, Invented.CATALOGUE), words);
    }

    @Test
    void byteOrderMarkIsAccepted() {
        assertAccepted(Sheet.read(folder, "\uFEFF" + GOOD).entries().get(0));
        assertAccepted(Sheet.read(folder, "\uFEFF# a comment first\n" + GOOD).entries().get(0));
    }

    @Test
    void noFileFolderOrEmptyFile() {
        assertUnusable(() -> CaseTable.read(folder.resolve("none.csv"), Invented.CATALOGUE), "none.csv", "no such file");
        assertUnusable(() -> CaseTable.read(folder, Invented.CATALOGUE), folder.toString(), "folder");
        assertUnusableBytes(new byte[0], "cases.csv", "empty", "header");
    }

    @Test
    void utf16() {
        assertUnusableBytes(("\uFEFF" + GOOD).getBytes(UTF_16LE), "cases.csv", "UTF-16", "UTF-8");
        assertUnusableBytes(("\uFEFF" + GOOD).getBytes(UTF_16BE), "UTF-16");
        assertUnusableBytes(GOOD.getBytes(UTF_16LE), "UTF-16");
        assertUnusableBytes(GOOD.getBytes(UTF_16BE), "UTF-16");
    }

    @Test
    void binaryAndForeignFormats() {
        byte[] noise = new byte[100_000];
        new Random(1).nextBytes(noise);
        assertUnusableBytes(noise, "cases.csv", "binary");
        assertUnusableBytes(new byte[] {'P', 'K', 3, 4, 20, 0, 0}, "workbook", "CSV");
        assertUnusableBytes("%PDF-1.7".getBytes(UTF_8), "PDF");
    }

    @Test
    void anotherEncodingIsNamedWithItsLine() {
        Charset oneByte = ISO_8859_1;
        String text = Sheet.good().header() + "\n# caf\u00e9\n" + Sheet.good().row() + "\n";
        assertUnusableBytes(text.getBytes(oneByte), "line 2", "0xE9", "UTF-8");
    }

    @Test
    void replacementCharacterInTheTextIsNoError() {
        assertAccepted(Sheet.good().with("case", "odd \uFFFD name").entry(folder));
    }

    @Test
    void withoutHeaderOrWithoutCase() {
        assertUnusable(() -> Sheet.read(folder, "# only\n\n  \n# comments\n"), "cases.csv", "header");
        assertUnusable(() -> Sheet.read(folder, Sheet.good().header() + "\n"), "cases.csv", "no case");
    }
}
