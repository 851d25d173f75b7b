package gapwright.ui.canvas.scene;

import gapwright.model.Leg;

/**
 * A leg as drawn, in millimetres: from its first joint along a unit vector. At either end the outline is cut so that
 * bars meet as iron does.
 *
 * @param leg        the leg
 * @param x          of the first joint
 * @param y          of the first joint
 * @param ux         unit vector towards the second joint
 * @param uy         unit vector towards the second joint
 * @param length     joint to joint
 * @param width      across
 * @param startLeft  where the outline begins along the axis on the side of the normal (-uy, ux)
 * @param startRight on the other side
 * @param endLeft    where it ends along the axis
 * @param endRight   on the other side
 */
public record Bar(Leg leg, double x, double y, double ux, double uy, double length, double width, double startLeft,
		double startRight, double endLeft, double endRight) {

	/** @return a point on the page: s along the axis, t along the normal */
	public double[] at(double s, double t) {
		return new double[] { x + s * ux - t * uy, y + s * uy + t * ux };
	}

	/** @return where the visible part begins on the axis */
	public double start() {
		return (startLeft + startRight) / 2;
	}

	/** @return where the visible part ends on the axis */
	public double end() {
		return (endLeft + endRight) / 2;
	}

	/** @return the outline of the middle share of the bar's width, x, y, x, y … */
	public double[] outline(double share) {
		double half = share * width / 2;
		return strip(-half, half);
	}

	/** @return the part of the bar between two offsets along the normal */
	public double[] strip(double low, double high) {
		double[] a = at(cut(startLeft, startRight, high), high);
		double[] b = at(cut(endLeft, endRight, high), high);
		double[] c = at(cut(endLeft, endRight, low), low);
		double[] d = at(cut(startLeft, startRight, low), low);
		return new double[] { a[0], a[1], b[0], b[1], c[0], c[1], d[0], d[1] };
	}

	/** @return a rectangle across the axis: from s1 to s2, t1 to t2 */
	public double[] block(double s1, double s2, double t1, double t2) {
		double[] a = at(s1, t1);
		double[] b = at(s2, t1);
		double[] c = at(s2, t2);
		double[] d = at(s1, t2);
		return new double[] { a[0], a[1], b[0], b[1], c[0], c[1], d[0], d[1] };
	}

	private double cut(double left, double right, double t) {
		return (left + right) / 2 + (left - right) * t / width;
	}

	/** @return where along the axis a point of the page lies, as a fraction of the length, kept to 0 … 1 */
	public double fraction(double px, double py) {
		double s = (px - x) * ux + (py - y) * uy;
		return length == 0 ? 0.5 : Math.max(0, Math.min(1, s / length));
	}
}
