package gapwright.ui.editor;

import java.util.Arrays;

import org.eclipse.core.resources.IProject;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.ILog;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Platform;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.swt.widgets.Display;
import org.eclipse.ui.IStartup;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.ide.IDE;

import gapwright.library.Examples;

/** Started with {@code -gapwright.examples}, makes the example project and opens its first design. */
public final class OpenExamples implements IStartup {

	private static final String ARGUMENT = "-gapwright.examples";

	@Override
	public void earlyStartup() {
		if (!Arrays.asList(Platform.getApplicationArgs()).contains(ARGUMENT)) {
			return;
		}
		Job.create("Opening the example designs", monitor -> {
			try {
				boolean first = !ExampleProject.exists();
				IProject project = ExampleProject.create(monitor);
				PlatformUI.getWorkbench().getDisplay().asyncExec(() -> open(project, first));
				return Status.OK_STATUS;
			} catch (CoreException e) {
				return e.getStatus();
			}
		}).schedule();
	}

	/** @param first whether the window has never been sized by its user */
	private static void open(IProject project, boolean first) {
		IWorkbenchWindow window = PlatformUI.getWorkbench().getActiveWorkbenchWindow();
		if (window == null) {
			// the window is not in front yet; the loop comes round again
			Display.getCurrent().timerExec(100, () -> open(project, first));
			return;
		}
		if (first) {
			window.getShell().setMaximized(true);
		}
		try {
			IDE.openEditor(window.getActivePage(), project.getFile(Examples.all().get(0).fileName()), true);
		} catch (PartInitException e) {
			ILog.get().log(new Status(IStatus.ERROR, "gapwright.ui", "The first example cannot be opened.", e));
		}
	}
}
