package gapwright.house;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Stream;

import org.junit.jupiter.api.Test;

/** Nothing is put off or switched off, and every bundle says the same about itself. */
class SourcesTest {

	private static final Path ROOT = Path.of("../..");
	/** Spelt in pieces, so that this file does not find itself. */
	private static final Pattern PUT_OFF = Pattern.compile("\\b(TO" + "DO|FIX" + "ME|X" + "XX)\\b|@Dis" + "abled");
	private static final Pattern PRINTED = Pattern.compile("\\.printStack" + "Trace\\(|System\\.(out|err)\\b");

	@Test
	void nothingIsPutOffOrSwitchedOff() throws IOException {
		assertNone(PUT_OFF, List.of("bundles", "tests"), "/");
	}

	@Test
	void bundlesPrintNothingToTheConsole() throws IOException {
		assertNone(PRINTED, List.of("bundles"), "/src/");
	}

	@Test
	void everyBundleStatesItsVendorItsJavaAndItsModule() throws IOException {
		int count = 0;
		for (String folder : List.of("bundles", "tests")) {
			try (Stream<Path> bundles = Files.list(ROOT.resolve(folder))) {
				for (Path bundle : bundles.filter(b -> Files.exists(b.resolve("META-INF/MANIFEST.MF"))).toList()) {
					count++;
					String name = bundle.getFileName().toString();
					String manifest = Files.readString(bundle.resolve("META-INF/MANIFEST.MF"));
					if (manifest.contains("Fragment-Host:")) {
						continue; // has the module of its host
					}
					for (String line : List.of("Bundle-Vendor: Gapwright", "Bundle-Version: 0.1.0.qualifier",
							"Bundle-RequiredExecutionEnvironment: JavaSE-17", "Automatic-Module-Name: " + name)) {
						assertTrue(manifest.contains(line), name + " lacks " + line);
					}
					assertTrue(manifest.contains("Bundle-SymbolicName: " + name), name);
				}
			}
		}
		assertTrue(count > 12, "only " + count + " bundles found");
	}

	private static void assertNone(Pattern pattern, List<String> folders, String part) throws IOException {
		List<String> found = new ArrayList<>();
		int files = 0;
		for (String folder : folders) {
			try (Stream<Path> all = Files.walk(ROOT.resolve(folder))) {
				for (Path file : all.filter(f -> f.toString().endsWith(".java"))
						.filter(f -> f.toString().replace('\\', '/').contains(part)).toList()) {
					files++;
					int line = 0;
					for (String text : Files.readAllLines(file)) {
						line++;
						if (pattern.matcher(text).find()) {
							found.add(file + ":" + line + " " + text.strip());
						}
					}
				}
			}
		}
		assertTrue(files > 50, "only " + files + " files read");
		assertEquals(List.of(), found);
	}
}
