package gapwright.generator;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Comparator;
import java.util.stream.Stream;

/** Replaces the generated code of the repository given as first argument by what the generator makes now. */
public final class Generate {

	private Generate() {
	}

	public static void main(String[] arguments) throws IOException {
		Path bundles = Path.of(arguments[0]).toAbsolutePath().normalize().resolve("bundles");
		Path scratch = Files.createTempDirectory("gapwright-generate");
		ModelGenerator.generate(bundles.resolve("gapwright.model/model"), scratch);
		for (String generated : ModelGenerator.GENERATED) {
			delete(bundles.resolve(generated));
			copy(scratch.resolve(generated), bundles.resolve(generated));
			System.out.println("wrote " + bundles.resolve(generated));
		}
		delete(scratch);
	}

	private static void copy(Path from, Path to) throws IOException {
		try (Stream<Path> files = Files.walk(from)) {
			files.filter(Files::isRegularFile).forEach(file -> {
				try {
					Path target = to.resolve(from.relativize(file).toString());
					Files.createDirectories(target.getParent());
					Files.copy(file, target, StandardCopyOption.REPLACE_EXISTING);
				} catch (IOException e) {
					throw new UncheckedIOException(e);
				}
			});
		}
	}

	private static void delete(Path root) throws IOException {
		if (!Files.exists(root)) {
			return;
		}
		try (Stream<Path> files = Files.walk(root)) {
			for (Path file : files.sorted(Comparator.reverseOrder()).toList()) {
				Files.delete(file);
			}
		}
	}
}
