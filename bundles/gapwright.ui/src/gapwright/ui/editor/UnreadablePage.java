package gapwright.ui.editor;

import java.util.List;

import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.PartInitException;

import gapwright.model.ReadProblem;
import gapwright.model.UnreadableDesignException;
import gapwright.ui.fields.Headings;

/** Stands in place of the pages when the file cannot be read: says what is wrong with it and where, and touches nothing. */
final class UnreadablePage extends Composite {

	/** Id of the platform's plain text editor. */
	private static final String TEXT_EDITOR = "org.eclipse.ui.DefaultTextEditor";

	UnreadablePage(Composite parent, Exception reason, DesignEditor editor) {
		super(parent, SWT.NONE);
		GridLayout grid = new GridLayout(2, false);
		grid.marginWidth = 16;
		grid.marginHeight = 12;
		setLayout(grid);
		((GridData) Headings.title(this, "This file cannot be read").getLayoutData()).horizontalSpan = 2;
		Headings.note(this, "'" + editor.getEditorInput().getName() + "' is not opened and not changed. Mend it as text, then read it again.", 2);
		if (reason instanceof UnreadableDesignException unreadable) {
			table(unreadable.problems());
		} else {
			Headings.note(this, reason.getMessage() == null ? reason.toString() : reason.getMessage(), 2);
		}
		button("Open as text", () -> openAsText(editor));
		button("Read again", () -> getDisplay().asyncExec(() -> Reopening.of(editor)));
	}

	private void table(List<ReadProblem> problems) {
		Table table = new Table(this, SWT.BORDER | SWT.FULL_SELECTION);
		table.setHeaderVisible(true);
		table.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true, 2, 1));
		column(table, "Line", 60);
		column(table, "Element", 150);
		column(table, "Attribute", 130);
		column(table, "Found", 240);
		column(table, "Expected", 380);
		for (ReadProblem problem : problems) {
			String line = problem.line() > 0 ? Integer.toString(problem.line()) : "";
			new TableItem(table, SWT.NONE).setText(new String[] { line, text(problem.element()), text(problem.attribute()),
					text(problem.found()), text(problem.expected()) });
		}
	}

	private static String text(String part) {
		return part == null ? "" : part;
	}

	private static void column(Table table, String title, int width) {
		TableColumn column = new TableColumn(table, SWT.LEFT);
		column.setText(title);
		column.setWidth(width);
	}

	private void button(String text, Runnable action) {
		Button button = new Button(this, SWT.PUSH);
		button.setText(text);
		button.setLayoutData(new GridData(SWT.BEGINNING, SWT.CENTER, false, false));
		button.addListener(SWT.Selection, event -> action.run());
	}

	private void openAsText(DesignEditor editor) {
		try {
			editor.getSite().getPage().openEditor(editor.getEditorInput(), TEXT_EDITOR, true,
					IWorkbenchPage.MATCH_ID | IWorkbenchPage.MATCH_INPUT);
		} catch (PartInitException e) {
			MessageDialog.openError(getShell(), "Open as text", e.getMessage());
		}
	}
}
