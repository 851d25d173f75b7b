package gapwright.ui.editor;

import org.eclipse.gef.ui.actions.ActionRegistry;
import org.eclipse.jface.action.IAction;
import org.eclipse.ui.IActionBars;
import org.eclipse.ui.IEditorPart;
import org.eclipse.ui.actions.ActionFactory;
import org.eclipse.ui.part.MultiPageEditorActionBarContributor;

import gapwright.ui.session.DesignSession;

/** Hands the workbench's own menu entries (undo, copy, delete, print …) to the page in front. */
public final class DesignActionBars extends MultiPageEditorActionBarContributor {

	private static final ActionFactory[] OF_THE_PAGE = { ActionFactory.DELETE, ActionFactory.COPY, ActionFactory.CUT, ActionFactory.PASTE,
			ActionFactory.SELECT_ALL, ActionFactory.PRINT };

	private IEditorPart editor;

	@Override
	public void setActiveEditor(IEditorPart part) {
		editor = part;
		super.setActiveEditor(part);
	}

	/** @param page null for a form page */
	@Override
	public void setActivePage(IEditorPart page) {
		IActionBars bars = getActionBars();
		ActionRegistry registry = page == null ? null : page.getAdapter(ActionRegistry.class);
		for (ActionFactory each : OF_THE_PAGE) {
			IAction action = registry == null ? null : registry.getAction(each.getId());
			bars.setGlobalActionHandler(each.getId(), action);
		}
		DesignSession session = editor == null ? null : editor.getAdapter(DesignSession.class);
		HistoryAction.install(bars, session == null ? null : session.history());
	}
}
