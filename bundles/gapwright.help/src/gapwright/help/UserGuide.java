package gapwright.help;

import java.io.IOException;
import java.io.InputStream;
import java.net.URL;

import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;

import org.eclipse.core.runtime.FileLocator;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.program.Program;
import org.eclipse.swt.widgets.Shell;
import org.osgi.framework.FrameworkUtil;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.SAXException;

/** The pages of the guide, shown by whatever the system shows web pages with. */
public final class UserGuide {

	private static final String TITLE = "Gapwright user guide";
	private static final String FOLDER = "/html/";
	private static final String FIRST = "index.html";
	private static final String CONTEXTS = "/contexts.xml";
	private static final String PLUGIN = "gapwright.help.";

	private UserGuide() {
	}

	/**
	 * Shows a page; says where the pages lie when the system has nothing to show them with.
	 *
	 * @param page its file name, or null for the first
	 */
	public static void open(String page, Shell shell) {
		try {
			URL folder = folder();
			String name = page == null ? FIRST : page;
			URL url = new URL(folder, name);
			if (!Program.launch(url.toString())) {
				MessageDialog.openInformation(shell, TITLE, "There is no web browser to show the user guide with."
						+ " Its pages lie in\n\n" + folder.getPath() + "\n\nWhat you look for is in " + name + ".");
			}
		} catch (IOException e) {
			MessageDialog.openError(shell, TITLE, "The user guide cannot be opened: " + e.getMessage());
		}
	}

	/**
	 * @param contextId for example "gapwright.help.canvas"
	 * @return file name of the page that the context help names first, or null when there is none
	 */
	public static String pageAbout(String contextId) {
		try (InputStream contexts = FrameworkUtil.getBundle(UserGuide.class).getEntry(CONTEXTS).openStream()) {
			NodeList all = DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(contexts)
					.getElementsByTagName("context");
			for (int i = 0; i < all.getLength(); i++) {
				Element context = (Element) all.item(i);
				if (contextId.equals(PLUGIN + context.getAttribute("id"))) {
					Element topic = (Element) context.getElementsByTagName("topic").item(0);
					return topic == null ? null : topic.getAttribute("href").replace(FOLDER.substring(1), "");
				}
			}
			return null;
		} catch (IOException | SAXException | ParserConfigurationException e) {
			throw new IllegalStateException("the context help of this installation is damaged", e);
		}
	}

	/** @return where the pages lie as files; all are unpacked, so that their links lead somewhere */
	private static URL folder() throws IOException {
		URL folder = FrameworkUtil.getBundle(UserGuide.class).getEntry(FOLDER);
		if (folder == null) {
			throw new IOException("its pages are missing from the installation");
		}
		return FileLocator.toFileURL(folder);
	}
}
