package gapwright.workspace.tests;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.IWorkspaceDescription;
import org.eclipse.core.resources.IncrementalProjectBuilder;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.CoreException;

import gapwright.library.Examples;
import gapwright.workspace.DesignNature;
import gapwright.workspace.FindingMarkers;

/** A project of the workspace with designs in it, built only when a test says so. */
final class Station {

	/** The full load of the boost choke drives its centre leg near saturation at 14 A. */
	static final String BOOST = "boost-choke.gapwright";

	final IProject project;

	Station(String name) throws CoreException {
		IWorkspaceDescription description = ResourcesPlugin.getWorkspace().getDescription();
		description.setAutoBuilding(false);
		ResourcesPlugin.getWorkspace().setDescription(description);
		project = ResourcesPlugin.getWorkspace().getRoot().getProject(name);
		project.create(null);
		project.open(null);
		DesignNature.addTo(project, null);
		build();
	}

	static String example(String fileName) throws IOException {
		try (InputStream content = Examples.all().stream().filter(e -> e.fileName().equals(fileName)).findFirst().orElseThrow().open()) {
			return new String(content.readAllBytes(), StandardCharsets.UTF_8);
		}
	}

	/** The same choke with so little current that every leg is within. */
	static String calmBoost() throws IOException {
		String calm = example(BOOST).replace("current=\"14 A\"", "current=\"2 A\"");
		if (calm.equals(example(BOOST))) {
			throw new IllegalStateException("the example has no drive of 14 A any more");
		}
		return calm;
	}

	IFile write(String name, String text) throws CoreException {
		IFile file = project.getFile(name);
		InputStream content = new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8));
		if (file.exists()) {
			file.setContents(content, IResource.FORCE, null);
		} else {
			file.create(content, true, null);
		}
		return file;
	}

	void build() throws CoreException {
		project.build(IncrementalProjectBuilder.INCREMENTAL_BUILD, null);
	}

	static List<IMarker> markers(IResource resource) throws CoreException {
		return List.of(resource.findMarkers(FindingMarkers.TYPE, false, IResource.DEPTH_INFINITE));
	}

	/** What the markers say, sorted. */
	static List<String> messages(IResource resource) throws CoreException {
		List<String> messages = new ArrayList<>();
		for (IMarker marker : markers(resource)) {
			messages.add(marker.getAttribute(IMarker.MESSAGE, ""));
		}
		messages.sort(null);
		return messages;
	}

	static IMarker only(IResource resource, String code) throws CoreException {
		List<IMarker> found = markers(resource).stream().filter(m -> m.getAttribute(FindingMarkers.CODE, "").equals(code)).toList();
		if (found.size() != 1) {
			throw new AssertionError(found.size() + " markers with code " + code + "; all say " + messages(resource));
		}
		return found.get(0);
	}

	void delete() throws CoreException {
		project.delete(true, true, null);
	}
}
