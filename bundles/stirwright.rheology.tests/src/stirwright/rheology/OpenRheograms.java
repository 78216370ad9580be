package stirwright.rheology;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;

/** The measured curves of {@code open-rheograms.csv}, by their number; their source is stated in that file. */
final class OpenRheograms {

	private OpenRheograms() {
	}

	static FlowCurve curve(String number) throws IOException {
		List<String[]> rows = rows();
		int column = Arrays.asList(rows.get(0)).indexOf(number);
		return FlowCurve.of(numbers(rows, 0), numbers(rows, column));
	}

	private static double[] numbers(List<String[]> rows, int column) {
		return rows.stream().skip(1).mapToDouble(row -> Double.parseDouble(row[column])).toArray();
	}

	private static List<String[]> rows() throws IOException {
		try (BufferedReader reader = new BufferedReader(new InputStreamReader(
				OpenRheograms.class.getResourceAsStream("open-rheograms.csv"), StandardCharsets.UTF_8))) {
			return reader.lines().filter(line -> !line.startsWith("#")).map(line -> line.split(",")).toList();
		}
	}
}
