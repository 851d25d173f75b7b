package gapwright.ui.canvas.parts;

import org.eclipse.gef.EditPolicy;

import gapwright.model.Leg;
import gapwright.ui.canvas.CanvasModel;
import gapwright.ui.canvas.looks.LegLook;
import gapwright.ui.canvas.policies.LegHandles;

/** A leg: beside what every element has, handles for its ends and its width. */
public final class LegPart extends ElementPart {

	public LegPart(CanvasModel canvas, Leg leg) {
		super(canvas, leg);
	}

	public Leg leg() {
		return (Leg) getModel();
	}

	/** @return null while it has no place */
	public LegLook look() {
		return (LegLook) ((LookFigure) getFigure()).look();
	}

	@Override
	protected void createEditPolicies() {
		super.createEditPolicies();
		installEditPolicy(EditPolicy.PRIMARY_DRAG_ROLE, new LegHandles());
	}
}
