package gapwright.workspace;

import java.util.Arrays;
import java.util.stream.Stream;

import org.eclipse.core.resources.ICommand;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IProjectDescription;
import org.eclipse.core.resources.IProjectNature;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IProgressMonitor;

/** A project whose designs are checked whenever it is built. */
public final class DesignNature implements IProjectNature {

	/** Id of the nature. */
	public static final String ID = "gapwright.workspace.nature";

	private IProject project;

	/** @return false also for a closed project */
	public static boolean isOn(IProject project) throws CoreException {
		return project.isOpen() && project.hasNature(ID);
	}

	/** Other natures stay; does nothing where it is on already. */
	public static void addTo(IProject project, IProgressMonitor monitor) throws CoreException {
		if (!isOn(project)) {
			IProjectDescription description = project.getDescription();
			description.setNatureIds(Stream.concat(Arrays.stream(description.getNatureIds()), Stream.of(ID)).toArray(String[]::new));
			project.setDescription(description, monitor);
		}
	}

	/** Takes the markers along; other natures stay. */
	public static void removeFrom(IProject project, IProgressMonitor monitor) throws CoreException {
		IProjectDescription description = project.getDescription();
		description.setNatureIds(Arrays.stream(description.getNatureIds()).filter(id -> !id.equals(ID)).toArray(String[]::new));
		project.setDescription(description, monitor);
	}

	@Override
	public void configure() throws CoreException {
		IProjectDescription description = project.getDescription();
		ICommand[] commands = description.getBuildSpec();
		if (Arrays.stream(commands).noneMatch(DesignNature::isOurs)) {
			ICommand command = description.newCommand();
			command.setBuilderName(DesignBuilder.ID);
			description.setBuildSpec(Stream.concat(Arrays.stream(commands), Stream.of(command)).toArray(ICommand[]::new));
			project.setDescription(description, null);
		}
	}

	@Override
	public void deconfigure() throws CoreException {
		IProjectDescription description = project.getDescription();
		description.setBuildSpec(Arrays.stream(description.getBuildSpec()).filter(c -> !isOurs(c)).toArray(ICommand[]::new));
		project.setDescription(description, null);
		FindingMarkers.clear(project);
	}

	private static boolean isOurs(ICommand command) {
		return command.getBuilderName().equals(DesignBuilder.ID);
	}

	@Override
	public IProject getProject() {
		return project;
	}

	@Override
	public void setProject(IProject next) {
		project = next;
	}
}
