package gapwright.ui.canvas.tools;

import java.util.List;

import org.eclipse.draw2d.Graphics;
import org.eclipse.draw2d.Polyline;
import org.eclipse.draw2d.geometry.Point;
import org.eclipse.emf.ecore.EObject;

import gapwright.model.Design;
import gapwright.model.Joint;
import gapwright.model.edit.JointSpot;
import gapwright.model.edit.LegEdits;
import gapwright.model.edit.history.Edit;
import gapwright.ui.canvas.CanvasModel;
import gapwright.ui.canvas.scene.Scene;
import gapwright.ui.fields.ThemeColours;

/**
 * Adds a leg or an air path from where the button goes down to where it comes up; a joint is made at an end where there
 * is none. A click at either end does as well as a drag.
 */
public final class BetweenTool extends CanvasTool {

	private final boolean air;
	private JointSpot from;
	private Polyline line;

	/** @param air true for air paths, false for legs */
	public BetweenTool(CanvasModel canvas, boolean air) {
		super(canvas);
		this.air = air;
	}

	@Override
	protected boolean handleButtonDown(int button) {
		if (button != 1) {
			return true;
		}
		if (from == null) {
			from = spot(List.of());
			setState(STATE_DRAG);
		} else {
			finish();
		}
		return true;
	}

	@Override
	protected boolean handleButtonUp(int button) {
		if (from != null && movedPastThreshold()) {
			finish();
		}
		return true;
	}

	@Override
	protected boolean handleMove() {
		return feedback();
	}

	@Override
	protected boolean handleDrag() {
		return feedback();
	}

	private JointSpot spot(List<Joint> except) {
		double[] at = millimetres();
		return Spots.at(at[0], at[1], canvas, except, isSnappingOff());
	}

	private boolean feedback() {
		if (from == null) {
			return true;
		}
		if (line == null) {
			line = new Polyline();
			line.setLineWidth(3);
			line.setLineStyle(air ? Graphics.LINE_DASH : Graphics.LINE_SOLID);
			line.setForegroundColor(ThemeColours.SELECTION.get());
			addFeedback(line);
		}
		line.removeAllPoints();
		line.addPoint(pixel(from));
		line.addPoint(pixel(spot(List.of())));
		return true;
	}

	private Point pixel(JointSpot spot) {
		double x = spot.joint() == null ? spot.x() : Scene.x(spot.joint());
		double y = spot.joint() == null ? spot.y() : Scene.y(spot.joint());
		return new Point((int) Math.round(canvas.scale().pixels(x)), (int) Math.round(canvas.scale().pixels(y)));
	}

	private void finish() {
		JointSpot start = from;
		JointSpot to = spot(List.of());
		boolean same = to.joint() != null && to.joint() == start.joint()
				|| to.joint() == null && start.joint() == null && to.x() == start.x() && to.y() == start.y();
		if (same) {
			return;
		}
		drop();
		Design design = canvas.session().design();
		EObject[] added = new EObject[1];
		Edit edit = air ? LegEdits.addAirPath(design, start, to, path -> added[0] = path)
				: LegEdits.add(design, start, to, leg -> added[0] = leg);
		run(edit, added);
	}

	private void drop() {
		from = null;
		if (line != null) {
			removeFeedback(line);
			line = null;
		}
	}

	@Override
	public void deactivate() {
		drop();
		super.deactivate();
	}
}
