package gapwright.ui.canvas.parts;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.gef.EditPart;
import org.eclipse.gef.EditPartFactory;

import gapwright.model.AirPath;
import gapwright.model.Design;
import gapwright.model.Leg;
import gapwright.ui.canvas.CanvasModel;

/** Makes the edit part of an element. */
public final class CanvasPartFactory implements EditPartFactory {

	private final CanvasModel canvas;

	public CanvasPartFactory(CanvasModel canvas) {
		this.canvas = canvas;
	}

	@Override
	public EditPart createEditPart(EditPart context, Object model) {
		if (model instanceof Design) {
			return new DesignPart(canvas);
		}
		if (model instanceof AirPath path) {
			return new AirPathPart(canvas, path);
		}
		return model instanceof Leg leg ? new LegPart(canvas, leg) : new ElementPart(canvas, (EObject) model);
	}
}
