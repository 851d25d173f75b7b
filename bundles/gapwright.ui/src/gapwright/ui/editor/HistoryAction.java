package gapwright.ui.editor;

import org.eclipse.jface.action.Action;
import org.eclipse.ui.IActionBars;
import org.eclipse.ui.ISharedImages;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.actions.ActionFactory;

import gapwright.model.edit.history.EditHistory;

/** Undo or redo of the design's one history, with the step's name in the menu. */
public final class HistoryAction extends Action {

	private final EditHistory history;
	private final boolean undo;
	private final Runnable listener = this::refresh;

	private HistoryAction(EditHistory history, boolean undo) {
		this.history = history;
		this.undo = undo;
		ISharedImages images = PlatformUI.getWorkbench().getSharedImages();
		setId((undo ? ActionFactory.UNDO : ActionFactory.REDO).getId());
		setActionDefinitionId((undo ? ActionFactory.UNDO : ActionFactory.REDO).getCommandId());
		setImageDescriptor(images.getImageDescriptor(undo ? ISharedImages.IMG_TOOL_UNDO : ISharedImages.IMG_TOOL_REDO));
		history.addListener(listener);
		refresh();
	}

	/** Makes undo and redo of a part act on a history; null leaves nothing to undo there. */
	public static void install(IActionBars bars, EditHistory history) {
		install(bars, ActionFactory.UNDO, history == null ? null : new HistoryAction(history, true));
		install(bars, ActionFactory.REDO, history == null ? null : new HistoryAction(history, false));
		bars.updateActionBars();
	}

	private static void install(IActionBars bars, ActionFactory which, HistoryAction action) {
		if (bars.getGlobalActionHandler(which.getId()) instanceof HistoryAction former) {
			former.history.removeListener(former.listener);
		}
		bars.setGlobalActionHandler(which.getId(), action);
	}

	private void refresh() {
		String step = undo ? history.undoLabel() : history.redoLabel();
		String verb = undo ? "&Undo" : "&Redo";
		setText(step.isEmpty() ? verb : verb + ' ' + step);
		setToolTipText(step.isEmpty() ? (undo ? "Undo" : "Redo") : (undo ? "Undo: " : "Redo: ") + step);
		setEnabled(undo ? history.canUndo() : history.canRedo());
	}

	@Override
	public void run() {
		if (undo) {
			history.undo();
		} else {
			history.redo();
		}
	}
}
