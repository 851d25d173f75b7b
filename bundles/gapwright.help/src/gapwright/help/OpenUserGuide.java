package gapwright.help;

import org.eclipse.core.commands.AbstractHandler;
import org.eclipse.core.commands.ExecutionEvent;
import org.eclipse.ui.handlers.HandlerUtil;

/** Opens the guide; the optional parameter {@code page} names one of its pages. */
public final class OpenUserGuide extends AbstractHandler {

	@Override
	public Object execute(ExecutionEvent event) {
		UserGuide.open(event.getParameter("page"), HandlerUtil.getActiveShell(event));
		return null;
	}
}
