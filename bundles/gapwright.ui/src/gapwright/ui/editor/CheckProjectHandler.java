package gapwright.ui.editor;

import org.eclipse.core.commands.AbstractHandler;
import org.eclipse.core.commands.ExecutionEvent;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.runtime.Adapters;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.ui.handlers.HandlerUtil;

import gapwright.workspace.DesignNature;

/** Switches the checks at every build on or off for the selected projects. */
public final class CheckProjectHandler extends AbstractHandler {

	private static final String ON = "gapwright.ui.checkDesigns";

	@Override
	public Object execute(ExecutionEvent event) {
		boolean on = event.getCommand().getId().equals(ON);
		for (Object selected : HandlerUtil.getCurrentStructuredSelection(event)) {
			IResource resource = Adapters.adapt(selected, IResource.class);
			if (resource != null) {
				change(resource.getProject(), on);
			}
		}
		return null;
	}

	private static void change(IProject project, boolean on) {
		Job job = Job.create(on ? "Switching the checks of designs on" : "Switching the checks of designs off", monitor -> {
			if (on) {
				DesignNature.addTo(project, monitor);
			} else {
				DesignNature.removeFrom(project, monitor);
			}
		});
		job.setRule(project.getWorkspace().getRoot());
		job.schedule();
	}
}
