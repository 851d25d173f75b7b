package gapwright.ui.canvas.parts;

import org.eclipse.gef.EditPolicy;

import gapwright.model.AirPath;
import gapwright.ui.canvas.CanvasModel;
import gapwright.ui.canvas.looks.AirPathLook;
import gapwright.ui.canvas.policies.AirPathHandles;

/** An air path: beside what every element has, handles for its ends. */
public final class AirPathPart extends ElementPart {

	public AirPathPart(CanvasModel canvas, AirPath path) {
		super(canvas, path);
	}

	/** @return null while it has no place */
	public AirPathLook look() {
		return (AirPathLook) ((LookFigure) getFigure()).look();
	}

	@Override
	protected void createEditPolicies() {
		super.createEditPolicies();
		installEditPolicy(EditPolicy.PRIMARY_DRAG_ROLE, new AirPathHandles());
	}
}
