package gapwright.ui.canvas.tools;

import java.util.Collection;

import gapwright.model.Joint;
import gapwright.model.edit.JointSpot;
import gapwright.ui.canvas.CanvasModel;
import gapwright.ui.canvas.Snapping;
import gapwright.ui.canvas.scene.Scene;

/** Which joint is meant by a place on the page. */
final class Spots {

	/** Pixels round a joint that mean it. */
	private static final double REACH = 12;

	private Spots() {
	}

	/** @return the joint there, else the place to make one, snapped; mm */
	static JointSpot at(double x, double y, CanvasModel canvas, Collection<Joint> except, boolean snappingOff) {
		double reach = canvas.scale().millimetres(REACH);
		Joint nearest = null;
		for (Joint joint : canvas.session().design().getJoints()) {
			double distance = Math.hypot(Scene.x(joint) - x, Scene.y(joint) - y);
			if (distance <= reach && !except.contains(joint)) {
				reach = distance;
				nearest = joint;
			}
		}
		if (nearest != null) {
			return JointSpot.of(nearest);
		}
		double[] place = Snapping.snap(x, y, canvas.session().design(), canvas.scale(), except, snappingOff);
		return JointSpot.at(place[0], place[1]);
	}
}
