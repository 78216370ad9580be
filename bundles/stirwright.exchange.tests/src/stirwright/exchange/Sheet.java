package stirwright.exchange;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;

/** A case table of one good case, all of it invented, that a test bends cell by cell. */
final class Sheet {
    private final Map<String, String> cells = new LinkedHashMap<>();

    private Sheet() {}

    /** Water-like and Newtonian, so that nothing in it is refused. */
    static Sheet good() {
        return new Sheet().with("case", "A").with("family", "blades").with("impeller_diameter_m", "0.5")
                .with("vessel_diameter_m", "1.5").with("baffle_count", "4").with("speed_rev_s", "2")
                .with("density_kg_m3", "1000").with("model", "newtonian").with("viscosity_Pa_s", "0.1");
    }

    Sheet with(String column, String value) {
        cells.put(column, value);
        return this;
    }

    Sheet without(String column) {
        cells.remove(column);
        return this;
    }

    /** The value, though some reader may call it otherwise. */
    String get(String column) {
        return cells.get(column);
    }

    String header() {
        return String.join(",", cells.keySet());
    }

    String row() {
        return String.join(",", cells.values());
    }

    String text() {
        return header() + "\n" + row() + "\n";
    }

    CaseTable table(Path folder) {
        return read(folder, text());
    }

    CaseEntry entry(Path folder) {
        return table(folder).entries().get(0);
    }

    static CaseTable read(Path folder, String text) {
        return CaseTable.read(file(folder, text.getBytes(StandardCharsets.UTF_8)), Invented.CATALOGUE);
    }

    static Path file(Path folder, byte[] bytes) {
        try {
            return Files.write(folder.resolve("cases.csv"), bytes);
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }
}
