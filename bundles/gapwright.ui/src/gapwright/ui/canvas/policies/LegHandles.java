package gapwright.ui.canvas.policies;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.gef.Handle;
import org.eclipse.gef.editpolicies.SelectionHandlesEditPolicy;

import gapwright.ui.canvas.parts.LegPart;

/** Handles of a selected leg: one at either end to re-attach it, one on either wall to change its width. */
public final class LegHandles extends SelectionHandlesEditPolicy {

	@Override
	protected List<Handle> createSelectionHandles() {
		LegPart part = (LegPart) getHost();
		List<Handle> handles = new ArrayList<>();
		for (LegHandle.Place place : LegHandle.Place.values()) {
			handles.add(new LegHandle(part, place));
		}
		return handles;
	}
}
