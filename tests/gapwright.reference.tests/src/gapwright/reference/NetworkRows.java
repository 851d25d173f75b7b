package gapwright.reference;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;

import gapwright.model.DesignReader;
import gapwright.study.OperatingPointResult;
import gapwright.study.Study;
import gapwright.study.WindingResult;

/** Every figure of every network in data/networks, through file, model, study and solver. */
final class NetworkRows {

	private static final Path FOLDER = Path.of("data/networks");
	private static final String SOURCE = "dense Newton in numpy and a circuit simulator";

	private final List<Row> rows = new ArrayList<>();
	private final String name;
	private final double tolerance;

	private NetworkRows(String name, double tolerance) {
		this.name = name;
		this.tolerance = tolerance;
	}

	static List<Row> all() throws IOException {
		List<Row> all = new ArrayList<>();
		try (Stream<Path> files = Files.list(FOLDER)) {
			for (Path json : files.filter(f -> f.toString().endsWith(".json")).sorted().toList()) {
				all.addAll(rows(json.getFileName().toString().replace(".json", "")));
			}
		}
		return all;
	}

	private static List<Row> rows(String name) throws IOException {
		JsonObject reference = JsonParser.parseString(Files.readString(FOLDER.resolve(name + ".json"))).getAsJsonObject();
		OperatingPointResult point = Study.of(DesignReader.read(FOLDER.resolve(name + ".gapwright"))).operatingPoints().get(0);
		NetworkRows collector = new NetworkRows(name, reference.getAsJsonObject("tolerance").get("relative").getAsDouble());
		JsonObject expected = reference.getAsJsonObject("expected");
		JsonObject legs = expected.getAsJsonObject("legs");
		collector.group("flux of leg, Wb", "flux", legs, id -> point.leg(id).flux());
		collector.group("flux density of leg, T", "fluxDensity", legs, id -> point.leg(id).fluxDensity());
		collector.group("field strength of leg, A/m", "fieldStrength", legs, id -> point.leg(id).fieldStrength());
		JsonObject windings = expected.getAsJsonObject("windings");
		collector.group("linkage of winding, Wb", "linkage", windings, id -> point.winding(id).linkage());
		collector.inductance(expected.getAsJsonObject("differentialInductance"), point);
		if (expected.has("coEnergy") && !expected.get("coEnergy").isJsonNull()) {
			collector.rows.add(Row.of(name, SOURCE, "co-energy, J", point.coEnergy(), expected.get("coEnergy").getAsDouble(), collector.tolerance));
		}
		return collector.rows;
	}

	private void group(String figure, String key, JsonObject elements, ToDoubleFunction<String> ours) {
		double scale = elements.keySet().stream().mapToDouble(id -> Math.abs(value(elements.get(id), key))).max().orElse(0);
		for (String id : elements.keySet()) {
			rows.add(new Row(name, SOURCE, figure + " [" + id + "]", ours.applyAsDouble(id), value(elements.get(id), key), scale, tolerance));
		}
	}

	private static double value(JsonElement element, String key) {
		return element.isJsonPrimitive() ? element.getAsDouble() : element.getAsJsonObject().get(key).getAsDouble();
	}

	private void inductance(JsonObject reference, OperatingPointResult point) {
		JsonArray windings = reference.getAsJsonArray("windings");
		JsonArray matrix = reference.getAsJsonArray("matrix");
		double scale = 0;
		for (JsonElement row : matrix) {
			for (JsonElement entry : row.getAsJsonArray()) {
				scale = Math.max(scale, Math.abs(entry.getAsDouble()));
			}
		}
		List<String> ids = point.windings().stream().map(WindingResult::id).toList();
		for (int i = 0; i < windings.size(); i++) {
			for (int j = i; j < windings.size(); j++) {
				String first = windings.get(i).getAsString();
				String second = windings.get(j).getAsString();
				rows.add(new Row(name, SOURCE, "differential inductance, H [" + first + ", " + second + "]",
						point.inductance().differential()[ids.indexOf(first)][ids.indexOf(second)],
						matrix.get(i).getAsJsonArray().get(j).getAsDouble(), scale, tolerance));
			}
		}
	}
}
