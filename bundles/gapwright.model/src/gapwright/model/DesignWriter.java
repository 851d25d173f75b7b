package gapwright.model;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.Map;

import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.util.EcoreUtil;

/** Writes designs. */
public final class DesignWriter {

	private DesignWriter() {
	}

	/**
	 * @return the file's content; a design that is in no resource is left so
	 * @throws UncheckedIOException naming element and feature when a file cannot hold the design
	 */
	public static byte[] bytes(Design design) {
		try {
			return content(design);
		} catch (IOException e) {
			throw new UncheckedIOException(e.getMessage(), e);
		}
	}

	private static byte[] content(Design design) throws IOException {
		if (design.eResource() instanceof DesignResource resource) {
			return content(resource);
		}
		Storable.check(design);
		DesignResource resource = new DesignResource(URI.createURI("design.gapwright"));
		resource.getContents().add(EcoreUtil.copy(design));
		return content(resource);
	}

	static byte[] content(DesignResource resource) throws IOException {
		ByteArrayOutputStream output = new ByteArrayOutputStream();
		resource.doSave(output, Map.of());
		return output.toByteArray();
	}

	/**
	 * Replaces the file at once: it holds the old design or the new one, whole, whatever happens.
	 *
	 * @throws IOException when it could not be written; the old file is then as it was
	 */
	public static void write(Design design, Path file) throws IOException {
		AtomicFile.write(file, content(design));
	}
}
