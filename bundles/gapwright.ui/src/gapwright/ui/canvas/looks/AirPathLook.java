package gapwright.ui.canvas.looks;

import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.canvas.paint.Tone;

/**
 * A path through air: a thin dashed curve from joint to joint.
 *
 * @param curve points along it
 */
public record AirPathLook(double[] curve) implements Look {

	private static final int PIECES = 16;
	private static final double BULGE = 0.22;

	/** @return the curve between two points, bulging to the left of the way, more for each one between the same joints */
	public static AirPathLook between(double x1, double y1, double x2, double y2, int rank) {
		double bulge = BULGE * (1 + rank);
		double mx = (x1 + x2) / 2 - bulge * (y2 - y1);
		double my = (y1 + y2) / 2 + bulge * (x2 - x1);
		double[] curve = new double[2 * (PIECES + 1)];
		for (int i = 0; i <= PIECES; i++) {
			double t = (double) i / PIECES;
			curve[2 * i] = (1 - t) * (1 - t) * x1 + 2 * t * (1 - t) * mx + t * t * x2;
			curve[2 * i + 1] = (1 - t) * (1 - t) * y1 + 2 * t * (1 - t) * my + t * t * y2;
		}
		return new AirPathLook(curve);
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
