package gapwright.ui.fields;

import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;

/** Titles of pages and of the parts of a form. */
public final class Headings {

	private Headings() {
	}

	/** Title of a whole list or page. */
	public static Label title(Composite parent, String text) {
		Label label = new Label(parent, SWT.NONE);
		label.setText(text);
		label.setFont(JFaceResources.getFontRegistry().get(JFaceResources.HEADER_FONT));
		label.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
		return label;
	}

	/** A part of a form: its heading, a line, an explanation if there is something to explain, and the composite to fill. */
	public static Composite part(Composite parent, String text, String explanation) {
		Composite part = new Composite(parent, SWT.NONE);
		part.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
		GridLayout grid = new GridLayout(2, false);
		grid.marginWidth = 0;
		grid.marginHeight = 6;
		part.setLayout(grid);
		Label label = new Label(part, SWT.NONE);
		label.setText(text);
		label.setFont(JFaceResources.getFontRegistry().getBold(JFaceResources.DIALOG_FONT));
		Label line = new Label(part, SWT.SEPARATOR | SWT.HORIZONTAL);
		line.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
		if (!explanation.isEmpty()) {
			note(part, explanation, 2);
		}
		Composite body = new Composite(part, SWT.NONE);
		body.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false, 2, 1));
		return body;
	}

	/** A wrapped sentence. */
	public static Label note(Composite parent, String text, int span) {
		Label note = new Label(parent, SWT.WRAP);
		note.setText(text);
		GridData wide = new GridData(SWT.FILL, SWT.TOP, true, false, span, 1);
		wide.widthHint = 320;
		note.setLayoutData(wide);
		return note;
	}
}
