package gapwright.ui.canvas;

import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.widgets.Shell;

import gapwright.model.edit.history.Edit;
import gapwright.ui.fields.EditRunner;
import gapwright.ui.session.DesignSession;

/** Runs edits made on the canvas and says so when one could not be done. */
public final class Messages {

	private Messages() {
	}

	/** @return whether it was done; otherwise the design is as before and the user has been told */
	public static boolean run(DesignSession session, Edit edit, Shell shell) {
		String problem = EditRunner.on(session.history()).run(edit);
		if (problem != null) {
			MessageDialog.openError(shell, edit.label(), problem);
		}
		return problem == null;
	}
}
