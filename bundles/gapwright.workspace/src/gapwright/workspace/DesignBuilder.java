package gapwright.workspace;

import java.util.Map;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResourceDelta;
import org.eclipse.core.resources.IncrementalProjectBuilder;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.OperationCanceledException;
import org.eclipse.core.runtime.SubMonitor;
import org.eclipse.core.runtime.jobs.ISchedulingRule;

/** Checks the designs that have changed, or all of them, and marks what was found. */
public final class DesignBuilder extends IncrementalProjectBuilder {

	/** Id of the builder. */
	public static final String ID = "gapwright.workspace.builder";

	@Override
	protected IProject[] build(int kind, Map<String, String> arguments, IProgressMonitor monitor) throws CoreException {
		DesignsToCheck designs = new DesignsToCheck();
		IResourceDelta delta = kind == FULL_BUILD ? null : getDelta(getProject());
		if (delta == null) {
			getProject().accept(designs);
		} else {
			delta.accept(designs);
		}
		SubMonitor progress = SubMonitor.convert(monitor, designs.files().size());
		try {
			for (IFile file : designs.files()) {
				progress.subTask("Checking " + file.getFullPath().makeRelative());
				DesignFileCheck.check(file, progress.split(1));
			}
		} catch (OperationCanceledException e) {
			// some of the changed files were not looked at, and the delta is gone
			forgetLastBuiltState();
			throw e;
		}
		return new IProject[0];
	}

	@Override
	protected void clean(IProgressMonitor monitor) throws CoreException {
		FindingMarkers.clear(getProject());
	}

	/** Nothing outside the project is read or marked, so other projects need not wait. */
	@Override
	public ISchedulingRule getRule(int kind, Map<String, String> arguments) {
		return getProject();
	}
}
