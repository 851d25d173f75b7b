package gapwright.install.reader;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.Platform;
import org.eclipse.swt.widgets.Display;
import org.eclipse.ui.IStartup;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.ide.IDE;

/**
 * Looks over the shoulder of a workbench that somebody else started: waits for what it was asked for, writes when and
 * what it saw, and ends the workbench. Knows nothing of the editor but that it answers a screen reader.
 * <p>
 * Arguments: {@code -reader.answer FILE} where to write; {@code -reader.open FILE} a file to open first, with whatever
 * editor the workbench has for it; {@code -reader.canvas} wait for a drawing that says how full something is, else only
 * for the window.
 */
public final class Reader implements IStartup {

	private static final int PERIOD = 20;

	private Path answer;
	private String toOpen;
	private boolean canvas;

	@Override
	public void earlyStartup() {
		String place = argument("-reader.answer");
		if (place != null) {
			answer = Path.of(place);
			toOpen = argument("-reader.open");
			canvas = List.of(Platform.getApplicationArgs()).contains("-reader.canvas");
			PlatformUI.getWorkbench().getDisplay().asyncExec(this::begin);
		}
	}

	private static String argument(String name) {
		List<String> arguments = List.of(Platform.getApplicationArgs());
		int at = arguments.indexOf(name);
		return at < 0 ? null : arguments.get(at + 1);
	}

	private void begin() {
		if (page() == null) {
			later(this::begin);
			return;
		}
		try {
			if (toOpen != null) {
				IDE.openEditor(page(), copy(Path.of(toOpen)), true);
			}
		} catch (CoreException | IOException e) {
			end(List.of("cannot open: " + e));
			return;
		}
		look();
	}

	private static IWorkbenchPage page() {
		IWorkbenchWindow window = PlatformUI.getWorkbench().getActiveWorkbenchWindow();
		return window == null || !window.getShell().isVisible() ? null : window.getActivePage();
	}

	private static IFile copy(Path file) throws CoreException, IOException {
		IProject project = ResourcesPlugin.getWorkspace().getRoot().getProject("reader");
		if (!project.exists()) {
			project.create(null);
		}
		project.open(null);
		IFile copy = project.getFile(file.getFileName().toString());
		if (!copy.exists()) {
			try (InputStream content = Files.newInputStream(file)) {
				copy.create(content, true, null);
			}
		}
		return copy;
	}

	private void look() {
		List<String> seen = canvas ? Canvas.read(page()) : List.of("window " + page().getWorkbenchWindow().getShell().getText());
		if (seen.isEmpty()) {
			later(this::look);
		} else {
			// once more through the loop, so that what was read has also been painted
			Display.getCurrent().update();
			end(seen);
		}
	}

	private static void later(Runnable step) {
		Display.getCurrent().timerExec(PERIOD, step);
	}

	private void end(List<String> seen) {
		try {
			Files.writeString(answer, System.currentTimeMillis() + "\n" + String.join("\n", seen) + "\n");
			Picture.of(PlatformUI.getWorkbench().getActiveWorkbenchWindow().getShell(), answer.resolveSibling(answer.getFileName() + ".png"));
		} catch (IOException e) {
			throw new IllegalStateException(e);
		} finally {
			PlatformUI.getWorkbench().close();
		}
	}
}
