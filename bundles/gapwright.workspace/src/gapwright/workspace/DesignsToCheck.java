package gapwright.workspace;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.IResourceDelta;
import org.eclipse.core.resources.IResourceDeltaVisitor;
import org.eclipse.core.resources.IResourceVisitor;

/** Collects the designs of a project, or those of them that are new or have new content. */
final class DesignsToCheck implements IResourceVisitor, IResourceDeltaVisitor {

	private static final int CONTENT = IResourceDelta.CONTENT | IResourceDelta.REPLACED | IResourceDelta.TYPE | IResourceDelta.DERIVED_CHANGED;

	private final List<IFile> files = new ArrayList<>();

	List<IFile> files() {
		return files;
	}

	@Override
	public boolean visit(IResource resource) {
		if (DesignFiles.isDesign(resource)) {
			files.add((IFile) resource);
		}
		return true;
	}

	@Override
	public boolean visit(IResourceDelta delta) {
		boolean changed = delta.getKind() == IResourceDelta.ADDED
				|| delta.getKind() == IResourceDelta.CHANGED && (delta.getFlags() & CONTENT) != 0;
		return changed ? visit(delta.getResource()) : delta.getKind() != IResourceDelta.REMOVED;
	}
}
