package gapwright.ui.canvas;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.core.runtime.ListenerList;
import org.eclipse.gef.EditPart;
import org.eclipse.gef.GraphicalViewer;
import org.eclipse.jface.viewers.ISelection;
import org.eclipse.jface.viewers.ISelectionChangedListener;
import org.eclipse.jface.viewers.ISelectionProvider;
import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.jface.viewers.SelectionChangedEvent;
import org.eclipse.jface.viewers.StructuredSelection;

/** Offers the workbench the selected model elements instead of edit parts. */
final class CanvasSelection implements ISelectionProvider {

	private final GraphicalViewer viewer;
	private final ListenerList<ISelectionChangedListener> listeners = new ListenerList<>();

	CanvasSelection(GraphicalViewer viewer) {
		this.viewer = viewer;
		viewer.addSelectionChangedListener(event -> {
			SelectionChangedEvent ours = new SelectionChangedEvent(this, getSelection());
			listeners.forEach(listener -> listener.selectionChanged(ours));
		});
	}

	@Override
	public ISelection getSelection() {
		return new StructuredSelection(
				selected());
	}

	private List<Object> selected() {
		List<Object> models = new ArrayList<>();
		for (Object part : viewer.getSelectedEditParts()) {
			models.add(((EditPart) part).getModel());
		}
		return models;
	}

	@Override
	public void setSelection(ISelection selection) {
		if (selection instanceof IStructuredSelection structured) {
			List<Object> parts = new ArrayList<>();
			for (Object model : structured.toList()) {
				Object part = viewer.getEditPartRegistry().get(model);
				if (part instanceof EditPart) {
					parts.add(part);
				}
			}
			viewer.setSelection(new StructuredSelection(parts));
		}
	}

	@Override
	public void addSelectionChangedListener(ISelectionChangedListener listener) {
		listeners.add(listener);
	}

	@Override
	public void removeSelectionChangedListener(ISelectionChangedListener listener) {
		listeners.remove(listener);
	}
}
