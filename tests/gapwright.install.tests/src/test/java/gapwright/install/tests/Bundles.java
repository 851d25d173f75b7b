package gapwright.install.tests;

import java.io.IOException;
import java.nio.file.Path;
import java.util.jar.JarFile;

/** What a bundle's manifest says. */
final class Bundles {

	private Bundles() {
	}

	static String version(Path jar) throws IOException {
		try (JarFile file = new JarFile(jar.toFile())) {
			return file.getManifest().getMainAttributes().getValue("Bundle-Version");
		}
	}
}
