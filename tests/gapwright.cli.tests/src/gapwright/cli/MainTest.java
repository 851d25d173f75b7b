package gapwright.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;

import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import com.google.gson.JsonObject;
import com.google.gson.JsonParser;

import gapwright.library.Example;
import gapwright.library.Examples;
import gapwright.model.DesignReader;
import gapwright.study.OperatingPointResult;
import gapwright.study.Study;

/** The contract of the command line: verbs, exit status, where messages go, and what they say. */
class MainTest {

	private static final String WITHIN = "output-choke-toroid.gapwright";
	private static final String NEAR = "boost-choke.gapwright";
	private static final String OVER = "three-phase-reactor.gapwright";

	private Path folder;
	private String out;
	private String err;

	@BeforeEach
	void makeFolder() throws IOException {
		folder = Files.createTempDirectory("gapwright-cli");
	}

	@AfterEach
	void removeFolder() throws IOException {
		try (Stream<Path> files = Files.list(folder)) {
			for (Path file : files.toList()) {
				Files.delete(file);
			}
		}
		Files.delete(folder);
	}

	private int run(String... arguments) {
		ByteArrayOutputStream outBytes = new ByteArrayOutputStream();
		ByteArrayOutputStream errBytes = new ByteArrayOutputStream();
		int status = Main.run(List.of(arguments), new PrintStream(outBytes, true, StandardCharsets.UTF_8),
				new PrintStream(errBytes, true, StandardCharsets.UTF_8));
		out = outBytes.toString(StandardCharsets.UTF_8);
		err = errBytes.toString(StandardCharsets.UTF_8);
		return status;
	}

	private String example(String name) throws IOException {
		Example example = Examples.all().stream().filter(e -> e.fileName().equals(name)).findFirst().orElseThrow();
		Path file = folder.resolve(name);
		try (InputStream input = example.open()) {
			Files.write(file, input.readAllBytes());
		}
		return file.toString();
	}

	private String changed(String name, String from, String to) throws IOException {
		String file = example(name);
		String text = Files.readString(Path.of(file));
		assertTrue(text.contains(from), from);
		Files.writeString(Path.of(file), text.replace(from, to));
		return file;
	}

	@Test
	void exitStatusIsTheWorstStateOfTheLegs() throws IOException {
		assertEquals(0, run("check", example(WITHIN)));
		assertEquals(1, run("check", example(NEAR)));
		assertEquals(2, run("check", example(OVER)));
		assertEquals("", err);
	}

	@Test
	void withSeveralFilesTheHighestStatusCountsAndEveryFileIsChecked() throws IOException {
		assertEquals(2, run("check", example(OVER), example(WITHIN), example(NEAR)));
		assertTrue(out.indexOf(OVER) < out.indexOf(WITHIN) && out.indexOf(WITHIN) < out.indexOf(NEAR));
		assertEquals(65, run("check", folder.resolve("none.gapwright").toString(), example(OVER)));
		assertTrue(out.contains("stalled-pump"));
	}

	@Test
	void wrongUsageIsToldWithTheUsageAndNothingIsChecked() throws IOException {
		for (List<String> wrong : List.of(List.<String>of(), List.of("solve"), List.of("check"),
				List.of("check", "--fast", example(NEAR)), List.of("check", "--json", "--csv", example(NEAR)))) {
			assertEquals(64, run(wrong.toArray(String[]::new)), wrong.toString());
			assertTrue(err.startsWith("gapwright: ") && err.contains("usage: gapwright check FILE"), err);
			assertEquals("", out);
		}
	}

	@Test
	void helpAndVersionGoToStandardOutput() throws IOException {
		assertEquals(0, run("--help"));
		assertTrue(out.contains("exit status"));
		assertEquals(0, run("--version"));
		String manifest = Files.readString(Path.of("../../bundles/gapwright.cli/META-INF/MANIFEST.MF"));
		assertTrue(manifest.contains("Bundle-Version: " + out.strip().replace("gapwright ", "") + ".qualifier"), out);
	}

	@Test
	void aMissingFileIsNamed() {
		String file = folder.resolve("none.gapwright").toString();
		assertEquals(65, run("check", file));
		assertEquals(file + ":: no such file\n", err.replace("\r\n", "\n"));
		assertEquals("", out);
	}

	@Test
	void aCutOffFileIsRefusedInTheSameFormOfMessage() throws IOException {
		String file = changed(NEAR, "</gapwright:Design>", "");
		assertEquals(65, run("check", file));
		assertTrue(err.startsWith(file + ":: truncated or malformed XML: "), err);
		assertEquals("", out);
	}

	@Test
	void aNumberWithoutUnitIsRefusedByFileElementAttributeFoundAndExpected() throws IOException {
		String file = changed(NEAR, "length=\"1.1 mm\"", "length=\"1.1\"");
		assertEquals(65, run("check", file));
		assertTrue(err.startsWith(file + ":centre-leg-gap: length = '1.1': a length needs a unit"), err);
		assertTrue(err.contains("e.g. 0.5 mm"), err);
		assertEquals("", out);
	}

	@Test
	void everyReasonAFileCannotBeReadIsTold() throws IOException {
		String file = changed(NEAR, "from=\"bottom-middle\"", "from=\"nowhere\"");
		Files.writeString(Path.of(file), Files.readString(Path.of(file)).replace("turns=\"18\"", "turns=\"18.5\""));
		assertEquals(65, run("check", file));
		assertTrue(err.contains("from = 'nowhere'") && err.contains("turns = '18.5'"), err);
	}

	@Test
	void aTruncatedFileIsToldInOneLineWithoutAStackTrace() throws IOException {
		String file = example(NEAR);
		byte[] whole = Files.readAllBytes(Path.of(file));
		Files.write(Path.of(file), java.util.Arrays.copyOf(whole, whole.length / 2));
		assertEquals(65, run("check", file));
		assertTrue(err.startsWith(file + ":") && !err.contains("\tat "), err);
		assertEquals("", out);
	}

	@Test
	void aFolderIsNoDesign() {
		assertEquals(65, run("check", folder.toString()));
		assertTrue(err.startsWith(folder.toString()), err);
	}

	@Test
	void whatCannotBeComputedIsToldOnStandardErrorToo() throws IOException {
		String file = changed(NEAR, "fringing=\"WIDENED\"", "fringing=\"CONFORMAL\" windowHeight=\"0.5 mm\"");
		assertEquals(65, run("check", file));
		assertTrue(err.startsWith(file + ":centre-leg-gap: "), err);
		assertTrue(out.contains("gap-method-refused") && out.contains("worst: not computed"), out);
	}

	@Test
	void aLegThatCannotBeJudgedIsNotTakenForWithin() throws IOException {
		String file = changed(WITHIN, "    <saturations temperature=\"25 °C\" fluxDensity=\"1.0 T\"/>\n", "");
		assertEquals(1, run("check", file));
		assertTrue(out.contains("UNKNOWN") && out.contains("saturation-missing"), out);
	}

	@Test
	void jsonIsOneObjectALineAndCarriesTheStudysNumbersUnrounded() throws IOException {
		String near = example(NEAR);
		assertEquals(2, run("check", near, example(OVER), "--json"));
		String[] lines = out.strip().split("\\R");
		assertEquals(2, lines.length);
		JsonObject json = JsonParser.parseString(lines[0]).getAsJsonObject();
		assertEquals(near, json.get("file").getAsString());
		assertEquals("near", json.get("worst").getAsString());
		JsonObject point = json.getAsJsonArray("operatingPoints").get(0).getAsJsonObject();
		OperatingPointResult expected = Study.of(DesignReader.read(Path.of(near))).operatingPoints().get(0);
		assertEquals(expected.legs().get(0).flux(),
				point.getAsJsonArray("legs").get(0).getAsJsonObject().get("flux").getAsDouble());
		assertEquals(expected.inductance().differential()[0][0], point.getAsJsonObject("inductance")
				.getAsJsonArray("differential").get(0).getAsJsonArray().get(0).getAsDouble());
		assertEquals("over", JsonParser.parseString(lines[1]).getAsJsonObject().get("worst").getAsString());
	}

	@Test
	void csvHasOneHeadAndALinePerLegAndOperatingPoint() throws IOException {
		assertEquals(2, run("check", "--csv", example(NEAR), example(OVER)));
		List<String> lines = new ArrayList<>(List.of(out.split("\r\n")));
		assertTrue(lines.get(0).startsWith("file,operatingPoint,leg,flux_Wb"));
		assertEquals(1 + 7 * 2 + 7 * 5, lines.size());
		assertTrue(lines.stream().skip(1).noneMatch(line -> line.startsWith("file,")));
	}

	@Test
	void aNameThatLooksLikeAnOptionFollowsTwoDashes() {
		assertEquals(65, run("check", "--", "--none.gapwright"));
		assertTrue(err.startsWith("--none.gapwright:: no such file"), err);
	}

	@Test
	void aFaultOfOurOwnIsCalledSo() throws IOException {
		ByteArrayOutputStream errBytes = new ByteArrayOutputStream();
		PrintStream broken = new PrintStream(OutputStream.nullOutputStream()) {

			@Override
			public void println(String text) {
				throw new IllegalStateException("no paper");
			}
		};
		int status = Main.run(List.of("check", example(NEAR)), broken,
				new PrintStream(errBytes, true, StandardCharsets.UTF_8));
		assertEquals(70, status);
		String told = errBytes.toString(StandardCharsets.UTF_8);
		assertTrue(told.contains("a fault of this program") && told.contains("no paper"), told);
		assertFalse(told.contains("\tat "), told);
	}

	@Test
	void aSweepGivesInductanceAgainstCurrentInThreeForms() throws IOException {
		String file = example(NEAR);
		assertEquals(2, run("sweep", file, "--to", "60 A", "--steps", "6"));
		assertTrue(out.contains("L differential") && out.contains("over from"), out);
		assertEquals(2, run("sweep", file, "--to", "60 A", "--steps", "6", "--csv"));
		assertEquals(8, out.lines().count());
		assertTrue(out.startsWith("current_A,linkage_Wb,"), out);
		assertEquals(2, run("sweep", file, "--to", "60 A", "--steps", "6", "--json"));
		JsonObject json = JsonParser.parseString(out).getAsJsonObject();
		assertEquals(7, json.getAsJsonArray("current").size());
		assertEquals(60, json.getAsJsonArray("current").get(6).getAsDouble(), 0);
		assertEquals("", err);
	}

	@Test
	void aSweepThatMakesNoSenseIsRefusedInWords() throws IOException {
		String file = example(NEAR);
		assertEquals(65, run("sweep", file, "--winding", "none"));
		assertEquals(file + ":: there is no winding 'none'\n", err.replace("\r", ""));
		assertEquals(64, run("sweep", file, "--to", "60"));
		assertTrue(err.startsWith("gapwright: sweep: --to '60': a current needs a unit, e.g. 14 A"), err);
		assertEquals(64, run("sweep", "--csv", file, file));
		assertEquals(65, run("sweep", file, "--point", "none"));
		assertEquals(file + ":: there is no operating point 'none'\n", err.replace("\r", ""));
		assertEquals(64, run("sweep", file, "--steps", "0"));
		assertEquals(64, run("sweep", file, "--steps"));
		assertEquals(64, run("sweep", "--to", "1 A"));
	}

	@Test
	void tolerancesAreToldWhenAskedFor() throws IOException {
		String file = example(NEAR);
		assertEquals(1, run("check", file, "--tolerances", "--samples", "500", "--json"));
		JsonObject point = JsonParser.parseString(out).getAsJsonObject().getAsJsonObject("tolerances").getAsJsonArray("operatingPoints").get(0)
				.getAsJsonObject();
		JsonObject band = point.getAsJsonArray("inductance").get(0).getAsJsonObject();
		assertTrue(band.get("cornerLow").getAsDouble() < band.get("mean").getAsDouble());
		assertTrue(band.get("mean").getAsDouble() < band.get("cornerHigh").getAsDouble());
		assertEquals(1, run("check", file, "--tolerances", "--samples", "500", "--seed", "7"));
		assertTrue(out.contains("tolerances at full-load, 500 samples, seed 7") && out.contains("use centre-leg"), out);
		assertEquals(65, run("check", example(WITHIN), "--tolerances"));
		assertTrue(err.endsWith(":: the design has no tolerance\n"), err);
		assertEquals(64, run("check", file, "--samples", "5"));
	}
}
