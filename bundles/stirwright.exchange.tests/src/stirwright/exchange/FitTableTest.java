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
import stirwright.rheology.FlowCurve;
import stirwright.rheology.FluidModel;
import stirwright.rheology.HerschelBulkley;
import stirwright.rheology.ModelKind;
import stirwright.rheology.PowerLaw;

/** Curves that are computed from known parameters, so that the fit has to find these again. */
class FitTableTest {
    private static final double[] RATES = {0.1, 0.5, 1, 5, 10, 50, 100};

    private static CurveFits fits(FluidModel model) {
        return CurveFits.of(MeasuredCurve.of("invented", FlowCurve.of(RATES, Arrays.stream(RATES).map(model::stress).toArray())));
    }

    private static List<NamedCsvRecord> records(CurveFits fits) {
        StringWriter out = new StringWriter();
        FitTable.write(List.of(fits), out);
        return CsvReader.builder().ofNamedCsvRecord(out.toString()).stream().toList();
    }

    @Test
    void columnsAreTheContracts() {
        assertEquals("curve, model, rank, parameter, unit, value, low95, high95, rms_relative, aicc, points, rate_min_1_s,"
                + " rate_max_1_s, status, notes", String.join(", ", FitTable.columns()));
    }

    @Test
    void yieldStressFluid() {
        List<NamedCsvRecord> rows = records(fits(new HerschelBulkley(12, 3, 0.6)));
        assertEquals(List.of("yield_stress", "consistency", "flow_index", "consistency", "flow_index"),
                rows.stream().map(r -> r.getField("parameter")).toList());
        assertEquals(List.of("1", "1", "1", "2", "2"), rows.stream().map(r -> r.getField("rank")).toList());
        double[] expected = {12, 3, 0.6};
        for (int i = 0; i < expected.length; i++) {
            assertEquals("herschel-bulkley", rows.get(i).getField("model"));
            assertEquals(expected[i], Double.parseDouble(rows.get(i).getField("value")), 1e-4 * expected[i]);
        }
        NamedCsvRecord first = rows.get(0);
        assertEquals("invented", first.getField("curve"));
        assertEquals("Pa", first.getField("unit"));
        assertEquals("7", first.getField("points"));
        assertEquals("0.1", first.getField("rate_min_1_s"));
        assertEquals("100.0", first.getField("rate_max_1_s"));
        assertEquals("ok", first.getField("status"));
        assertEquals("", first.getField("low95") + first.getField("high95") + first.getField("aicc"));
        assertTrue(Double.parseDouble(rows.get(3).getField("rms_relative")) > 0.01);
    }

    @Test
    void ofEqualFitsTheSimplerComesFirst() {
        CurveFits fits = fits(new PowerLaw(3, 0.6));
        assertEquals(List.of(ModelKind.POWER_LAW, ModelKind.HERSCHEL_BULKLEY),
                fits.attempts().stream().map(CurveFits.Attempt::model).toList());
        assertEquals(Status.OK, fits.status());
    }

    @Test
    void aModelThatDoesNotDescribeTheCurve() {
        CurveFits fits = CurveFits.of(MeasuredCurve.of("falling", FlowCurve.of(new double[] {1, 10, 100}, new double[] {9, 5, 2})));
        assertEquals(Status.REFUSED, fits.status());
        List<NamedCsvRecord> rows = records(fits);
        assertEquals(2, rows.size());
        rows.forEach(r -> {
            assertEquals("refused", r.getField("status"));
            assertEquals("", r.getField("rank") + r.getField("parameter") + r.getField("value"));
            assertTrue(r.getField("notes").contains("does not describe"), r.getField("notes"));
        });
    }

    @Test
    void tooFewRatesForOneOfThem() {
        CurveFits fits = CurveFits.of(MeasuredCurve.of("two rates", FlowCurve.of(new double[] {1, 1, 10}, new double[] {2, 2, 9})));
        assertEquals(Status.FLAGGED, fits.status());
        assertEquals(ModelKind.POWER_LAW, fits.attempts().get(0).model());
    }
}
