package gapwright.workspace;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.runtime.Platform;
import org.eclipse.core.runtime.content.IContentType;

/** Which files are designs. */
public final class DesignFiles {

	/** Content type of {@code *.gapwright}; a user may associate more names with it. */
	public static final String CONTENT_TYPE = "gapwright.workspace.design";

	private DesignFiles() {
	}

	/**
	 * By its name, because a broken design is a design too.
	 *
	 * @return false for what is no file, and for a file that is derived from others
	 */
	public static boolean isDesign(IResource resource) {
		IContentType type = Platform.getContentTypeManager().getContentType(CONTENT_TYPE);
		return resource instanceof IFile && type.isAssociatedWith(resource.getName())
				&& !resource.isDerived(IResource.CHECK_ANCESTORS);
	}
}
