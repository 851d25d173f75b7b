package gapwright.ui.canvas.tools;

import org.eclipse.draw2d.Cursors;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.gef.EditPart;
import org.eclipse.swt.graphics.Cursor;

import gapwright.model.Coil;
import gapwright.model.Gap;
import gapwright.model.Leg;
import gapwright.model.Magnet;
import gapwright.ui.canvas.CanvasModel;
import gapwright.ui.canvas.Additions;
import gapwright.ui.canvas.scene.Bar;
import gapwright.ui.canvas.scene.Scene;

/** Adds a gap, a magnet or a coil to the leg it is clicked on, at that place. */
public final class OnLegTool extends CanvasTool {

	private final Additions.Kind kind;

	public OnLegTool(CanvasModel canvas, Additions.Kind kind) {
		super(canvas);
		this.kind = kind;
	}

	@Override
	protected boolean handleButtonDown(int button) {
		Leg leg = legUnderPointer();
		if (button == 1 && leg != null) {
			double[] at = millimetres();
			Bar bar = new Scene(canvas.session().design()).bar(leg);
			double position = bar == null ? 0.5 : Math.round(bar.fraction(at[0], at[1]) * 100) / 100.0;
			EObject[] added = new EObject[1];
			run(Additions.onLeg(kind, canvas.session(), leg, position, made -> added[0] = made), added);
		}
		return true;
	}

	private Leg legUnderPointer() {
		EditPart part = getCurrentViewer().findObjectAt(getLocation());
		Object model = part == null ? null : part.getModel();
		if (model instanceof Leg leg) {
			return leg;
		}
		if (model instanceof Coil coil) {
			return coil.getLeg();
		}
		return model instanceof Gap || model instanceof Magnet ? (Leg) ((EObject) model).eContainer() : null;
	}

	@Override
	protected Cursor calculateCursor() {
		return getCurrentViewer() == null || legUnderPointer() != null ? Cursors.CROSS : Cursors.NO;
	}

	@Override
	protected boolean handleMove() {
		refreshCursor();
		return true;
	}
}
