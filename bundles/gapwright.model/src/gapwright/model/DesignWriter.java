package gapwright.model;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.file.Path;
import java.util.Map;

import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.util.EcoreUtil;

/** Writes designs. */
public final class DesignWriter {

	private DesignWriter() {
	}

	/** @return the file's content; a design that is in no resource is left so */
	public static byte[] bytes(Design design) {
		if (design.eResource() instanceof DesignResource resource) {
			return bytes(resource);
		}
		DesignResource resource = new DesignResource(URI.createURI("design.gapwright"));
		resource.getContents().add(EcoreUtil.copy(design));
		return bytes(resource);
	}

	static byte[] bytes(DesignResource resource) {
		ByteArrayOutputStream output = new ByteArrayOutputStream();
		try {
			resource.doSave(output, Map.of());
		} catch (IOException e) {
			throw new IllegalStateException(e);
		}
		return output.toByteArray();
	}

	/**
	 * Replaces the file at once: it holds the old design or the new one, whole, whatever happens.
	 *
	 * @throws IOException when it could not be written; the old file is then as it was
	 */
	public static void write(Design design, Path file) throws IOException {
		AtomicFile.write(file, bytes(design));
	}
}
