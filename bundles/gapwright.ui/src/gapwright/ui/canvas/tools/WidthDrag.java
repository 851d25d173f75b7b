package gapwright.ui.canvas.tools;

import gapwright.model.Leg;
import gapwright.model.edit.LegEdits;
import gapwright.model.edit.history.Edit;
import gapwright.ui.canvas.Snapping;
import gapwright.ui.canvas.parts.LegPart;
import gapwright.ui.canvas.scene.Bar;
import gapwright.ui.canvas.scene.Scene;

/** Drags a wall of a leg: the leg grows or shrinks to both sides of its axis. */
public final class WidthDrag extends DragEdit {

	private final Leg leg;

	public WidthDrag(LegPart part) {
		super(part, part.canvas());
		leg = part.leg();
	}

	@Override
	Edit edit(double[] from, double[] to) {
		Bar bar = new Scene(canvas.session().design()).bar(leg);
		if (bar == null) {
			return null;
		}
		double across = Math.abs(-(to[0] - bar.x()) * bar.uy() + (to[1] - bar.y()) * bar.ux());
		double step = isSnappingOff() ? 0.01 : Math.min(0.5, Snapping.step(canvas.scale()));
		double width = Math.max(step, Math.round(2 * across / step) * step);
		return LegEdits.widen(leg, width);
	}
}
