package gapwright.ui.canvas.looks;

import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.canvas.paint.Tone;

/**
 * A path through air: a thin dashed curve from joint to joint.
 *
 * @param curve points along it
 */
public record AirPathLook(double[] curve) implements Look {

	private static final int PIECES = 48;

	/** @return the curve between two points; deviation in pixels to the side of the normal (-dy, dx) of the way */
	public static AirPathLook between(double x1, double y1, double x2, double y2, double deviation) {
		double length = Math.max(1e-9, Math.hypot(x2 - x1, y2 - y1));
		// a quadratic curve reaches half way to its control point
		double mx = (x1 + x2) / 2 - 2 * deviation * (y2 - y1) / length;
		double my = (y1 + y2) / 2 + 2 * deviation * (x2 - x1) / length;
		double[] curve = new double[2 * (PIECES + 1)];
		for (int i = 0; i <= PIECES; i++) {
			double t = (double) i / PIECES;
			curve[2 * i] = (1 - t) * (1 - t) * x1 + 2 * t * (1 - t) * mx + t * t * x2;
			curve[2 * i + 1] = (1 - t) * (1 - t) * y1 + 2 * t * (1 - t) * my + t * t * y2;
		}
		return new AirPathLook(curve);
	}

	/**
	 * @param first    which end
	 * @param distance from that end, pixels, at most a quarter of the way
	 * @return x and y of a point on the curve
	 */
	public double[] near(boolean first, double distance) {
		int last = curve.length / 2 - 1;
		int end = first ? 0 : last;
		int step = first ? 1 : -1;
		int at = end;
		while (Math.abs(at - end) < last / 4
				&& Math.hypot(curve[2 * at] - curve[2 * end], curve[2 * at + 1] - curve[2 * end + 1]) < distance) {
			at += step;
		}
		return new double[] { curve[2 * at], curve[2 * at + 1] };
	}

	@Override
	public double[] bounds() {
		return Shapes.bounds(3, curve);
	}

	@Override
	public boolean contains(double x, double y) {
		return Shapes.distance(curve, x, y, false) <= 4;
	}

	@Override
	public void paint(Pen pen) {
		pen.line(curve, Tone.NOTE, 1, true);
	}
}
