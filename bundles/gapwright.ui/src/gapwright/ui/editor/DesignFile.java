package gapwright.ui.editor;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IPath;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.Status;
import org.eclipse.ui.IEditorInput;
import org.eclipse.ui.IFileEditorInput;
import org.eclipse.ui.IURIEditorInput;

import gapwright.model.Design;
import gapwright.model.DesignReader;
import gapwright.model.DesignWriter;
import gapwright.model.UnreadableDesignException;

/** The file behind an editor, inside the workspace or anywhere on disk. */
final class DesignFile {

	private final IFile resource;
	private final Path path;

	private DesignFile(IFile resource, Path path) {
		this.resource = resource;
		this.path = path;
	}

	/** @throws CoreException when the input is no file on this machine */
	static DesignFile of(IEditorInput input) throws CoreException {
		if (input instanceof IFileEditorInput workspace) {
			return of(workspace.getFile());
		}
		if (input instanceof IURIEditorInput outside && "file".equals(outside.getURI().getScheme())) {
			return new DesignFile(null, Path.of(outside.getURI()));
		}
		throw new CoreException(Status.error("'" + input.getName() + "' is no file on this machine, so it cannot be edited."));
	}

	static DesignFile of(IFile file) throws CoreException {
		IPath location = file.getLocation();
		if (location == null) {
			throw new CoreException(Status.error("'" + file.getFullPath() + "' is no file on this machine, so it cannot be edited."));
		}
		return new DesignFile(file, location.toPath());
	}

	/** The file in the workspace; null when it lies outside. */
	IFile resource() {
		return resource;
	}

	String name() {
		return path.getFileName().toString();
	}

	/** Stays the same as long as nobody else writes the file. */
	long stamp() {
		try {
			return Files.getLastModifiedTime(path).toMillis() * 31 + Files.size(path);
		} catch (IOException e) {
			return -1;
		}
	}

	Design read() throws UnreadableDesignException, IOException {
		try (InputStream in = Files.newInputStream(path)) {
			return DesignReader.read(in, name());
		}
	}

	/** Whole or not at all: on failure the file on disk is as it was. */
	void write(Design design, IProgressMonitor monitor) throws IOException, CoreException {
		if (resource != null && resource.isReadOnly()) {
			throw new IOException("'" + name() + "' is read-only.");
		}
		DesignWriter.write(design, path);
		if (resource != null) {
			resource.refreshLocal(IResource.DEPTH_ZERO, monitor);
			SavedMarkers.follow(resource);
		}
	}
}
