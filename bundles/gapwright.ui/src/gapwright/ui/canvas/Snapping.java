package gapwright.ui.canvas;

import java.util.Collection;

import gapwright.model.Design;
import gapwright.model.Joint;
import gapwright.ui.canvas.scene.Scene;

/** Pulls a place on the page to the line of another joint, else to the grid. Millimetres. */
public final class Snapping {

	/** Pixels from which another joint's line pulls. */
	private static final double REACH = 6;

	private Snapping() {
	}

	/**
	 * @param except joints that are moved themselves and do not pull
	 * @param off    whether the user holds snapping off
	 * @return x and y
	 */
	public static double[] snap(double x, double y, Design design, CanvasScale scale, Collection<Joint> except,
			boolean off) {
		if (off) {
			return new double[] { x, y };
		}
		double step = step(scale);
		double[] found = { Math.round(x / step) * step, Math.round(y / step) * step };
		double bestX = scale.millimetres(REACH);
		double bestY = bestX;
		for (Joint joint : design.getJoints()) {
			if (except.contains(joint)) {
				continue;
			}
			double dx = Math.abs(Scene.x(joint) - x);
			double dy = Math.abs(Scene.y(joint) - y);
			if (dx < bestX) {
				bestX = dx;
				found[0] = Scene.x(joint);
			}
			if (dy < bestY) {
				bestY = dy;
				found[1] = Scene.y(joint);
			}
		}
		return found;
	}

	/** @return distance of places that a joint snaps to, mm */
	public static double step(CanvasScale scale) {
		return Math.min(scale.gridMillimetres(), 1);
	}
}
