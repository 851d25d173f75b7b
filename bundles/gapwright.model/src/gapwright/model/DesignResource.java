package gapwright.model;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.resource.Resource;
import org.eclipse.emf.ecore.xmi.XMLResource;
import org.eclipse.emf.ecore.xmi.impl.XMIResourceImpl;

/**
 * A design in its file: one element a line, UTF-8, nothing written that is a default. Reading checks the whole file
 * first and throws {@link UnreadableDesignException} with every problem; saving to a local file replaces it at once or
 * leaves it as it was.
 */
public final class DesignResource extends XMIResourceImpl {

	/** A larger file is no design; refusing it is kinder than running out of memory. */
	private static final int MOST_BYTES = 64 << 20;

	public DesignResource(URI uri) {
		super(uri);
		setEncoding(StandardCharsets.UTF_8.name());
	}

	/** @return the design, or null while nothing is loaded */
	public Design design() {
		return getContents().isEmpty() ? null : (Design) getContents().get(0);
	}

	/** Loads all or nothing: after a failure the resource is as if it had never been loaded. */
	@Override
	public void doLoad(InputStream input, Map<?, ?> options) throws IOException {
		try {
			read(input, options);
		} catch (IOException | RuntimeException e) {
			unload();
			throw e;
		}
	}

	private void read(InputStream input, Map<?, ?> options) throws IOException {
		String name = getURI() == null ? "design" : URI.decode(getURI().lastSegment());
		byte[] content = input.readNBytes(MOST_BYTES + 1);
		List<ReadProblem> problems = content.length > MOST_BYTES
				? List.of(new ReadProblem(name, 0, "", "", "", "larger than 64 MiB, not a design"))
				: FileChecker.check(name, content);
		if (!problems.isEmpty()) {
			throw new UnreadableDesignException(problems);
		}
		Map<Object, Object> hardened = new HashMap<>(options == null ? Map.of() : options);
		hardened.put(XMLResource.OPTION_PARSER_FEATURES,
				Map.of("http://apache.org/xml/features/disallow-doctype-decl", true,
						"http://xml.org/sax/features/external-general-entities", false,
						"http://xml.org/sax/features/external-parameter-entities", false));
		hardened.put(XMLResource.OPTION_DEFER_IDREF_RESOLUTION, true);
		// references are found by id in a map while loading; later edits may change ids, so it goes then
		setIntrinsicIDToEObjectMap(new HashMap<>());
		try {
			super.doLoad(new ByteArrayInputStream(content), hardened);
		} finally {
			setIntrinsicIDToEObjectMap(null);
		}
		if (!getErrors().isEmpty()) {
			List<ReadProblem> missed = getErrors().stream().map(d -> problem(name, d)).toList();
			getContents().clear();
			throw new UnreadableDesignException(missed);
		}
	}

	private static ReadProblem problem(String name, Resource.Diagnostic diagnostic) {
		return new ReadProblem(name, diagnostic.getLine(), "", "", "", diagnostic.getMessage());
	}

	@Override
	public void save(Map<?, ?> options) throws IOException {
		if (getURI().isFile()) {
			AtomicFile.write(Path.of(getURI().toFileString()), DesignWriter.content(this));
			setModified(false);
		} else {
			super.save(options);
		}
	}

	@Override
	public void doSave(OutputStream output, Map<?, ?> options) throws IOException {
		if (design() != null) {
			Storable.check(design());
		}
		Map<Object, Object> ours = new HashMap<>(options == null ? Map.of() : options);
		ours.put(XMLResource.OPTION_SCHEMA_LOCATION, false);
		super.doSave(output, ours);
	}
}
