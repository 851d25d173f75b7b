package gapwright.reference;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;

import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.physics.coil.Loops;
import gapwright.physics.coil.Solenoid;
import gapwright.physics.core.EffectiveParameters;
import gapwright.physics.core.PathPart;

/** Closed forms of data/closed-forms. */
final class ClosedFormRows {

	/** What elliptic integrals and sums of a general library agree to. */
	private static final double EXACT = 1e-12;

	private ClosedFormRows() {
	}

	static List<Row> all() throws IOException {
		List<Row> rows = new ArrayList<>();
		for (JsonObject row : read("nagaoka")) {
			double ratio = number(row, "diameterOverLength");
			rows.add(Row.of("solenoid, D/l = " + ratio, "Nagaoka (1909), from memory; elliptic integrals of a numerical library",
					"Nagaoka's coefficient", Solenoid.nagaoka(ratio), number(row, "coefficient"), EXACT));
		}
		for (JsonObject row : read("coaxial-loops")) {
			rows.add(Row.of("coaxial loops " + number(row, "radius1") + " and " + number(row, "radius2") + " m, " + number(row, "distance")
					+ " m apart", "Maxwell, Treatise, art. 701, from memory; elliptic integrals of a numerical library",
					"mutual inductance, H", Loops.mutual(number(row, "radius1"), number(row, "radius2"), number(row, "distance")),
					number(row, "mutual"), EXACT));
		}
		for (JsonObject row : read("toroid")) {
			String kase = "ring " + number(row, "innerRadius") + "/" + number(row, "outerRadius") + "/" + number(row, "height") + " m";
			String source = "closed form of the rectangular ring; IEC 60205, from memory";
			rows.add(Row.of(kase, source, "inductance, H", Loops.rectangularToroid(number(row, "relativePermeability"), number(row, "turns"),
					number(row, "innerRadius"), number(row, "outerRadius"), number(row, "height")), number(row, "inductance"), EXACT));
			EffectiveParameters core = EffectiveParameters
					.of(List.of(PathPart.ring(number(row, "innerRadius"), number(row, "outerRadius"), number(row, "height"))));
			parameters(rows, kase, source, core, row);
		}
		for (JsonObject row : read("effective-parameters")) {
			List<PathPart> parts = new ArrayList<>();
			for (JsonElement section : row.getAsJsonArray("sections")) {
				parts.add(PathPart.prism(number(section.getAsJsonObject(), "length"), number(section.getAsJsonObject(), "area")));
			}
			parameters(rows, "sections of " + row.get("name").getAsString(), "IEC 60205, from memory; sums in a numerical library",
					EffectiveParameters.of(parts), row);
		}
		double area = 1e-4;
		double diameter = Math.sqrt(4 * area / Math.PI);
		rows.add(Row.of("solenoid of 300 turns, 1 cm², 0.5 m, in the long limit", "elementary, µ₀N²A/l", "inductance, H",
				Solenoid.currentSheet(300, diameter, 0.5) / Solenoid.nagaoka(diameter / 0.5), 2.2619467105846513e-05, EXACT));
		for (JsonObject row : read("wire-awg")) {
			int gauge = (int) number(row, "awg");
			rows.add(Row.of("AWG " + gauge, "ASTM B258 defining formula, from memory", "bare diameter, m",
					Quantity.parse("AWG " + gauge, Dimension.WIRE).si(), number(row, "diameter"), EXACT));
		}
		return rows;
	}

	private static void parameters(List<Row> rows, String kase, String source, EffectiveParameters core, JsonObject row) {
		rows.add(Row.of(kase, source, "C₁, 1/m", core.c1(), number(row, "C1"), EXACT));
		rows.add(Row.of(kase, source, "C₂, 1/m³", core.c2(), number(row, "C2"), EXACT));
		rows.add(Row.of(kase, source, "effective length, m", core.length(), number(row, "effectiveLength"), EXACT));
		rows.add(Row.of(kase, source, "effective area, m²", core.area(), number(row, "effectiveArea"), EXACT));
		rows.add(Row.of(kase, source, "effective volume, m³", core.volume(), number(row, "effectiveVolume"), EXACT));
	}

	private static double number(JsonObject row, String key) {
		return row.get(key).getAsDouble();
	}

	private static List<JsonObject> read(String name) throws IOException {
		List<JsonObject> rows = new ArrayList<>();
		JsonObject file = JsonParser.parseString(Files.readString(Path.of("data/closed-forms/" + name + ".json"))).getAsJsonObject();
		file.getAsJsonArray("rows").forEach(row -> rows.add(row.getAsJsonObject()));
		return rows;
	}
}
