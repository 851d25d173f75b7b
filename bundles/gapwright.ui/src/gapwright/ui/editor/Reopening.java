package gapwright.ui.editor;

import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.ui.IEditorPart;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.PartInitException;

/**
 * Reads the file of an editor again: closes the editor and opens another on the same file, with the same page in
 * front. Outline and Properties keep what they got from an editor for as long as that is open, so it must go.
 */
final class Reopening {

	private Reopening() {
	}

	/** What was undone or not saved is gone. */
	static void of(DesignEditor editor) {
		IWorkbenchPage page = editor.getSite().getPage();
		boolean active = page.getActivePart() == editor;
		boolean front = page.getActiveEditor() == editor;
		int shown = editor.frontPage();
		page.closeEditor(editor, false);
		try {
			IEditorPart again = page.openEditor(editor.getEditorInput(), DesignEditor.ID, active);
			if (front) {
				page.bringToTop(again);
			}
			if (again instanceof DesignEditor next) {
				next.showPage(shown);
			}
		} catch (PartInitException e) {
			MessageDialog.openError(page.getWorkbenchWindow().getShell(), "Read again", e.getMessage());
		}
	}
}
