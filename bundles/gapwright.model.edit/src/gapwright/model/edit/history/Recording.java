package gapwright.model.edit.history;

import org.eclipse.emf.ecore.change.ChangeDescription;
import org.eclipse.emf.ecore.change.util.ChangeRecorder;

/**
 * Runs a change while EMF records it. EMF's own recorded command leaves the model half changed when the change
 * throws; this one puts everything back.
 */
final class Recording {

	private Recording() {
	}

	/** @return how to revert what was done; its application turns it into how to repeat it */
	static ChangeDescription of(Edit edit) {
		ChangeRecorder recorder = new ChangeRecorder(edit.owners());
		try {
			edit.change().run();
			return recorder.endRecording();
		} catch (RuntimeException | Error failure) {
			recorder.endRecording().apply();
			throw failure;
		} finally {
			recorder.dispose();
		}
	}

	static boolean isEmpty(ChangeDescription description) {
		return description.getObjectChanges().isEmpty() && description.getResourceChanges().isEmpty();
	}
}
