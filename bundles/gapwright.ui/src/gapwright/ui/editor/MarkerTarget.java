package gapwright.ui.editor;

import org.eclipse.core.resources.IMarker;

import gapwright.model.Design;
import gapwright.model.Ids;
import gapwright.model.OperatingPoint;

/** The element a problem marker is about. */
final class MarkerTarget {

	/** Attributes of the marker type gapwright.workspace.finding. */
	private static final String SUBJECT = "gapwright.subject";
	private static final String OPERATING_POINT = "gapwright.operatingPoint";

	private MarkerTarget() {
	}

	/** Selects the marker's element, at the operating point the finding was made for. */
	static void reveal(IMarker marker, DesignEditor editor) {
		if (editor.session() != null) {
			Design design = editor.session().design();
			if (Ids.find(design, marker.getAttribute(OPERATING_POINT, "")) instanceof OperatingPoint point) {
				editor.session().choose(point);
			}
			editor.reveal(Ids.find(design, marker.getAttribute(SUBJECT, "")));
		}
	}
}
