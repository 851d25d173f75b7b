package gapwright.model;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;

import org.eclipse.emf.common.util.URI;

/** Reads designs, whole or not at all, with or without an Eclipse platform around. */
public final class DesignReader {

	private DesignReader() {
	}

	/**
	 * @param file a design file
	 * @throws UnreadableDesignException when it is no design, with every reason
	 * @throws IOException               when the file cannot be read
	 */
	public static Design read(Path file) throws IOException {
		DesignResource resource = new DesignResource(URI.createFileURI(file.toAbsolutePath().toString()));
		try (InputStream input = Files.newInputStream(file)) {
			resource.load(input, Map.of());
		}
		return resource.design();
	}

	/**
	 * @param input a design; not closed
	 * @param name  its name in messages
	 * @throws UnreadableDesignException when it is no design, with every reason
	 * @throws IOException               when the stream cannot be read
	 */
	public static Design read(InputStream input, String name) throws IOException {
		DesignResource resource = new DesignResource(URI.createURI(URI.encodeSegment(name, false)));
		resource.load(input, Map.of());
		return resource.design();
	}
}
