package gapwright.ui.editor;

import java.io.IOException;
import java.io.InputStream;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.Status;

import gapwright.library.Example;
import gapwright.library.Examples;
import gapwright.workspace.DesignNature;

/** A project with a copy of every example design, checked at every build. */
public final class ExampleProject {

	private static final String NAME = "irrigation-station";

	private ExampleProject() {
	}

	static boolean exists() {
		return ResourcesPlugin.getWorkspace().getRoot().getProject(NAME).exists();
	}

	/** Makes the project if there is none, and adds whatever example it lacks; what is there is left as it is. */
	public static IProject create(IProgressMonitor monitor) throws CoreException {
		IProject project = ResourcesPlugin.getWorkspace().getRoot().getProject(NAME);
		if (!project.exists()) {
			project.create(monitor);
		}
		if (!project.isOpen()) {
			project.open(monitor);
		}
		// after a workbench that was killed the files may be on disk and not yet known
		project.refreshLocal(IResource.DEPTH_ONE, monitor);
		for (Example example : Examples.all()) {
			IFile file = project.getFile(example.fileName());
			if (!file.exists()) {
				try (InputStream content = example.open()) {
					file.create(content, false, monitor);
				} catch (IOException e) {
					throw new CoreException(Status.error("The example '" + example.fileName() + "' cannot be read.", e));
				}
			}
		}
		DesignNature.addTo(project, monitor);
		return project;
	}
}
