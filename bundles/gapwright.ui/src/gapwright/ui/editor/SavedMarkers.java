package gapwright.ui.editor;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.runtime.jobs.Job;

import gapwright.workspace.DesignFileCheck;
import gapwright.workspace.DesignNature;

/** Markers of a design that was just saved, where no build will make them. */
final class SavedMarkers {

	private SavedMarkers() {
	}

	static void follow(IFile file) {
		Job job = Job.create("Checking " + file.getName(), monitor -> {
			if (!(file.getWorkspace().isAutoBuilding() && DesignNature.isOn(file.getProject()))) {
				DesignFileCheck.check(file, monitor);
			}
		});
		job.setPriority(Job.DECORATE);
		job.schedule();
	}
}
