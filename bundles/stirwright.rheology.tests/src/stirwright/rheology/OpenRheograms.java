package stirwright.rheology;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The measured curves of {@code open-rheograms.csv}, by their number; their source is stated in that file. */
final class OpenRheograms {

	private OpenRheograms() {
	}

	static FlowCurve curve(String number) throws IOException {
		List<String[]> rows = rows();
		int column = Arrays.asList(rows.get(0)).indexOf(number);
		return FlowCurve.of(numbers(rows, 0), numbers(rows, column));
	}

	/** The whole set by number, from the folder {@code shared/data} beside the checkout; empty where there is none. */
	static Map<String, FlowCurve> all() throws IOException {
		for (Path folder = Path.of("").toAbsolutePath(); folder != null; folder = folder.getParent()) {
			Path file = folder.resolve("shared/data/open-rheograms/RheogramSet.txt");
			if (Files.exists(file)) {
				return read(Files.readString(file));
			}
		}
		return Map.of();
	}

	/** Blocks of "number, name, 1" and then rate and stress with decimal commas, apart by empty lines. */
	private static Map<String, FlowCurve> read(String text) {
		Map<String, FlowCurve> curves = new LinkedHashMap<>();
		for (String block : text.split("\\R\\s*\\R")) {
			List<String[]> lines = block.strip().lines().map(line -> line.replace(',', '.').split("\t")).toList();
			List<double[]> points = lines.stream().skip(1)
					.map(line -> new double[] { Double.parseDouble(line[0]), Double.parseDouble(line[1]) }).toList();
			if (!points.isEmpty()) {
				curves.put(lines.get(0)[0], FlowCurve.of(points.stream().mapToDouble(p -> p[0]).toArray(),
						points.stream().mapToDouble(p -> p[1]).toArray()));
			}
		}
		return curves;
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
