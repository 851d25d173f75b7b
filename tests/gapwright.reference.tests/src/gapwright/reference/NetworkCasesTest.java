package gapwright.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;

import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;

import com.google.gson.JsonArray;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;

import gapwright.model.DesignReader;
import gapwright.study.AirPathResult;
import gapwright.study.LegResult;
import gapwright.study.OperatingPointResult;
import gapwright.study.Study;
import gapwright.study.StudyResult;
import gapwright.study.WindingResult;

/** Networks solved outside the project, see data/networks/SOURCES.md, through file, model, study and solver. */
class NetworkCasesTest {

	private static final Path FOLDER = Path.of("data/networks");

	@TestFactory
	List<DynamicTest> everyCaseAgreesWithinItsOwnTolerance() throws IOException {
		List<DynamicTest> tests = new ArrayList<>();
		try (Stream<Path> files = Files.list(FOLDER)) {
			for (Path json : files.filter(f -> f.toString().endsWith(".json")).sorted().toList()) {
				String name = json.getFileName().toString().replace(".json", "");
				tests.add(DynamicTest.dynamicTest(name, () -> compare(name)));
			}
		}
		assertTrue(tests.size() >= 12, "only " + tests.size() + " cases found in " + FOLDER.toAbsolutePath());
		return tests;
	}

	private static void compare(String name) throws IOException {
		JsonObject reference = JsonParser.parseString(Files.readString(FOLDER.resolve(name + ".json"))).getAsJsonObject();
		StudyResult result = Study.of(DesignReader.read(FOLDER.resolve(name + ".gapwright")));
		assertTrue(!result.isIncomplete(), () -> name + ": " + result.findings());
		OperatingPointResult point = result.operatingPoints().get(0);
		double tolerance = reference.getAsJsonObject("tolerance").get("relative").getAsDouble();
		JsonObject expected = reference.getAsJsonObject("expected");

		JsonObject legs = expected.getAsJsonObject("legs");
		group(name, "flux", legs, tolerance, id -> point.leg(id).flux());
		group(name, "fluxDensity", legs, tolerance, id -> point.leg(id).fluxDensity());
		group(name, "fieldStrength", legs, tolerance, id -> point.leg(id).fieldStrength());
		group(name, "mmfDrop", legs, tolerance, id -> point.leg(id).mmfDrop());
		assertEquals(legs.keySet(), new LinkedHashSet<>(point.legs().stream().map(LegResult::id).toList()));
		group(name, "flux", expected.getAsJsonObject("airPaths"), tolerance, id -> point.airPaths().stream()
				.filter(path -> path.id().equals(id)).mapToDouble(AirPathResult::flux).findFirst().orElseThrow());
		JsonObject windings = expected.getAsJsonObject("windings");
		group(name, "current", windings, tolerance, id -> point.winding(id).current());
		group(name, "linkage", windings, tolerance, id -> point.winding(id).linkage());
		assertEquals(windings.size(), point.windings().size());
		inductance(name, expected.getAsJsonObject("differentialInductance"), point, tolerance);
		if (expected.has("coEnergy") && !expected.get("coEnergy").isJsonNull()) {
			double coEnergy = expected.get("coEnergy").getAsDouble();
			assertEquals(coEnergy, point.coEnergy(), tolerance * coEnergy, name + ": coEnergy");
		}
	}

	/** One figure of all elements of a kind, against the largest of them. */
	private static void group(String name, String figure, JsonObject elements, double tolerance,
			ToDoubleFunction<String> ours) {
		double scale = 0;
		for (String id : elements.keySet()) {
			scale = Math.max(scale, Math.abs(value(elements, id, figure)));
		}
		for (String id : elements.keySet()) {
			double theirs = value(elements, id, figure);
			assertEquals(theirs, ours.applyAsDouble(id), tolerance * scale, name + ": " + figure + " of " + id);
		}
	}

	private static double value(JsonObject elements, String id, String figure) {
		var element = elements.get(id);
		return element.isJsonPrimitive() ? element.getAsDouble() : element.getAsJsonObject().get(figure).getAsDouble();
	}

	private static void inductance(String name, JsonObject reference, OperatingPointResult point, double tolerance) {
		JsonArray windings = reference.getAsJsonArray("windings");
		JsonArray matrix = reference.getAsJsonArray("matrix");
		double scale = 0;
		for (var row : matrix) {
			for (var entry : row.getAsJsonArray()) {
				scale = Math.max(scale, Math.abs(entry.getAsDouble()));
			}
		}
		List<String> ids = point.windings().stream().map(WindingResult::id).toList();
		for (int i = 0; i < windings.size(); i++) {
			for (int j = 0; j < windings.size(); j++) {
				int row = ids.indexOf(windings.get(i).getAsString());
				int column = ids.indexOf(windings.get(j).getAsString());
				assertEquals(matrix.get(i).getAsJsonArray().get(j).getAsDouble(),
						point.inductance().differential()[row][column], tolerance * scale,
						name + ": inductance of " + windings.get(i) + " and " + windings.get(j));
			}
		}
	}
}
