package gapwright.ui.canvas.scene;

import java.util.List;

/**
 * Where a bar's outline ends at a joint. Where two bars go straight through, the others stop at their wall; at a corner
 * the flatter one covers it; bars that turn gently meet in a mitre.
 */
final class BarEnds {

	/** Another bar at the joint: unit vector away from the joint, and width. */
	record Other(double dx, double dy, double width) {
	}

	/** Offsets along the axis, away from the joint, on the two sides; negative reaches past the joint. */
	record Cut(double left, double right) {

		static final Cut AT_JOINT = new Cut(0, 0);
	}

	/** Cosine beyond which two bars count as one straight line. */
	private static final double STRAIGHT = 0.985;
	/** Cosine of the turn up to which bars meet in a mitre: 60 degrees. */
	private static final double GENTLE = 0.5;

	private BarEnds() {
	}

	/**
	 * @param dx, dy unit vector of the bar, away from the joint
	 * @param width  of the bar
	 */
	static Cut cut(double dx, double dy, double width, List<Other> others) {
		if (others.isEmpty() || others.stream().anyMatch(o -> o.dx() * dx + o.dy() * dy < -STRAIGHT)) {
			return Cut.AT_JOINT;
		}
		double through = throughWidth(others);
		if (through > 0) {
			return new Cut(through / 2, through / 2);
		}
		if (others.size() > 1) {
			return Cut.AT_JOINT;
		}
		Other other = others.get(0);
		double turn = -(other.dx() * dx + other.dy() * dy);
		if (turn >= GENTLE) {
			return mitre(dx, dy, width, other);
		}
		boolean flatter = Math.abs(dx) >= Math.abs(other.dx());
		double shift = (flatter ? -1 : 1) * other.width() / 2;
		return new Cut(shift, shift);
	}

	/** @return width of a pair that goes straight through the joint, 0 for none */
	private static double throughWidth(List<Other> others) {
		double widest = 0;
		for (Other a : others) {
			for (Other b : others) {
				if (a.dx() * b.dx() + a.dy() * b.dy() < -STRAIGHT) {
					widest = Math.max(widest, Math.max(a.width(), b.width()));
				}
			}
		}
		return widest;
	}

	/** The side lines run to the line that halves the angle. */
	private static Cut mitre(double dx, double dy, double width, Other other) {
		double bx = dx + other.dx();
		double by = dy + other.dy();
		double across = -dy * by - dx * bx;
		double along = dx * by - dy * bx;
		if (Math.abs(along) < 1e-9) {
			return Cut.AT_JOINT;
		}
		double left = -width / 2 * across / along;
		return new Cut(left, -left);
	}
}
