package gapwright.ui.editor;

import java.util.function.Supplier;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.viewers.ISelection;
import org.eclipse.jface.viewers.SelectionChangedEvent;
import org.eclipse.jface.viewers.StructuredSelection;
import org.eclipse.ui.part.MultiPageEditorPart;
import org.eclipse.ui.part.MultiPageSelectionProvider;

/** What the editor offers to the workbench's selection service: on a form page its chosen element, else the canvas's selection, else the design. */
final class EditorSelection extends MultiPageSelectionProvider {

	private final Supplier<EObject> chosen;
	private final Supplier<? extends EObject> design;

	/**
	 * @param chosen element of the form page in front; null when that is the canvas or nothing is chosen
	 * @param design what is offered when nothing is selected; null while there is none
	 */
	EditorSelection(MultiPageEditorPart editor, Supplier<EObject> chosen, Supplier<? extends EObject> design) {
		super(editor);
		this.chosen = chosen;
		this.design = design;
	}

	@Override
	public ISelection getSelection() {
		EObject element = chosen.get();
		if (element != null) {
			return new StructuredSelection(element);
		}
		ISelection selection = super.getSelection();
		return selection.isEmpty() && design.get() != null ? new StructuredSelection(design.get()) : selection;
	}

	/** A form page came to the front or has chosen another element. */
	void changed() {
		SelectionChangedEvent event = new SelectionChangedEvent(this, getSelection());
		fireSelectionChanged(event);
		firePostSelectionChanged(event);
	}

	/** The canvas tells of its selection also while a form page covers it: what is told is always that of the page in front. */
	@Override
	public void fireSelectionChanged(SelectionChangedEvent event) {
		super.fireSelectionChanged(new SelectionChangedEvent(this, getSelection()));
	}

	@Override
	public void firePostSelectionChanged(SelectionChangedEvent event) {
		super.firePostSelectionChanged(new SelectionChangedEvent(this, getSelection()));
	}
}
