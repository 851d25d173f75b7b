package gapwright.ui.views;

import java.util.List;

import org.eclipse.core.runtime.ListenerList;
import org.eclipse.jface.viewers.ISelection;
import org.eclipse.jface.viewers.ISelectionChangedListener;
import org.eclipse.jface.viewers.ISelectionProvider;
import org.eclipse.jface.viewers.SelectionChangedEvent;
import org.eclipse.jface.viewers.StructuredSelection;

/** What a view offers to the workbench's selection service. */
final class PublishedSelection implements ISelectionProvider {

	private final ListenerList<ISelectionChangedListener> listeners = new ListenerList<>();
	private ISelection selection = StructuredSelection.EMPTY;

	void publish(List<?> elements) {
		setSelection(new StructuredSelection(elements));
	}

	@Override
	public void addSelectionChangedListener(ISelectionChangedListener listener) {
		listeners.add(listener);
	}

	@Override
	public ISelection getSelection() {
		return selection;
	}

	@Override
	public void removeSelectionChangedListener(ISelectionChangedListener listener) {
		listeners.remove(listener);
	}

	@Override
	public void setSelection(ISelection next) {
		selection = next;
		SelectionChangedEvent event = new SelectionChangedEvent(this, next);
		listeners.forEach(listener -> listener.selectionChanged(event));
	}
}
