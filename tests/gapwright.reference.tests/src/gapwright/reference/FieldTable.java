package gapwright.reference;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;

import com.google.gson.JsonObject;
import com.google.gson.JsonParser;

/** Rows of a table of methods against field solutions, as text for people and as rows of a page of the guide. */
final class FieldTable {

	private final List<String[]> rows = new ArrayList<>();

	static List<JsonObject> read(String name) throws IOException {
		List<JsonObject> rows = new ArrayList<>();
		JsonParser.parseString(Files.readString(Path.of("data/fields", name))).getAsJsonObject().getAsJsonArray("rows")
				.forEach(row -> rows.add(row.getAsJsonObject()));
		return rows;
	}

	void add(String... cells) {
		rows.add(cells);
	}

	int size() {
		return rows.size();
	}

	/** @return "+3.7 %", a real minus sign, for a ratio; "–" where there is none */
	static String perCent(double ratio) {
		if (Double.isNaN(ratio)) {
			return "–";
		}
		String text = String.format(Locale.ROOT, "%+.1f", ratio * 100);
		return (Double.parseDouble(text) == 0 ? "0.0" : text.replace('-', '−')) + " %";
	}

	void write(String file) throws IOException {
		Path target = Path.of("target");
		Files.createDirectories(target);
		Files.write(target.resolve(file), rows.stream().map(row -> String.join("\t", row)).toList());
	}

	/** @return the rows as a page of the guide must have them */
	List<String> html() {
		return rows.stream().map(row -> List.of(row).stream().map(cell -> "<td>" + cell + "</td>")
				.collect(Collectors.joining("", "<tr>", "</tr>"))).toList();
	}
}
