package gapwright.generator;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.TreeMap;
import java.util.stream.Stream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class GeneratedCodeTest {

	private final Path bundles = Path.of("").toAbsolutePath().getParent().getParent().resolve("bundles");

	@TempDir
	Path scratch;

	@Test
	void committedCodeIsWhatTheGeneratorMakesOfTheModel() throws IOException {
		ModelGenerator.generate(bundles.resolve("gapwright.model/model"), scratch);
		for (String generated : ModelGenerator.GENERATED) {
			TreeMap<String, String> fresh = texts(scratch.resolve(generated));
			TreeMap<String, String> committed = texts(bundles.resolve(generated));
			assertTrue(fresh.size() > 0, generated + ": the generator wrote nothing");
			assertEquals(fresh.keySet(), committed.keySet(), generated + ": other files; run releng/generate");
			assertAll(fresh.keySet().stream().map(file -> () -> assertEquals(fresh.get(file), committed.get(file),
					generated + "/" + file + " differs; run releng/generate")));
		}
	}

	private static TreeMap<String, String> texts(Path root) throws IOException {
		TreeMap<String, String> texts = new TreeMap<>();
		if (!Files.exists(root)) {
			return texts;
		}
		try (Stream<Path> files = Files.walk(root)) {
			for (Path file : files.filter(Files::isRegularFile).toList()) {
				texts.put(root.relativize(file).toString(), Files.readString(file).replace("\r\n", "\n"));
			}
		}
		return texts;
	}
}
