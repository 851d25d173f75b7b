package gapwright.ui.editor;

import java.util.function.Supplier;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.viewers.ISelection;
import org.eclipse.jface.viewers.SelectionChangedEvent;
import org.eclipse.jface.viewers.StructuredSelection;
import org.eclipse.ui.part.MultiPageEditorPart;
import org.eclipse.ui.part.MultiPageSelectionProvider;

/** What the editor offers to the workbench's selection service: on a form page its chosen element, else the canvas's selection. */
final class EditorSelection extends MultiPageSelectionProvider {

	private final Supplier<EObject> chosen;

	/** @param chosen element of the form page in front; null when that is the canvas or nothing is chosen */
	EditorSelection(MultiPageEditorPart editor, Supplier<EObject> chosen) {
		super(editor);
		this.chosen = chosen;
	}

	@Override
	public ISelection getSelection() {
		EObject element = chosen.get();
		return element == null ? super.getSelection() : new StructuredSelection(element);
	}

	/** A form page came to the front or has chosen another element. */
	void changed() {
		SelectionChangedEvent event = new SelectionChangedEvent(this, getSelection());
		fireSelectionChanged(event);
		firePostSelectionChanged(event);
	}
}
