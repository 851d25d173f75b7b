package gapwright.ui.fields;

import org.eclipse.jface.preference.JFacePreferences;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;

/** The reason why a field is marked, in words below it; takes no room while there is none. */
public final class ProblemLine {

	private final Label label;
	private final GridData data = new GridData(SWT.FILL, SWT.TOP, true, false);

	/** @param span columns of the parent's grid */
	public ProblemLine(Composite parent, int span) {
		label = new Label(parent, SWT.WRAP);
		label.setForeground(JFaceResources.getColorRegistry().get(JFacePreferences.ERROR_COLOR));
		data.horizontalSpan = span;
		data.exclude = true;
		data.widthHint = 180;
		label.setLayoutData(data);
		label.setVisible(false);
	}

	/** @return whether the line came, went or changed, so that a new layout is due */
	public boolean show(String problem) {
		String text = problem == null ? "" : problem;
		if (label.isDisposed() || text.equals(label.getText())) {
			return false;
		}
		label.setText(text);
		data.exclude = problem == null;
		label.setVisible(problem != null);
		return true;
	}

	void hide() {
		show(null);
	}

	/** Moves the line below everything in the form. */
	void last() {
		label.moveBelow(null);
	}

	void dispose() {
		label.dispose();
	}
}
