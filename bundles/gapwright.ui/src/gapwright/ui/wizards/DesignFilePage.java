package gapwright.ui.wizards;

import java.io.ByteArrayInputStream;
import java.io.InputStream;
import java.util.Locale;

import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.ui.dialogs.WizardNewFileCreationPage;

/** Last page: where the file goes and what it is called. */
final class DesignFilePage extends WizardNewFileCreationPage {

	private static final String EXTENSION = "gapwright";

	private String suggestion = "";
	private byte[] content = {};

	DesignFilePage(IStructuredSelection selection) {
		super("file", selection);
		setTitle("File");
		setDescription("Choose a project or folder and a name. The design is saved as one file.");
		setFileExtension(EXTENSION);
	}

	/** Proposes a name after what the design starts from, unless somebody typed another. */
	void suggest(String title) {
		if (getFileName() == null || getFileName().isEmpty() || getFileName().equals(suggestion)) {
			suggestion = title.toLowerCase(Locale.ROOT).replaceAll("[^\\p{L}\\p{N}]+", "-").replaceAll("^-|-$", "") + '.' + EXTENSION;
			setFileName(suggestion);
		}
	}

	/** Name of the design: that of the file, in words. */
	String designName() {
		String words = getFileName().replaceFirst("\\." + EXTENSION + "$", "").replace('-', ' ').strip();
		return words.substring(0, 1).toUpperCase(Locale.ROOT) + words.substring(1);
	}

	void content(byte[] bytes) {
		content = bytes;
	}

	@Override
	protected InputStream getInitialContents() {
		return new ByteArrayInputStream(content);
	}

	@Override
	protected boolean validatePage() {
		if (ResourcesPlugin.getWorkspace().getRoot().getProjects().length == 0) {
			setErrorMessage("There is no project yet to hold the file. Make one first: File, New, Project.");
			return false;
		}
		return super.validatePage();
	}
}
