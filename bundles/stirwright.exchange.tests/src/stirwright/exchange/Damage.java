package stirwright.exchange;

import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Random;

/** Spoils files of flow curves in the ways in which files are spoilt, the same way for the same seed. */
final class Damage {
    private static final List<Charset> CHARSETS = List.of(StandardCharsets.UTF_8, StandardCharsets.UTF_16LE, StandardCharsets.UTF_16BE,
            Charset.forName("windows-1252"), Charset.forName("IBM850"), StandardCharsets.UTF_16);
    private static final List<String> STRANGE = List.of("n/a", "---", "invalid", "NaN", "-inf", "1e999", "1e300", "9e-320", "1.234,5", "1,234.5",
            "1 234", "0x1F", "12d", "0", "-5", "#DIV/0!", "\"", "\"open", ";", "\t", "9999999999999999999999", "1e99999999999", "+-3", "2026-10-09",
            "Shear Rate", "[Pa]", "Interval 3", "\u0000", "\uFEFF", "\u221E", "1.2.3", "=A1", "99999");

    private Damage() {}

    static byte[] text(String text, Charset charset, Random random) {
        String spoilt = text;
        int times = 1 + random.nextInt(3);
        for (int i = 0; i < times; i++) {
            spoilt = once(spoilt, random);
        }
        Charset written = random.nextInt(6) == 0 ? CHARSETS.get(random.nextInt(CHARSETS.size())) : charset;
        byte[] bytes = spoilt.getBytes(written);
        return random.nextInt(4) == 0 ? bytes(bytes, random) : bytes;
    }

    private static String once(String text, Random random) {
        List<String> lines = new ArrayList<>(Arrays.asList(text.split("\r\n", -1)));
        int at = random.nextInt(lines.size());
        switch (random.nextInt(9)) {
            case 0 -> {
                return text.substring(0, random.nextInt(text.length() + 1));
            }
            case 1 -> Collections.shuffle(lines, random);
            case 2 -> lines.set(at, lines.get(at).substring(0, random.nextInt(lines.get(at).length() + 1)));
            case 3 -> lines.remove(at);
            case 4 -> lines.add(random.nextInt(lines.size() + 1), lines.get(at));
            case 5 -> shuffleCells(lines, at, random);
            default -> strangeCells(lines, random);
        }
        return String.join("\r\n", lines);
    }

    private static void shuffleCells(List<String> lines, int at, Random random) {
        for (String separator : List.of("\t", ";", ",")) {
            List<String> cells = new ArrayList<>(Arrays.asList(lines.get(at).split(separator, -1)));
            if (cells.size() > 1) {
                Collections.shuffle(cells, random);
                lines.set(at, String.join(separator, cells));
                return;
            }
        }
    }

    private static void strangeCells(List<String> lines, Random random) {
        int count = 1 + random.nextInt(8);
        for (int i = 0; i < count; i++) {
            int at = random.nextInt(lines.size());
            String separator = lines.get(at).contains("\t") ? "\t" : lines.get(at).contains(";") ? ";" : ",";
            String[] cells = lines.get(at).split(separator, -1);
            cells[random.nextInt(cells.length)] = STRANGE.get(random.nextInt(STRANGE.size()));
            lines.set(at, String.join(separator, cells));
        }
    }

    /** Flipped bits, cut ends, lost and doubled bytes. */
    static byte[] bytes(byte[] whole, Random random) {
        byte[] bytes = whole.clone();
        for (int i = 1 + random.nextInt(4); i > 0 && bytes.length > 0; i--) {
            int at = random.nextInt(bytes.length);
            switch (random.nextInt(4)) {
                case 0 -> bytes = Arrays.copyOf(bytes, at);
                case 1 -> {
                    byte[] shorter = new byte[bytes.length - 1];
                    System.arraycopy(bytes, 0, shorter, 0, at);
                    System.arraycopy(bytes, at + 1, shorter, at, shorter.length - at);
                    bytes = shorter;
                }
                default -> bytes[at] ^= (byte) (1 << random.nextInt(8));
            }
        }
        return bytes;
    }
}
