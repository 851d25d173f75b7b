package gapwright.model.edit.history;

import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;

import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.common.command.CommandStack;
import org.eclipse.emf.ecore.change.ChangeDescription;
import org.eclipse.emf.edit.domain.AdapterFactoryEditingDomain;
import org.eclipse.emf.edit.provider.ComposedAdapterFactory;
import org.eclipse.emf.edit.provider.ReflectiveItemProviderAdapterFactory;

import gapwright.model.provider.GapwrightItemProviderAdapterFactory;

/**
 * The one history of a design being edited: what can be undone, and whether the file on disk is behind. Edits from
 * the canvas and from a form undo in the order they were made. To be used from one thread.
 */
public final class EditHistory {

	private final LoudCommandStack stack = new LoudCommandStack();
	private final ComposedAdapterFactory adapters = new ComposedAdapterFactory(List.of(
			new GapwrightItemProviderAdapterFactory(), new ReflectiveItemProviderAdapterFactory()));
	private final AdapterFactoryEditingDomain domain = new AdapterFactoryEditingDomain(adapters, stack);
	private final List<Runnable> listeners = new CopyOnWriteArrayList<>();
	private Gesture gesture;

	public EditHistory() {
		stack.addCommandStackListener(event -> changed());
	}

	/**
	 * Makes an edit and remembers it; an edit that changes nothing leaves no step. A gesture under way is cancelled
	 * first.
	 *
	 * @throws RuntimeException whatever the edit threw; the design and the history are then as before
	 */
	public void run(Edit edit) {
		cancelGesture();
		ChangeDescription revert = Recording.of(edit);
		if (!Recording.isEmpty(revert)) {
			push(new RecordedEdit(edit.label(), revert));
		}
	}

	/** Begins a change under the mouse; one that is still under way is cancelled. */
	public Gesture begin() {
		cancelGesture();
		gesture = new Gesture(this);
		return gesture;
	}

	public boolean canUndo() {
		return gesture == null && stack.canUndo();
	}

	public boolean canRedo() {
		return gesture == null && stack.canRedo();
	}

	/** @return label of the step that {@link #undo} would take back, or "" */
	public String undoLabel() {
		return label(stack.getUndoCommand());
	}

	/** @return label of the step that {@link #redo} would repeat, or "" */
	public String redoLabel() {
		return label(stack.getRedoCommand());
	}

	/** Takes the last step back, if there is one. During a gesture it only cancels that. */
	public void undo() {
		if (gesture != null) {
			cancelGesture();
		} else if (stack.canUndo()) {
			stack.undo();
		}
	}

	/** Repeats the step taken back last, if there is one. */
	public void redo() {
		cancelGesture();
		if (stack.canRedo()) {
			stack.redo();
		}
	}

	/** @return whether the design differs from what was last marked as saved */
	public boolean isDirty() {
		return stack.isSaveNeeded();
	}

	/** Says that the design as it is now is on disk. */
	public void markSaved() {
		stack.saveIsDone();
		changed();
	}

	/** Says that the file on disk is no longer what was saved (deleted or changed by others): dirty until saved. */
	public void markUnsaved() {
		stack.forgetSaved();
	}

	/** Forgets all steps; the design counts as saved. */
	public void clear() {
		cancelGesture();
		stack.flush();
		stack.saveIsDone();
		changed();
	}

	/** @param listener called after every step, undo, redo, save and shown gesture */
	public void addListener(Runnable listener) {
		listeners.add(listener);
	}

	public void removeListener(Runnable listener) {
		listeners.remove(listener);
	}

	/** @return domain for item providers; commands made with it land on this history */
	public AdapterFactoryEditingDomain domain() {
		return domain;
	}

	/** @return the stack behind this history, for frameworks that want one */
	public CommandStack stack() {
		return stack;
	}

	/** Releases the item providers. */
	public void dispose() {
		listeners.clear();
		adapters.dispose();
	}

	void push(Command made) {
		stack.execute(made);
	}

	void changed() {
		listeners.forEach(Runnable::run);
	}

	void ended(Gesture ending) {
		if (gesture == ending) {
			gesture = null;
		}
	}

	private void cancelGesture() {
		if (gesture != null) {
			gesture.cancel();
		}
	}

	private static String label(Command command) {
		return command == null ? "" : command.getLabel();
	}
}
