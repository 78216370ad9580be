package stirwright.rheology;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The rows of a reference file by the names of its header, comments left out. */
final class Resource {

	/** A comma with an even number of quotes behind it. */
	private static final String COMMA = ",(?=(?:[^\"]*\"[^\"]*\")*[^\"]*$)";

	private Resource() {
	}

	static List<Map<String, String>> rows(String name) {
		try (BufferedReader reader = new BufferedReader(
				new InputStreamReader(Resource.class.getResourceAsStream(name), StandardCharsets.UTF_8))) {
			List<String[]> cells = reader.lines().filter(line -> !line.startsWith("#"))
					.map(line -> line.split(COMMA, -1)).toList();
			List<Map<String, String>> rows = new ArrayList<>();
			for (String[] row : cells.subList(1, cells.size())) {
				Map<String, String> named = new LinkedHashMap<>();
				for (int i = 0; i < row.length; i++) {
					named.put(cells.get(0)[i], row[i]);
				}
				rows.add(named);
			}
			return rows;
		} catch (IOException failure) {
			throw new UncheckedIOException(failure);
		}
	}

	static double number(Map<String, String> row, String column) {
		return Double.parseDouble(row.get(column));
	}
}
