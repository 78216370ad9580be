package stirwright.exchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.StringWriter;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import stirwright.core.Status;
import stirwright.rheology.FitOptions;
import stirwright.rheology.FlowCurve;
import stirwright.rheology.FluidModel;
import stirwright.rheology.HerschelBulkley;
import stirwright.rheology.ModelKind;
import stirwright.rheology.PowerLaw;

/** Curves that are computed from known parameters, so that the fit has to find these again. */
class FitTableTest {
    private static final double[] RATES = {0.1, 0.5, 1, 5, 10, 50, 100};

    private static CurveFits fits(FluidModel model) {
        return fits("invented", RATES, Arrays.stream(RATES).map(model::stress).toArray());
    }

    private static CurveFits fits(String label, double[] rates, double[] stresses) {
        return CurveFits.of(MeasuredCurve.of(label, FlowCurve.of(rates, stresses)), FitOptions.DEFAULT);
    }

    private static List<NamedCsvRecord> records(CurveFits fits) {
        StringWriter out = new StringWriter();
        FitTable.write(List.of(fits), out);
        return CsvReader.builder().ofNamedCsvRecord(out.toString()).stream().toList();
    }

    @Test
    void columnsOfTheContractComeFirst() {
        assertEquals("curve, model, rank, parameter, unit, value, low95, high95, rms_relative, aicc, points, rate_min_1_s,"
                + " rate_max_1_s, status, notes", String.join(", ", FitTable.columns().subList(0, 15)));
    }

    @Test
    void yieldStressFluid() {
        List<NamedCsvRecord> rows = records(fits(new HerschelBulkley(12, 3, 0.6)));
        assertEquals(List.of("yield_stress", "consistency", "flow_index"),
                rows.stream().limit(3).map(r -> r.getField("parameter")).toList());
        assertEquals(List.of("1", "1", "1", "2"), rows.stream().limit(4).map(r -> r.getField("rank")).toList());
        double[] expected = {12, 3, 0.6};
        for (int i = 0; i < expected.length; i++) {
            assertEquals("herschel-bulkley", rows.get(i).getField("model"));
            assertEquals(expected[i], number(rows.get(i), "value"), 1e-4 * expected[i]);
            // the points lie on the curve, so that the interval shrinks to it
            assertEquals(expected[i], number(rows.get(i), "low95"), 1e-4 * expected[i]);
            assertEquals(expected[i], number(rows.get(i), "high95"), 1e-4 * expected[i]);
        }
        NamedCsvRecord first = rows.get(0);
        assertEquals("invented", first.getField("curve"));
        assertEquals("Pa", first.getField("unit"));
        assertEquals("7", first.getField("points"));
        assertEquals("0.1", first.getField("rate_min_1_s"));
        assertEquals("100.0", first.getField("rate_max_1_s"));
        assertEquals("ok", first.getField("status"));
        assertEquals("relative error", first.getField("objective"));
        assertTrue(number(rows.get(3), "rms_relative") > 0.01);
        assertTrue(number(rows.get(3), "aicc") > number(first, "aicc"));
        assertEquals(number(rows.get(3), "aicc") - number(first, "aicc"), number(rows.get(3), "aicc_above_best"), 1e-9);
    }

    private static double number(NamedCsvRecord row, String column) {
        return Double.parseDouble(row.getField(column));
    }

    @Test
    void everyModelHasARowForEachParameter() {
        List<NamedCsvRecord> rows = records(fits(new HerschelBulkley(12, 3, 0.6)));
        for (ModelKind kind : ModelKind.values()) {
            assertEquals(kind.parameters().size(), rows.stream().filter(r -> r.getField("model").equals(kind.id())).count(), kind.id());
        }
    }

    @Test
    void ofEqualFitsTheSimplerComesFirst() {
        CurveFits fits = fits(new PowerLaw(3, 0.6));
        assertEquals(ModelKind.POWER_LAW, fits.fits().attempts().get(0).kind());
        assertEquals(Status.OK, fits.status());
    }

    @Test
    void aModelThatDoesNotDescribeTheCurve() {
        CurveFits fits = fits("falling", new double[] {1, 10, 100, 1000}, new double[] {9, 5, 2, 1});
        assertEquals(Status.FLAGGED, fits.status());
        List<NamedCsvRecord> rows = records(fits).stream().filter(r -> r.getField("model").equals("power-law")).toList();
        assertEquals(1, rows.size());
        assertEquals("refused", rows.get(0).getField("status"));
        assertEquals("", rows.get(0).getField("rank") + rows.get(0).getField("parameter") + rows.get(0).getField("value"));
        assertTrue(rows.get(0).getField("notes").contains("does not describe"), rows.get(0).getField("notes"));
    }

    @Test
    void tooFewRatesForSome() {
        CurveFits fits = fits("two rates", new double[] {1, 1, 10}, new double[] {2, 2, 9});
        assertEquals(Status.FLAGGED, fits.status());
        assertEquals("the fit needs at least 3 different shear rates, the curve has 2",
                fits.fits().attempt(ModelKind.HERSCHEL_BULKLEY).notes().get(0));
    }
}
