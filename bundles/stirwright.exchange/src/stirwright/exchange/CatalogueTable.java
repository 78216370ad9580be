package stirwright.exchange;

import java.io.Writer;
import java.util.List;
import stirwright.core.Catalogue;
import stirwright.exchange.internal.write.CatalogueColumns;
import stirwright.exchange.internal.write.Column;
import stirwright.exchange.internal.write.JsonOutput;
import stirwright.exchange.internal.write.JsonRecords;
import stirwright.exchange.internal.write.TableOutput;

/** Every installed correlation, one row for each family that it was made for. */
public final class CatalogueTable {

    private CatalogueTable() {}

    static Output<Catalogue> csv(Writer out) {
        return new TableOutput<>(out, CatalogueColumns.ALL, CatalogueColumns::rows);
    }

    static Output<Catalogue> json(Writer out, Origin origin) {
        return new JsonOutput<>(out, origin, "correlations",
                JsonRecords.each(CatalogueColumns.ALL, CatalogueColumns::rows));
    }

    static void complete(Output<Catalogue> output, Catalogue catalogue) {
        try (output) {
            output.add(catalogue);
            output.finish();
        }
    }

    /** The names of the columns, in order. */
    public static List<String> columns() {
        return Column.names(CatalogueColumns.ALL);
    }
}
