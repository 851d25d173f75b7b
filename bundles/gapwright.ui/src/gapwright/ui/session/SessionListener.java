package gapwright.ui.session;

/** Told on the UI thread when there is another result, none any more, or another operating point is chosen. */
@FunctionalInterface
public interface SessionListener {

	void sessionChanged();
}
