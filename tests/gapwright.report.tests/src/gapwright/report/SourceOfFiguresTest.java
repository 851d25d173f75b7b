package gapwright.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

import org.junit.jupiter.api.Test;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;

import gapwright.study.AirPathResult;
import gapwright.study.ConnectionResult;
import gapwright.study.GapResult;
import gapwright.study.InductanceMatrix;
import gapwright.study.LeakageResult;
import gapwright.study.LegResult;
import gapwright.study.LegState;
import gapwright.study.OperatingPointResult;
import gapwright.study.StudyResult;
import gapwright.study.WindingResult;
import gapwright.study.provenance.FigureGroup;
import gapwright.study.provenance.Origin;
import gapwright.study.provenance.Provenance;

/** No figure without its source. */
class SourceOfFiguresTest {

	private static final Set<String> NO_FIGURES = Set.of("iterations");

	private static JsonObject json() {
		OperatingPointResult point = new OperatingPointResult("p", true, 3, 1e-16, 1, 1,
				List.of(new LegResult("l", 1, 1, 1, 1, 1, 1, 1, LegState.NEAR)), List.of(new GapResult("g", "l", 1, 1, 1)),
				List.of(new AirPathResult("a", 1)), List.of(new WindingResult("w", 1, 1, 1, 1, 1, 1), new WindingResult("v", 1, 1, 1, 1, 1, 1)),
				new InductanceMatrix(List.of("w", "v"), new double[][] { { 2, 1 }, { 1, 2 } }),
				List.of(new LeakageResult("k", "w", "v", 1, 1, 1, 0.5)), List.of(new ConnectionResult("c", true, List.of("w", "v"), List.of(false, false), 1)));
		return JsonParser.parseString(CheckJson.of(new StudyResult("d", List.of(point), List.of(), LegState.NEAR), "f", "0")).getAsJsonObject();
	}

	@Test
	void everyNumberOfACheckHasItsSource() {
		JsonObject json = json();
		Set<String> sources = json.getAsJsonObject("source").keySet();
		Set<String> figures = new TreeSet<>();
		JsonObject point = json.getAsJsonArray("operatingPoints").get(0).getAsJsonObject();
		numbers("", point, figures);
		figures.removeAll(NO_FIGURES);
		assertTrue(figures.size() >= 25, figures.toString());
		for (String figure : figures) {
			assertTrue(sources.stream().anyMatch(key -> key.equals(figure) || key.startsWith(figure + ".")
					|| figure.equals("windings.highestCurrent") && key.equals("windings.lowestCurrent")), figure + " has no source");
		}
	}

	private static void numbers(String path, JsonElement element, Set<String> found) {
		if (element.isJsonObject()) {
			for (Map.Entry<String, JsonElement> entry : element.getAsJsonObject().entrySet()) {
				numbers(path.isEmpty() ? entry.getKey() : path + "." + entry.getKey(), entry.getValue(), found);
			}
		} else if (element.isJsonArray()) {
			element.getAsJsonArray().forEach(each -> numbers(path, each, found));
		} else if (element.isJsonPrimitive() && element.getAsJsonPrimitive().isNumber()) {
			found.add(path);
		}
	}

	@Test
	void everySourceSaysFormulaSourceAndValidity() {
		Set<String> keys = new TreeSet<>();
		for (FigureGroup group : FigureGroup.values()) {
			Origin origin = Provenance.of(group);
			assertFalse(origin.formula().isBlank() || origin.source().isBlank() || origin.validity().isBlank(), group.name());
			JsonObject printed = json().getAsJsonObject("source").getAsJsonObject(group.key());
			assertEquals(origin.formula(), printed.get("formula").getAsString());
			assertEquals(origin.source(), printed.get("source").getAsString());
			assertEquals(origin.validity(), printed.get("validity").getAsString());
			assertTrue(keys.add(group.key()), "twice " + group.key());
		}
	}
}
