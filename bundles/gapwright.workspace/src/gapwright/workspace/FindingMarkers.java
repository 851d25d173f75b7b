package gapwright.workspace;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.IWorkspace;
import org.eclipse.core.runtime.CoreException;

/** The problem markers of findings. */
public final class FindingMarkers {

	/** Type of the markers. */
	public static final String TYPE = "gapwright.workspace.finding";
	/** Attribute: stable code of the finding, see the user guide. */
	public static final String CODE = "gapwright.code";
	/** Attribute: id of the element, or "" for the whole design. */
	public static final String SUBJECT = "gapwright.subject";
	/** Attribute: id of the operating point, or "" when it holds at every one. */
	public static final String OPERATING_POINT = "gapwright.operatingPoint";
	/** Attribute: what to do, or "". */
	public static final String HINT = "gapwright.hint";

	private FindingMarkers() {
	}

	/** Removes those of a file, a folder or a project. */
	static void clear(IResource resource) throws CoreException {
		resource.deleteMarkers(TYPE, true, IResource.DEPTH_INFINITE);
	}

	/** In one step, so that nobody sees half of them; a marker that says what it should stays. */
	static void replace(IFile file, List<MarkerText> texts) throws CoreException {
		IWorkspace workspace = file.getWorkspace();
		workspace.run(monitor -> {
			if (!file.exists()) {
				return;
			}
			List<MarkerText> missing = new ArrayList<>(texts);
			for (IMarker marker : file.findMarkers(TYPE, false, IResource.DEPTH_ZERO)) {
				if (!missing.remove(new MarkerText(marker.getAttributes()))) {
					marker.delete();
				}
			}
			for (MarkerText text : missing) {
				file.createMarker(TYPE, text.attributes());
			}
		}, workspace.getRuleFactory().markerRule(file), IWorkspace.AVOID_UPDATE, null);
	}
}
