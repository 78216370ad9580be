package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Of every spoilt file something is said, nothing is lost, and every point that comes out stands in it. */
class DamagedFilesTest {
    private static final int VARIANTS = 1_000;
    /** For one file of some 50 lines, on a busy machine. */
    private static final long MOST_MILLIS = 2_000;
    private static final Pattern WITH_COMMA = Pattern.compile("[+-]?[0-9]*[.,]?[0-9]+([eE][+-]?[0-9]+)?|[+-]?[0-9]+[.,]");
    private static final Pattern WITH_POINT = Pattern.compile("[+-]?[0-9]*[.]?[0-9]+([eE][+-]?[0-9]+)?|[+-]?[0-9]+[.]");
    /** Neighbouring seeds begin with the same draws, so they are set far apart (the golden ratio times 2^64). */
    private static final long APART = 0x9E3779B97F4A7C15L;

    @TempDir
    Path folder;

    @Test
    void thousandVariants() {
        int curves = 0;
        int told = 0;
        for (int seed = 0; seed < VARIANTS; seed++) {
            String name = "variant " + seed;
            byte[] bytes = variant(new Random(APART * (seed + 1)), seed);
            long begin = System.nanoTime();
            try {
                CurveImport read = CurveFiles.read(folder, "v.txt", bytes);
                check(name, read, bytes);
                curves += read.curves().isEmpty() ? 0 : 1;
                told += read.curves().isEmpty() ? 1 : 0;
            } catch (UnusableFileException refused) {
                assertFalse(refused.getMessage().contains("\n"), name + ": " + refused.getMessage());
                assertTrue(refused.getMessage().contains("v.txt"), name + ": " + refused.getMessage());
                told++;
            }
            long millis = (System.nanoTime() - begin) / 1_000_000;
            assertTrue(millis < MOST_MILLIS, name + " took " + millis + " ms");
        }
        assertEquals(VARIANTS, curves + told);
        assertTrue(curves > VARIANTS / 3 && told > VARIANTS / 20, curves + " with curves, " + told + " without");
    }

    private static byte[] variant(Random random, int seed) {
        Tongue tongue = Tongue.values()[random.nextInt(2)];
        Charset charset = List.of(StandardCharsets.UTF_8, StandardCharsets.UTF_16LE, Charset.forName("windows-1252")).get(random.nextInt(3));
        return switch (seed % 5) {
            case 0 -> Damage.text(Layouts.a(tongue), charset, random);
            case 1 -> Damage.text(Layouts.b(tongue), charset, random);
            case 2 -> Damage.bytes(Layouts.c(tongue, random.nextBoolean()), random);
            case 3 -> Damage.text(Layouts.d(tongue), charset, random);
            default -> Damage.text(Layouts.e(tongue), charset, random);
        };
    }

    private static void check(String name, CurveImport read, byte[] bytes) {
        ImportCounts counts = read.counts();
        assertTrue(counts.addUp(), name + ": " + counts.words());
        assertEquals(read.rows().size(), counts.rows(), name);
        assertEquals(read.curves().stream().mapToInt(c -> c.points().size()).sum(), counts.taken(), name);
        assertEquals(read.dropped().size(), counts.dropped(), name);
        assertTrue(read.dropped().stream().noneMatch(d -> d.reason().isEmpty()), name);
        assertTrue(!read.curves().isEmpty() || read.messages().stream().anyMatch(m -> m.weight() == ImportMessage.Weight.PROBLEM), name);
        assertTrue(read.report().stream().noneMatch(line -> line.contains("\n")), name);
        String text = read.findings().stream().filter(f -> f.topic() == Finding.Topic.ENCODING).findFirst()
                .map(f -> new String(bytes, Charset.forName(f.value())))
                .orElseGet(() -> read.rows().stream().map(r -> String.join("\t", r.cells())).collect(Collectors.joining("\n")));
        String[] lines = text.split("\r\n|\r|\n", -1);
        if (!text.contains("\"") && read.findings().get(0).value().equals("text")) {
            assertEquals(lines.length - (lines[lines.length - 1].isEmpty() ? 1 : 0), counts.rows(), name);
        }
        if (read.rows().stream().anyMatch(r -> r.kind() == RawRow.Kind.NOTE && numbers(r) > 1)) {
            assertTrue(read.messages().stream().anyMatch(m -> m.words().contains("not read")), name + ": " + read.messages());
        }
        Map<String, String> shown = new HashMap<>();
        for (int i = 0; i < read.rows().size(); i++) {
            RawRow row = read.rows().get(i);
            shown.put(row.sheet() + row.line(), lines[row.sheet().isEmpty() ? row.line() - 1 : i]);
        }
        read.blocks().stream().filter(CurveBlock::taken).flatMap(b -> b.points().stream()).filter(CurvePoint::taken).forEach(point -> {
            String line = shown.get(point.place().sheet() + point.place().line());
            assertTrue(stands(point.shearRate(), point.shearStress(), line), () -> name + ": " + point + " in '" + line + "'");
        });
    }

    private static long numbers(RawRow row) {
        return row.cells().stream().filter(c -> c.matches("[0-9]+([.,][0-9]+)?")).count();
    }

    /** A rate and a stress in Pa or dyn/cm2, or a rate and a viscosity in Pa s or mPa s. */
    private static boolean stands(double rate, double stress, String line) {
        List<Double> numbers = Stream.of(WITH_COMMA, WITH_POINT).flatMap(p -> p.matcher(line).results())
                .map(m -> Double.valueOf(m.group().replace(',', '.'))).toList();
        boolean rateStands = numbers.contains(rate);
        boolean stressStands = numbers.stream().anyMatch(n -> same(n, stress) || same(n / 10, stress) || same(n * rate, stress)
                || same(n * rate / 1000, stress));
        return rateStands && stressStands;
    }

    private static boolean same(double a, double b) {
        return Math.abs(a - b) <= 1e-12 * Math.abs(b);
    }
}
