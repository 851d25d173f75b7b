package gapwright.ui.tests;

import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Shell;

/** Answers the dialog that an action opens and remembers what it asked. */
final class Answer {

	private final String button;
	private String question;

	private Answer(String button) {
		this.button = button;
	}

	/** @return what the dialog said; null when none came */
	static String with(String button, Runnable action) {
		Answer answer = new Answer(button);
		answer.watch(Workbench.shell());
		action.run();
		Workbench.drain();
		return answer.question;
	}

	private void watch(Shell main) {
		Display display = main.getDisplay();
		display.timerExec(50, () -> {
			Shell dialog = display.getActiveShell();
			if (question == null && dialog != null && dialog != main && dialog.getParent() != null && dialog.isVisible()) {
				question = words(dialog);
				press(dialog);
			} else if (question == null && !main.isDisposed()) {
				watch(main);
			}
		});
	}

	private static String words(Shell dialog) {
		return Workbench.find(dialog, Label.class, label -> label.getText().length() > 20).getText();
	}

	private void press(Shell dialog) {
		Workbench.find(dialog, Button.class, each -> each.getText().replace("&", "").equals(button)).notifyListeners(SWT.Selection, new Event());
	}
}
