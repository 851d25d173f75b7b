package gapwright.workspace;

import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import java.util.concurrent.CancellationException;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.OperationCanceledException;
import org.eclipse.core.runtime.SubMonitor;

import gapwright.model.Design;
import gapwright.model.DesignReader;
import gapwright.model.UnreadableDesignException;
import gapwright.study.Lowering;
import gapwright.study.Study;

/** Checks one design file of the workspace and marks what was found in it. */
public final class DesignFileCheck {

	private DesignFileCheck() {
	}

	/**
	 * Replaces the file's markers by those of its present content on disk.
	 *
	 * @param monitor may be null
	 * @throws OperationCanceledException when the monitor was cancelled; the markers are then as before
	 * @throws CoreException              when the markers cannot be written
	 */
	public static void check(IFile file, IProgressMonitor monitor) throws CoreException {
		FindingMarkers.replace(file, find(file, SubMonitor.convert(monitor)));
	}

	private static List<MarkerText> find(IFile file, SubMonitor monitor) {
		try (InputStream content = file.getContents(true)) {
			Design design = DesignReader.read(content, file.getName());
			return Study.run(Lowering.of(design), monitor::isCanceled).findings().stream().map(MarkerText::of).toList();
		} catch (UnreadableDesignException e) {
			return e.problems().stream().map(MarkerText::of).toList();
		} catch (CoreException | IOException e) {
			return List.of(MarkerText.unreadable(file.getName(), e));
		} catch (CancellationException e) {
			throw new OperationCanceledException();
		}
	}
}
