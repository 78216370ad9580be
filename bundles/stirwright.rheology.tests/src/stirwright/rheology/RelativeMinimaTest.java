package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeFalse;

import java.io.IOException;
import java.util.List;
import java.util.Map;
import java.util.Set;

import org.junit.jupiter.api.Test;

/** The default objective against the smallest that many independent starts find; see {@code relative-minima.csv}. */
class RelativeMinimaTest {

	private static final Set<String> COMMITTED = Set.of("49", "61", "67", "73", "133");

	@Test
	void ofTheFiveCurves() throws IOException {
		for (Map<String, String> row : rows(true)) {
			assertNotAbove(row, OpenRheograms.curve(row.get("rheogram")));
		}
	}

	@Test
	void ofFortyOthers() throws IOException {
		Map<String, FlowCurve> all = OpenRheograms.all();
		assumeFalse(all.isEmpty(), "the open rheograms (shared/data/open-rheograms) are not beside the checkout");
		assertEquals(385, all.size());
		List<Map<String, String>> rows = rows(false);
		assertEquals(40 * ModelKind.values().length, rows.size());
		for (Map<String, String> row : rows) {
			assertNotAbove(row, all.get(row.get("rheogram")));
		}
	}

	private static List<Map<String, String>> rows(boolean committed) {
		return Resource.rows("relative-minima.csv").stream()
				.filter(row -> COMMITTED.contains(row.get("rheogram")) == committed).toList();
	}

	/** What falls on without end is compared where the reference stopped; the search here may stop a little earlier or later. */
	private static void assertNotAbove(Map<String, String> row, FlowCurve curve) {
		ModelKind kind = ModelKind.byId(row.get("model")).orElseThrow();
		double least = Resource.number(row, "sum_of_squares");
		double found = Fits.one(kind, curve, FitOptions.DEFAULT).residualSumOfSquares();
		double tolerance = row.get("attained").equals("yes") ? 1e-8 : 1e-4;
		assertTrue(found <= least * (1 + tolerance), () -> row + ": found " + found);
	}
}
