package gapwright.install.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** The scripts a newcomer types, from a checkout where nothing is built for them. */
class ScriptsTest {

	private static final Path CACHE = Path.of("target/cache").toAbsolutePath();
	private static final Path EXAMPLES = Built.EXAMPLE.getParent();
	private static Script first;

	@BeforeAll
	static void firstUse() throws Exception {
		Files.createDirectories(CACHE);
		Files.deleteIfExists(CACHE.resolve("cli/ready"));
		first = Script.run(CACHE, EXAMPLES, Built.script("gapwright"), "check", "boost-choke.gapwright", "--json");
	}

	@Test
	void theFirstUseBuildsAndItsOutputIsNothingButTheResult() {
		assertTrue(first.err().contains("building the command line"), first.err());
		assertTrue(first.out().startsWith("{\"tool\":\"gapwright\""), first.out());
		assertTrue(first.out().strip().endsWith("}"), first.out());
		assertEquals(1, first.status(), first.err());
	}

	@Test
	void theNextUseBuildsNothing() throws Exception {
		Script next = Script.run(CACHE, EXAMPLES, Built.script("gapwright"), "check", "boost-choke.gapwright", "--json");
		assertEquals(first.out(), next.out());
		assertEquals("", next.err());
	}

	@Test
	void theExitStatusOfEachExampleIsItsWorstState() throws Exception {
		Map<String, Integer> contract = Map.of("within", 0, "near", 1, "over", 2);
		for (Path example : examples()) {
			Script check = Script.run(CACHE, example.getParent(), Built.script("gapwright"), "check", example.getFileName().toString(), "--json");
			Matcher worst = Pattern.compile("\"worst\":\"(\\w+)\"").matcher(check.out());
			assertTrue(worst.find(), check.out());
			assertEquals(contract.get(worst.group(1)), check.status(), example.toString());
		}
	}

	@Test
	void withoutADisplayTheExamplesAreChecked() throws Exception {
		Script run = Script.run(CACHE, EXAMPLES, Built.script("run"));
		assertTrue(run.err().contains("no display"), run.err());
		assertEquals(0, run.status());
		for (Path example : examples()) {
			assertTrue(run.out().contains(example.getFileName().toString()), "no table of " + example);
		}
	}

	private static List<Path> examples() throws IOException {
		try (Stream<Path> files = Files.list(EXAMPLES)) {
			List<Path> examples = files.filter(f -> f.toString().endsWith(".gapwright")).sorted().toList();
			assertFalse(examples.isEmpty());
			return examples;
		}
	}
}
