package gapwright.install.tests;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;

/** What the build has made before these tests run. */
final class Built {

	private static final Path ROOT = Path.of("../..").toAbsolutePath().normalize();

	/** The update site. */
	static final Path SITE = ROOT.resolve("releng/gapwright.site/target/repository");
	/** A workbench without anything of ours. */
	static final Path STOCK = ROOT.resolve("releng/gapwright.product/target/products/stock/linux/gtk/x86_64");
	/** The example design that is opened. */
	static final Path EXAMPLE = ROOT.resolve("bundles/gapwright.library/data/examples/boost-choke.gapwright");

	private Built() {
	}

	static Path script(String name) {
		return ROOT.resolve("releng").resolve(name);
	}

	/** @return the jar of the bundle that reads the canvas */
	static Path reader() throws IOException {
		return one(ROOT.resolve("tests/gapwright.install.reader/target"), "gapwright.install.reader-", ".jar");
	}

	/** @return the only file in a folder that begins and ends so */
	static Path one(Path folder, String begin, String end) throws IOException {
		try (Stream<Path> files = Files.list(folder)) {
			return files.filter(f -> f.getFileName().toString().startsWith(begin) && f.getFileName().toString().endsWith(end))
					.filter(f -> !f.getFileName().toString().contains("sources"))
					.reduce((a, b) -> {
						throw new IllegalStateException("both " + a + " and " + b + " are there");
					}).orElseThrow(() -> new IllegalStateException("no " + begin + "…" + end + " in " + folder + ": build it first"));
		}
	}
}
