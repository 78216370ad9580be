package stirwright.exchange;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import stirwright.exchange.InventedCurve.Point;

/** Workbooks of invented curves, read from a file that is gone afterwards. */
final class Books {

    private Books() {}

    static List<List<Object>> sheet(List<Point> points) {
        List<List<Object>> rows = new ArrayList<>(List.of(List.of("Shear rate [1/s]", "Shear stress [Pa]")));
        points.forEach(p -> rows.add(List.of(p.rate(), p.stress())));
        return rows;
    }

    static CurveImport read(byte[] book) {
        try {
            Path file = Files.createTempFile("invented", ".xlsx");
            try {
                return CurveImport.of(CurveSource.file(Files.write(file, book)), ImportChoice.DETECT);
            } finally {
                Files.delete(file);
            }
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }
}
