package gapwright.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** Every figure from outside within its own tolerance, and the guide's table of them current. */
class OutsideFiguresTest {

	private static final Path GUIDE = Path.of("../../bundles/gapwright.help/html/reference-cases.html");
	private static final Path TARGET = Path.of("target");

	private static List<Row> all() throws IOException {
		List<Row> rows = new ArrayList<>(TextbookRows.all());
		rows.addAll(ClosedFormRows.all());
		rows.addAll(NetworkRows.all());
		return rows;
	}

	@TestFactory
	List<DynamicTest> everyFigureAgreesWithinItsOwnTolerance() throws IOException {
		List<DynamicTest> tests = new ArrayList<>();
		for (Row row : all()) {
			tests.add(DynamicTest.dynamicTest(row.kase() + ": " + row.figure(), () -> assertTrue(row.holds(),
					() -> row.source() + ": " + row.theirs() + ", ours " + row.ours() + ", difference " + row.difference())));
		}
		return tests;
	}

	@Test
	void textbooksAndStandardsGiveAtLeast25FiguresFromEightSources() throws IOException {
		List<Row> rows = TextbookRows.all();
		Set<String> sources = new HashSet<>();
		rows.forEach(row -> sources.add(row.source().replaceAll(",.*", "")));
		assertTrue(rows.size() >= 25, rows.size() + " figures");
		assertTrue(sources.size() >= 8, sources.toString());
	}

	@Test
	void theTableInTheGuideIsCurrent() throws IOException {
		ReferenceTable table = new ReferenceTable(all());
		Files.createDirectories(TARGET);
		Files.writeString(TARGET.resolve("reference-table.csv"), table.csv());
		Path page = TARGET.resolve("reference-cases.html");
		Files.writeString(page, table.page());
		assertTrue(Files.exists(GUIDE) && Files.readString(GUIDE).equals(table.page()), "bundles/gapwright.help/html/reference-cases.html"
				+ " is not current: copy tests/gapwright.reference.tests/target/reference-cases.html over it");
		assertEquals(-1, table.page().indexOf("NaN"));
	}
}
