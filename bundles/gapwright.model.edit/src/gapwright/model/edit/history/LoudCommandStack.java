package gapwright.model.edit.history;

import org.eclipse.emf.common.command.BasicCommandStack;

/** EMF's stack, except that an exception reaches the caller instead of a log nobody reads. */
final class LoudCommandStack extends BasicCommandStack {

	@Override
	protected void handleError(Exception exception) {
		if (exception instanceof RuntimeException unchecked) {
			throw unchecked;
		}
		throw new IllegalStateException(exception);
	}

	/** Makes the state on disk unknown, so that the history stays dirty until the next save. */
	void forgetSaved() {
		saveIndex = -2;
		notifyListeners();
	}
}
