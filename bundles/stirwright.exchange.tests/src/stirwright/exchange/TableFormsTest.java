package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.stream.Collectors;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import stirwright.core.CaseSpec;

/** One content, however it is written down: separator, decimal sign, order of columns, quotes, line ends. */
class TableFormsTest {
    private static final int CASES = 30;
    private static final List<String> COLUMNS = List.of(
            "case", "family", "impeller_diameter_m", "vessel_diameter_m", "baffle_count", "blade_angle_deg", "speed_rpm",
            "density_kg_m3", "model", "yield_stress_Pa", "consistency_Pa_sn", "flow_index", "power_number",
            "shear_rate_max_1_s", "remark, free");

    @TempDir
    Path folder;

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void everyFormGivesTheSameCases(long seed) {
        Random random = new Random(seed);
        List<List<String>> rows = rows(random);
        List<CaseSpec> expected = read(write(rows, COLUMNS, ',', '.', "\n", random));
        assertEquals(CASES, expected.size());
        for (char separator : new char[] {',', ';', '\t'}) {
            for (char decimal : new char[] {'.', ','}) {
                List<String> order = new ArrayList<>(COLUMNS);
                Collections.shuffle(order, random);
                String lineEnd = random.nextBoolean() ? "\r\n" : "\n";
                assertEquals(expected, read(write(rows, order, separator, decimal, lineEnd, random)),
                        () -> "separator '" + separator + "', decimal '" + decimal + "', " + order);
            }
        }
    }

    private List<CaseSpec> read(String text) {
        return Sheet.read(folder, text).entries().stream().map(CaseEntry::spec).flatMap(Optional::stream).toList();
    }

    private static List<List<String>> rows(Random random) {
        List<List<String>> rows = new ArrayList<>();
        for (int i = 0; i < CASES; i++) {
            double diameter = 0.1 + random.nextDouble();
            rows.add(List.of("case, \"" + i + "\"; #", "blades", "" + diameter, "" + 3 * diameter,
                    random.nextBoolean() ? "4" : "0", "" + (30 + random.nextInt(61)), "" + (1 + 100 * random.nextDouble()),
                    "" + (800 + random.nextInt(800)), "herschel-bulkley", random.nextBoolean() ? "0" : "12.75",
                    "" + (0.1 + random.nextDouble()), "" + (0.2 + random.nextDouble()),
                    random.nextBoolean() ? "" : "" + (1 + random.nextDouble()), "1.5e3", "see a, b; c"));
        }
        return rows;
    }

    private static String write(
            List<List<String>> rows, List<String> order, char separator, char decimal, String lineEnd, Random random) {
        StringBuilder text = new StringBuilder("# invented" + lineEnd);
        text.append(line(order, separator, random)).append(lineEnd);
        for (List<String> row : rows) {
            List<String> cells = order.stream()
                    .map(COLUMNS::indexOf)
                    .map(at -> row.get(at).matches("[0-9.eE+-]+") ? row.get(at).replace('.', decimal) : row.get(at))
                    .toList();
            text.append(line(cells, separator, random)).append(lineEnd);
        }
        return text.toString();
    }

    private static String line(List<String> cells, char separator, Random random) {
        return cells.stream()
                .map(c -> c.indexOf(separator) >= 0 || c.indexOf('"') >= 0 || random.nextInt(5) == 0
                        ? '"' + c.replace("\"", "\"\"") + '"' : c)
                .collect(Collectors.joining(String.valueOf(separator)));
    }
}
