package gapwright.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.library.StockMaterials;
import gapwright.model.Design;
import gapwright.model.DesignReader;
import gapwright.model.TableCurve;

/** The verb that lists the library and turns material files into a design file. */
class LibraryVerbTest {

	private static final String SHEET = """
			gapwright-material,1
			name,Sheet ferrite
			point,0.5 Oe,1100 G
			point,2.5 Oe,3200 G
			point,15 Oe,3950 G
			saturation,25 °C,0.395 T
			""";

	private Path folder;
	private String out;
	private String err;

	@BeforeEach
	void makeFolder() throws IOException {
		folder = Files.createTempDirectory("gapwright-library");
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

	private String file(String name, String content) throws IOException {
		return Files.writeString(folder.resolve(name), content).toString();
	}

	@Test
	void withoutAFileEveryStockMaterialHasItsLine() {
		assertEquals(ExitStatus.WITHIN, run("library"));
		assertEquals(StockMaterials.all().size(), out.lines().count());
		assertTrue(out.lines().anyMatch(line -> line.startsWith("mnzn-power-ferrite") && line.contains("2300")
				&& line.contains("0.39 T at 100 °C")), out);
	}

	@Test
	void aMaterialFileBecomesADesignFileThatCanBeRead() throws IOException {
		assertEquals(ExitStatus.WITHIN, run("library", file("a.gapmaterial.csv", SHEET), file("b.gapmaterial.csv", SHEET)));
		Design design = DesignReader.read(new ByteArrayInputStream(out.getBytes(StandardCharsets.UTF_8)), "out");
		assertEquals(2, design.getMaterials().size());
		TableCurve table = (TableCurve) design.getMaterials().get(1).getCurve();
		assertEquals("15 Oe", table.getPoints().get(2).getFieldStrength().text());
		assertEquals("", err);
	}

	@Test
	void unitsForBareNumbersComeFromTheOptions() throws IOException {
		String bare = file("a.gapmaterial.csv", SHEET.replace(" Oe", "").replace(" G", ""));
		assertEquals(ExitStatus.DATA, run("library", bare));
		assertEquals("", out);
		assertTrue(err.startsWith(bare + ":3:7: '0.5': a field strength needs a unit"), err);
		assertEquals(ExitStatus.WITHIN, run("library", bare, "--field-unit", "Oe", "--flux-unit", "G"));
		assertTrue(out.contains("fieldStrength=\"15 Oe\""), out);
		assertEquals(ExitStatus.WITHIN, run("library", bare, "--field-unit", "A/m", "--flux-unit", "T"));
		assertTrue(err.contains("--field-unit Oe --flux-unit G"), err);
		assertEquals(ExitStatus.USAGE, run("library", bare, "--field-unit", "T"));
	}

	@Test
	void oneBadFileAmongSeveralKeepsAllBack() throws IOException {
		String good = file("a.gapmaterial.csv", SHEET);
		String bad = file("b.gapmaterial.csv", SHEET.replace("name", "nmae"));
		assertEquals(ExitStatus.DATA, run("library", good, bad, folder.resolve("none.csv").toString()));
		assertEquals("", out);
		assertTrue(err.contains(bad + ":2:1: 'nmae'") && err.contains("no such file"), err);
	}
}
