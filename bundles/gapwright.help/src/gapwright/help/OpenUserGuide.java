package gapwright.help;

import java.io.IOException;
import java.net.URL;

import org.eclipse.core.commands.AbstractHandler;
import org.eclipse.core.commands.ExecutionEvent;
import org.eclipse.core.commands.ExecutionException;
import org.eclipse.core.runtime.FileLocator;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.PlatformUI;
import org.osgi.framework.FrameworkUtil;

/** Opens the guide in the system's browser; the optional parameter {@code page} names one of its pages. */
public final class OpenUserGuide extends AbstractHandler {

	private static final String FOLDER = "/html/";

	@Override
	public Object execute(ExecutionEvent event) throws ExecutionException {
		String page = event.getParameter("page");
		try {
			URL url = guide(page == null ? "index.html" : page);
			PlatformUI.getWorkbench().getBrowserSupport().getExternalBrowser().openURL(url);
		} catch (IOException | PartInitException e) {
			throw new ExecutionException("The user guide cannot be opened: " + e.getMessage(), e);
		}
		return null;
	}

	/** @return where the page lies as a file; the whole folder is unpacked, so that its links lead somewhere */
	static URL guide(String page) throws IOException {
		URL folder = FrameworkUtil.getBundle(OpenUserGuide.class).getEntry(FOLDER);
		if (folder == null) {
			throw new IOException("its pages are missing from the installation");
		}
		return new URL(FileLocator.toFileURL(folder), page);
	}
}
