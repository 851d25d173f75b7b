package gapwright.ui.session;

import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;

import org.eclipse.emf.ecore.EObject;

/** The one selection that canvas, outline and ledgers of a design share. To be used from the UI thread. */
public final class SelectionHub {

	/** Told of every change of the selection. */
	@FunctionalInterface
	public interface Listener {

		/** @param source who selected; a part does not answer itself */
		void selected(List<EObject> elements, Object source);
	}

	private final List<Listener> listeners = new CopyOnWriteArrayList<>();
	private List<EObject> selected = List.of();
	private boolean telling;

	/** What is selected, the primary one last as in a canvas; elements deleted since are left out. */
	public List<EObject> selected() {
		return selected.stream().filter(element -> element.eResource() != null || element.eContainer() != null).toList();
	}

	/** Selects these elements and tells the others; what a listener selects meanwhile is an echo and is not told again. */
	public void select(List<? extends EObject> elements, Object source) {
		if (telling || selected.equals(elements)) {
			return;
		}
		selected = List.copyOf(elements);
		telling = true;
		try {
			listeners.forEach(listener -> listener.selected(selected, source));
		} finally {
			telling = false;
		}
	}

	public void addListener(Listener listener) {
		listeners.add(listener);
	}

	public void removeListener(Listener listener) {
		listeners.remove(listener);
	}
}
