package gapwright.ui.canvas.policies;

import java.util.List;

import org.eclipse.gef.Handle;
import org.eclipse.gef.editpolicies.SelectionHandlesEditPolicy;

import gapwright.ui.canvas.parts.AirPathPart;

/** Handles of a selected air path: one at either end to re-attach it. */
public final class AirPathHandles extends SelectionHandlesEditPolicy {

	@Override
	protected List<Handle> createSelectionHandles() {
		AirPathPart part = (AirPathPart) getHost();
		return List.of(new AirPathHandle(part, true), new AirPathHandle(part, false));
	}
}
