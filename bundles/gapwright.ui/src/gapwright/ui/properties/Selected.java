package gapwright.ui.properties;

import org.eclipse.core.runtime.Adapters;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.gef.EditPart;
import org.eclipse.jface.viewers.ISelection;
import org.eclipse.jface.viewers.IStructuredSelection;

/** The model element behind whatever is selected on the canvas, in the outline or in a ledger. */
final class Selected {

	private Selected() {
	}

	/** The element, or null when it is none or several. */
	static EObject of(ISelection selection) {
		return selection instanceof IStructuredSelection structured && structured.size() == 1 ? element(structured.getFirstElement()) : null;
	}

	static EObject element(Object selected) {
		if (selected instanceof EObject element) {
			return element;
		}
		if (selected instanceof EditPart part) {
			return part.getModel() instanceof EObject element ? element : null;
		}
		return Adapters.adapt(selected, EObject.class);
	}
}
