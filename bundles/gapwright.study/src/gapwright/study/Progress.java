package gapwright.study;

/** How long work tells how far it is, and learns that it is not wanted any more. Called from the working thread. */
public interface Progress {

	/** Neither shown nor cancelled. */
	Progress NONE = new Progress() {
		@Override
		public boolean cancelled() {
			return false;
		}

		@Override
		public void done(double fraction) {
			// nobody looks
		}
	};

	/** @return whether to stop; the work then throws {@link java.util.concurrent.CancellationException} */
	boolean cancelled();

	/** @param fraction of the work, 0 to 1, rising */
	void done(double fraction);
}
