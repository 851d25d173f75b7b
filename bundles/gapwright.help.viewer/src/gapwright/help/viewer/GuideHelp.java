package gapwright.help.viewer;

import org.eclipse.help.IContext;
import org.eclipse.help.IHelpResource;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Display;
import org.eclipse.ui.help.AbstractHelpUI;

import gapwright.help.UserGuide;

/** Help of the standalone product: F1 opens the page of the guide about what has the focus. */
public final class GuideHelp extends AbstractHelpUI {

	private static final String PAGES = "/gapwright.help/html/";
	/** Where the workbench keeps a control's context id. */
	private static final String HELP_KEY = "org.eclipse.ui.help";

	@Override
	public void displayHelp() {
		show(null);
	}

	@Override
	public void displaySearch() {
		show(null);
	}

	/** The menu's "Show Context Help": the page about what has the focus, or about the nearest around it that has one. */
	@Override
	public void displayDynamicHelp() {
		String page = null;
		Control control = Display.getCurrent().getFocusControl();
		for (; control != null && page == null; control = control.getParent()) {
			page = control.getData(HELP_KEY) instanceof String id ? UserGuide.pageAbout(id) : null;
		}
		show(page);
	}

	@Override
	public void displayContext(IContext context, int x, int y) {
		IHelpResource[] topics = context == null ? new IHelpResource[0] : context.getRelatedTopics();
		show(topics.length == 0 ? null : page(topics[0].getHref()));
	}

	@Override
	public void displayHelpResource(String address) {
		show(page(address));
	}

	@Override
	public boolean isContextHelpDisplayed() {
		return false;
	}

	/** @return the page's file name, or null when it is none of ours */
	private static String page(String address) {
		return address != null && address.startsWith(PAGES) ? address.substring(PAGES.length()) : null;
	}

	private static void show(String page) {
		UserGuide.open(page, Display.getCurrent().getActiveShell());
	}
}
