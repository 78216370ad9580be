package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.Random;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import stirwright.core.CaseResult;
import stirwright.core.Status;

/** Whatever stands under a good header: every row gets an answer, in the file's order, and nothing breaks. */
class RowFuzzTest {
    private static final String ALPHABET = "\"\"\"\n\n\r,,,;\t#.-+eE01 a\u00E9\u2028\uD83D\uDE00";
    private static final int FILES = 60;
    private static final int PIECES = 400;

    @TempDir
    Path folder;

    @ParameterizedTest
    @ValueSource(longs = {11, 12, 13})
    void rubbish(long seed) {
        Random random = new Random(seed);
        int rows = 0;
        for (int i = 0; i < FILES; i++) {
            String noise = IntStream.range(0, PIECES).mapToObj(k -> piece(random)).collect(Collectors.joining());
            CaseTable table = Sheet.read(folder, Sheet.good().with("note", "").header() + "\n" + Sheet.good().row() + "\n" + noise);
            int line = 1;
            for (CaseEntry entry : table.entries()) {
                assertTrue(entry.line() > line, () -> entry.line() + " in " + noise);
                line = entry.line();
                assertTrue(entry.spec().isPresent() != entry.refusal().isPresent());
                CaseResult result = entry.check(Invented.CROSS_CHECK);
                assertEquals(result.status() == Status.REFUSED, result.refusal().isPresent());
                rows++;
            }
        }
        assertTrue(rows > FILES, "the rubbish held no row");
    }

    private static String piece(Random random) {
        return switch (random.nextInt(30)) {
            case 0 -> "\n" + Sheet.good().row() + "\n";
            case 1 -> Sheet.good().row();
            default -> String.valueOf(ALPHABET.charAt(random.nextInt(ALPHABET.length())));
        };
    }
}
