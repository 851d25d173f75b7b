package gapwright.ui.tests;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.core.runtime.ILogListener;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Platform;

/** What went to the error log since the last look: an exception in a listener shows there and nowhere else. */
final class LoggedErrors implements ILogListener {

	private static final LoggedErrors ONLY = new LoggedErrors();

	private final List<String> errors = new ArrayList<>();

	private LoggedErrors() {
		Platform.addLogListener(this);
	}

	/** Begins to listen, with nothing heard yet. */
	static void forget() {
		synchronized (ONLY.errors) {
			ONLY.errors.clear();
		}
	}

	/** @throws AssertionError with everything logged that has our code in its trace */
	static void assertNone() {
		synchronized (ONLY.errors) {
			List<String> heard = List.copyOf(ONLY.errors);
			ONLY.errors.clear();
			if (!heard.isEmpty()) {
				throw new AssertionError("logged: " + String.join("\n", heard));
			}
		}
	}

	@Override
	public void logging(IStatus status, String plugin) {
		Throwable reason = status.getException();
		if (status.getSeverity() == IStatus.ERROR && reason != null) {
			StringBuilder text = new StringBuilder(status.getMessage()).append(": ").append(reason);
			boolean ours = false;
			for (Throwable each = reason; each != null; each = each.getCause()) {
				for (StackTraceElement line : each.getStackTrace()) {
					if (line.getClassName().startsWith("gapwright.") && !line.getClassName().startsWith("gapwright.ui.tests.")) {
						ours = true;
						text.append("\n\tat ").append(line);
					}
				}
			}
			if (ours) {
				synchronized (errors) {
					errors.add(text.toString());
				}
			}
		}
	}
}
