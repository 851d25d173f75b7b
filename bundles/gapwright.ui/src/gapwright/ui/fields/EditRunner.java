package gapwright.ui.fields;

import gapwright.model.edit.history.Edit;
import gapwright.model.edit.history.EditHistory;

/** Runs edits of a form on the one history of the design. */
@FunctionalInterface
public interface EditRunner {

	/** @return null when it was done, else a sentence why it was not; the design is then as before */
	String run(Edit edit);

	/** A failed edit has left no trace in the design; whoever made it is told beside the field. */
	static EditRunner on(EditHistory history) {
		return edit -> {
			try {
				history.run(edit);
				return null;
			} catch (RuntimeException e) {
				return edit.label() + " could not be done: " + (e.getMessage() == null ? e.toString() : e.getMessage());
			}
		};
	}
}
