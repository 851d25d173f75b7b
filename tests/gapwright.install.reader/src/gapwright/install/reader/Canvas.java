package gapwright.install.reader;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.core.runtime.Platform;
import org.eclipse.gef.AccessibleEditPart;
import org.eclipse.gef.EditPart;
import org.eclipse.gef.GraphicalViewer;
import org.eclipse.swt.accessibility.AccessibleEvent;
import org.eclipse.ui.IEditorPart;
import org.eclipse.ui.IWorkbenchPage;

/** What a drawing tells a screen reader. */
final class Canvas {

	private Canvas() {
	}

	/** @return the names of its parts; empty as long as no drawing is there or none of its parts says how full it is */
	static List<String> read(IWorkbenchPage page) {
		IEditorPart editor = page.getActiveEditor();
		if (editor == null || Platform.getBundle("org.eclipse.gef") == null) {
			return List.of();
		}
		List<String> names = new ArrayList<>();
		GraphicalViewer viewer = editor.getAdapter(GraphicalViewer.class);
		if (viewer != null && viewer.getContents() != null) {
			collect(viewer.getContents(), names);
		}
		return names.stream().anyMatch(name -> name.contains("% of saturation")) ? names : List.of();
	}

	private static void collect(EditPart part, List<String> names) {
		Object speaker = part.getAdapter(AccessibleEditPart.class);
		if (speaker instanceof AccessibleEditPart accessible) {
			AccessibleEvent event = new AccessibleEvent(part);
			accessible.getName(event);
			if (event.result != null) {
				names.add(event.result);
			}
		}
		for (Object child : part.getChildren()) {
			collect((EditPart) child, names);
		}
	}
}
