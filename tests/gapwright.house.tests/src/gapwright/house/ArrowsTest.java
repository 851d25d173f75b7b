package gapwright.house;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Predicate;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** What may use what. An arrow added here is a decision, told in the commit. */
class ArrowsTest {

	private static final Path BUNDLES = Path.of("../../bundles");

	/** Our bundles each of ours may use, directly. */
	private static final Map<String, Set<String>> ALLOWED = Map.ofEntries(Map.entry("gapwright.physics", Set.of()),
			Map.entry("gapwright.model", Set.of()), Map.entry("gapwright.model.edit", Set.of("gapwright.model")),
			Map.entry("gapwright.library", Set.of("gapwright.physics", "gapwright.model")),
			Map.entry("gapwright.study", Set.of("gapwright.physics", "gapwright.model")),
			Map.entry("gapwright.report", Set.of("gapwright.study", "gapwright.model")),
			Map.entry("gapwright.cli", Set.of("gapwright.report", "gapwright.study", "gapwright.library", "gapwright.physics", "gapwright.model")),
			Map.entry("gapwright.workspace", Set.of("gapwright.study", "gapwright.model")),
			Map.entry("gapwright.ui",
					Set.of("gapwright.physics", "gapwright.model", "gapwright.model.edit", "gapwright.library",
							"gapwright.study", "gapwright.report", "gapwright.workspace")),
			Map.entry("gapwright.help", Set.of()), Map.entry("gapwright.help.viewer", Set.of("gapwright.help")));

	private static final Pattern REQUIRED = Pattern.compile("[:,\\s](gapwright\\.[a-z.]+)[;,\\s]");
	private static final Pattern IMPORT = Pattern.compile("^import (?:static )?([\\w.]+)");

	@TestFactory
	List<DynamicTest> bundlesRequireOnlyWhatTheyMay() throws IOException {
		List<DynamicTest> tests = new ArrayList<>();
		for (Path bundle : bundles()) {
			String name = bundle.getFileName().toString();
			tests.add(DynamicTest.dynamicTest(name, () -> {
				Set<String> allowed = ALLOWED.get(name);
				assertTrue(allowed != null, name + " is new: say here what it may use");
				String manifest = Files.readString(bundle.resolve("META-INF/MANIFEST.MF"));
				int at = manifest.indexOf("Require-Bundle:");
				String required = at < 0 ? "" : manifest.substring(at).replaceFirst("(?s)\\n[A-Z].*", "\n");
				Set<String> more = new TreeSet<>();
				for (Matcher matcher = REQUIRED.matcher(required); matcher.find();) {
					more.add(matcher.group(1));
				}
				more.removeAll(allowed);
				assertEquals(Set.of(), more, name + " requires more than it may");
			}));
		}
		assertTrue(tests.size() >= 8, "only " + tests.size() + " bundles found");
		return tests;
	}

	@Test
	void physicsKnowsNoEclipse() throws IOException {
		assertNone("gapwright.physics", "", name -> name.startsWith("org.eclipse") || name.startsWith("org.osgi"));
	}

	@Test
	void whatRunsWithoutAWorkbenchKnowsNoWindow() throws IOException {
		Predicate<String> window = name -> name.startsWith("org.eclipse.swt") || name.startsWith("org.eclipse.jface")
				|| name.startsWith("org.eclipse.ui") || name.startsWith("java.awt") || name.startsWith("javax.swing");
		for (String bundle : List.of("gapwright.model", "gapwright.model.edit", "gapwright.library", "gapwright.study",
				"gapwright.report", "gapwright.cli")) {
			assertNone(bundle, "", window);
		}
	}

	@Test
	void nothingButTheWorkbenchNamesTheWorkbench() throws IOException {
		for (Path bundle : bundles()) {
			if (!bundle.endsWith("gapwright.ui")) {
				assertNone(bundle.getFileName().toString(), "", name -> name.startsWith("gapwright.ui."));
			}
		}
	}

	@Test
	void whatIsPaintedKnowsNoDesign() throws IOException {
		Predicate<String> design = name -> name.startsWith("gapwright.model") || name.startsWith("org.eclipse.emf");
		assertNone("gapwright.ui", "canvas/paint/", design);
		assertNone("gapwright.ui", "Look.java", design);
		assertNone("gapwright.ui", "LookFigure.java", design);
	}

	@Test
	void noInternalPackageOfThePlatformIsUsed() throws IOException {
		for (Path bundle : bundles()) {
			assertNone(bundle.getFileName().toString(), "",
					name -> name.startsWith("org.eclipse.") && name.contains(".internal."));
		}
	}

	/** @param part of the path of the sources that are meant; "" for all */
	private static void assertNone(String bundle, String part, Predicate<String> forbidden) throws IOException {
		List<String> found = new ArrayList<>();
		int files = 0;
		for (Path file : sources(BUNDLES.resolve(bundle), part)) {
			files++;
			int line = 0;
			for (String text : Files.readAllLines(file)) {
				line++;
				Matcher matcher = IMPORT.matcher(text);
				if (matcher.find() && forbidden.test(matcher.group(1))) {
					found.add(file + ":" + line + " " + matcher.group(1));
				}
			}
		}
		assertTrue(files > 0, "no sources of " + bundle + " " + part);
		assertEquals(List.of(), found);
	}

	private static List<Path> sources(Path bundle, String part) throws IOException {
		List<Path> sources = new ArrayList<>();
		for (String folder : List.of("src", "src-gen")) {
			if (Files.isDirectory(bundle.resolve(folder))) {
				try (Stream<Path> files = Files.walk(bundle.resolve(folder))) {
					files.filter(f -> f.toString().endsWith(".java") && f.toString().replace('\\', '/').contains(part))
							.forEach(sources::add);
				}
			}
		}
		return sources;
	}

	/** Our bundles but for the fragments that fill in what bundles of the platform lack. */
	private static List<Path> bundles() throws IOException {
		try (Stream<Path> folders = Files.list(BUNDLES)) {
			return folders.filter(f -> Files.exists(f.resolve("META-INF/MANIFEST.MF")))
					.filter(f -> !isFragment(f)).sorted().toList();
		}
	}

	private static boolean isFragment(Path bundle) {
		try {
			return Files.readString(bundle.resolve("META-INF/MANIFEST.MF")).contains("Fragment-Host:");
		} catch (IOException e) {
			throw new UncheckedIOException(e);
		}
	}
}
