package gapwright.ui.canvas.policies;

import org.eclipse.gef.editpolicies.SelectionEditPolicy;

import gapwright.ui.canvas.parts.ElementPart;

/** Outlines an element while it is selected. */
public final class MarkSelected extends SelectionEditPolicy {

	@Override
	protected void hideSelection() {
		((ElementPart) getHost()).mark(false);
	}

	@Override
	protected void showSelection() {
		((ElementPart) getHost()).mark(true);
	}
}
