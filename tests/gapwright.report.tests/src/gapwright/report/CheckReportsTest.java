package gapwright.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Set;

import org.junit.jupiter.api.Test;

import com.google.gson.JsonObject;
import com.google.gson.JsonParser;

import gapwright.model.check.Severity;
import gapwright.study.AirPathResult;
import gapwright.study.ConnectionResult;
import gapwright.study.Finding;
import gapwright.study.GapResult;
import gapwright.study.InductanceMatrix;
import gapwright.study.LeakageResult;
import gapwright.study.LegResult;
import gapwright.study.LegState;
import gapwright.study.OperatingPointResult;
import gapwright.study.StudyResult;
import gapwright.study.WindingResult;

/** The reports of a check say all of a result, and of what is not there that it is not. */
class CheckReportsTest {

	private static final double NONE = Double.NaN;
	/** Needs all 17 digits to come back as the same number. */
	private static final double LONG = 0.1 + 0.2;

	private static StudyResult result() {
		LegResult near = new LegResult("left", 55.33e-6, LONG, 231.25, 8.75, 0.39, 0.3371, 0.8644, LegState.NEAR);
		LegResult unknown = new LegResult("right", -1e-6, -0.1, -50, -2, NONE, 0.12, NONE, LegState.UNKNOWN);
		OperatingPointResult point = new OperatingPointResult("full-load", true, 5, 1e-16, 6.83e-3, NONE,
				List.of(near, unknown), List.of(new GapResult("g", "left", 240.9e-9, 1.1719, 229.6)),
				List.of(new AirPathResult("stray", 2e-6)),
				List.of(new WindingResult("a", 14, 1e-3, NONE), new WindingResult("b", 0, -2e-4, NONE)),
				new InductanceMatrix(List.of("a", "b"), new double[][] { { 4e-4, -1e-4 }, { -1e-4, 1e-4 } }));
		Finding finding = new Finding(Severity.WARNING, "leg-near-saturation", "left", "full-load", "86.4 %", "");
		Finding design = new Finding(Severity.NOTE, "network-islands", "", null, "two networks", "Join them.");
		return new StudyResult("Choke \"X\"", List.of(point), List.of(finding, design), LegState.NEAR);
	}

	private static StudyResult unsolved() {
		OperatingPointResult point = new OperatingPointResult("p", false, 0, NONE, NONE, NONE, List.of(), List.of(),
				List.of(), List.of(), new InductanceMatrix(List.of(), new double[0][]));
		return new StudyResult("", List.of(point),
				List.of(new Finding(Severity.ERROR, "material-missing", "leg", null, "the leg has no material", "")),
				LegState.WITHIN);
	}

	private static JsonObject json(StudyResult result) {
		String text = CheckJson.of(result, "a b.gapwright", "0.1.0");
		assertFalse(text.contains("\n"), "one object is one line");
		return JsonParser.parseString(text).getAsJsonObject();
	}

	@Test
	void jsonHasTheKeysOfTheContract() {
		JsonObject json = json(result());
		assertTrue(json.keySet().containsAll(Set.of("tool", "version", "file", "design", "worst", "operatingPoints", "findings")));
		assertEquals("gapwright", json.get("tool").getAsString());
		assertEquals("a b.gapwright", json.get("file").getAsString());
		assertEquals("Choke \"X\"", json.get("design").getAsString());
		assertEquals("near", json.get("worst").getAsString());
		JsonObject point = json.getAsJsonArray("operatingPoints").get(0).getAsJsonObject();
		assertTrue(point.keySet().containsAll(Set.of("id", "converged", "iterations", "fluxResidual", "energy", "coEnergy", "legs", "gaps",
				"airPaths", "windings", "inductance")));
		assertTrue(first(point, "legs").keySet().containsAll(Set.of("id", "flux", "fluxDensity", "fieldStrength",
				"mmfDrop", "saturation", "utilisation", "state")));
		assertTrue(first(point, "gaps").keySet().containsAll(Set.of("id", "leg", "permeance", "fringingFactor", "mmfDrop")));
		assertTrue(first(point, "airPaths").keySet().containsAll(Set.of("id", "flux")));
		assertTrue(first(point, "windings").keySet().containsAll(Set.of("id", "current", "linkage", "apparentInductance")));
		assertEquals("[[4.0E-4,-1.0E-4],[-1.0E-4,1.0E-4]]",
				point.getAsJsonObject("inductance").get("differential").toString());
		assertEquals("[\"a\",\"b\"]", point.getAsJsonObject("inductance").get("windings").toString());
		JsonObject finding = json.getAsJsonArray("findings").get(0).getAsJsonObject();
		assertTrue(finding.keySet()
				.containsAll(Set.of("severity", "code", "subject", "operatingPoint", "message")));
		assertEquals("warning", finding.get("severity").getAsString());
	}

	@Test
	void jsonNumbersComeBackToTheLastBitAndNoNumberIsNull() {
		JsonObject point = json(result()).getAsJsonArray("operatingPoints").get(0).getAsJsonObject();
		assertEquals(LONG, first(point, "legs").get("fluxDensity").getAsDouble());
		assertTrue(point.get("coEnergy").isJsonNull());
		assertTrue(first(point, "windings").get("apparentInductance").isJsonNull());
		JsonObject unknown = point.getAsJsonArray("legs").get(1).getAsJsonObject();
		assertTrue(unknown.get("saturation").isJsonNull() && unknown.get("utilisation").isJsonNull());
		assertEquals("unknown", unknown.get("state").getAsString());
	}

	@Test
	void nobodyReadsWithinOutOfAResultThatIsNotWhole() {
		assertTrue(json(unsolved()).get("worst").isJsonNull());
		assertTrue(CheckTable.of(unsolved(), "f").contains("worst: not computed"));
		assertTrue(CheckTable.of(unsolved(), "f").contains("no solution, see the findings"));
		assertTrue(CheckTable.of(unsolved(), "f").contains("error material-missing leg: the leg has no material"));
	}

	@Test
	void tableShowsStateSaturationInductanceAndFindings() {
		String table = CheckTable.of(result(), "choke.gapwright");
		assertTrue(table.startsWith("choke.gapwright  Choke \"X\"\n"));
		String left = line(table, "    left ");
		assertTrue(left.contains("55.33 µWb") && left.contains("0.3371 T") && left.contains("0.3900 T")
				&& left.contains("86.4 %") && left.endsWith("NEAR"), left);
		assertTrue(line(table, "    right ").matches(".*0\\.1200 T +– +– +UNKNOWN"), line(table, "    right "));
		assertTrue(line(table, "    a ").contains("400.0 µH"));
		assertTrue(line(table, "    a, b ").contains("-100.0 µH") && line(table, "    a, b ").contains("-0.5000"));
		assertTrue(table.contains("    warning leg-near-saturation left at full-load: 86.4 %\n"));
		assertTrue(table.contains("    note network-islands: two networks. Join them.\n"));
		assertTrue(table.endsWith("  worst: near\n"));
	}

	@Test
	void windingsJoinedAndTheirLeakageStandInTableAndJson() {
		OperatingPointResult plain = result().operatingPoints().get(0);
		OperatingPointResult point = new OperatingPointResult(plain.id(), true, 5, 0, NONE, NONE, plain.legs(), plain.gaps(), plain.airPaths(),
				plain.windings(), new InductanceMatrix(List.of("a", "b"), new double[][] { { 4e-4, 0 }, { 0, 0 } }),
				List.of(new LeakageResult("between", "a", "b", 3.12e-6, 0.931, 3.5e-6, 0.99)),
				List.of(new ConnectionResult("both", true, List.of("a", "b"), List.of(false, true), 2e-4)));
		StudyResult joined = new StudyResult("", List.of(point), List.of(), LegState.WITHIN);
		String table = CheckTable.of(joined, "f");
		assertTrue(table.contains("    both: a, b reversed  in series  200.0 µH"), table);
		assertTrue(line(table, "    between of a to b ").contains("3.120 µH"), table);
		assertTrue(line(table, "    a, b ").endsWith("–") && !table.contains("NaN"), table);
		JsonObject json = json(joined).getAsJsonArray("operatingPoints").get(0).getAsJsonObject();
		assertEquals("[false,true]", first(json, "connections").get("reversed").toString());
		assertEquals(3.5e-6, first(json, "leakages").get("shortCircuitInductance").getAsDouble());
		assertEquals("[[1,null],[null,1]]", json.getAsJsonObject("inductance").get("coupling").toString().replace("1.0", "1"));
	}

	@Test
	void tableColumnsStandUnderTheirHeads() {
		String[] lines = CheckTable.of(result(), "f").split("\n");
		for (int i = 0; i < lines.length; i++) {
			if (lines[i].startsWith("    leg ")) {
				int end = lines[i].indexOf("peak") + "peak".length();
				assertEquals("0.3371 T", lines[i + 1].substring(end - 8, end));
			}
		}
	}

	/** RFC 4180: a field with a comma or a quote is quoted, quotes are doubled, lines end in CR LF. */
	@Test
	void csvQuotesWhatNeedsQuotesAndLeavesNoNumberEmpty() {
		String[] lines = CheckCsv.of(result(), "a, \"b\".gapwright").split("\r\n");
		assertEquals(2, lines.length);
		assertTrue(lines[0].startsWith("\"a, \"\"b\"\".gapwright\",full-load,left,5.533E-5," + LONG + ","), lines[0]);
		assertTrue(lines[0].endsWith(",0.3371,0.8644,near"), lines[0]);
		assertTrue(lines[1].endsWith(",-2.0,,0.12,,unknown"), lines[1]);
		assertEquals(CheckCsv.head().split(",").length, lines[1].split(",", -1).length - 1);
	}

	private static String line(String table, String start) {
		return table.lines().filter(line -> line.startsWith(start)).findFirst().orElseThrow();
	}

	private static JsonObject first(JsonObject point, String array) {
		return point.getAsJsonArray(array).get(0).getAsJsonObject();
	}
}
