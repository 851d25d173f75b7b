package gapwright.model.edit.history;

import java.util.function.Supplier;

import org.eclipse.emf.ecore.change.ChangeDescription;

/**
 * A change under the mouse: shown in the model while it goes on, one step in the history when it ends, and no trace
 * when it is cancelled. Get one from {@link EditHistory#begin}; end it by {@link #commit} or {@link #cancel}.
 */
public final class Gesture {

	private final EditHistory history;
	private String label;
	private ChangeDescription shown;
	private boolean ended;

	Gesture(EditHistory history) {
		this.history = history;
	}

	/**
	 * Replaces what the gesture has shown so far. Each call states the whole change against the model as it was when
	 * the gesture began; the supplier of the edit may read the model, which is as it was then.
	 */
	public void show(Supplier<Edit> edit) {
		if (ended) {
			throw new IllegalStateException("the gesture has ended");
		}
		revert();
		Edit next = edit.get();
		label = next.label();
		shown = Recording.of(next);
		history.changed();
	}

	/** Makes what is shown a step of the history; nothing shown, no step. */
	public void commit() {
		end();
		if (shown != null && !Recording.isEmpty(shown)) {
			history.push(new RecordedEdit(label, shown));
		} else {
			history.changed();
		}
	}

	/** Puts the model back. Safe to call after the gesture has ended. */
	public void cancel() {
		if (!ended) {
			end();
			revert();
			history.changed();
		}
	}

	private void revert() {
		if (shown != null) {
			shown.apply();
			shown = null;
		}
	}

	private void end() {
		ended = true;
		history.ended(this);
	}
}
