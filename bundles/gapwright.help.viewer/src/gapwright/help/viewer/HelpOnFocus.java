package gapwright.help.viewer;

import org.eclipse.core.commands.AbstractHandler;
import org.eclipse.core.commands.ExecutionEvent;
import org.eclipse.ui.PlatformUI;

/** F1: not every window system turns that key into a request for help by itself. */
public final class HelpOnFocus extends AbstractHandler {

	@Override
	public Object execute(ExecutionEvent event) {
		PlatformUI.getWorkbench().getHelpSystem().displayDynamicHelp();
		return null;
	}
}
