package gapwright.ui.canvas.looks;

/** Plane geometry on x, y, x, y … arrays. */
public final class Shapes {

	private Shapes() {
	}

	/** @return left, top, width, height round all points with a margin */
	public static double[] bounds(double margin, double[]... shapes) {
		double left = Double.POSITIVE_INFINITY;
		double top = Double.POSITIVE_INFINITY;
		double right = Double.NEGATIVE_INFINITY;
		double bottom = Double.NEGATIVE_INFINITY;
		for (double[] shape : shapes) {
			for (int i = 0; i < shape.length; i += 2) {
				left = Math.min(left, shape[i]);
				right = Math.max(right, shape[i]);
				top = Math.min(top, shape[i + 1]);
				bottom = Math.max(bottom, shape[i + 1]);
			}
		}
		return new double[] { left - margin, top - margin, right - left + 2 * margin, bottom - top + 2 * margin };
	}

	/** @return whether a point lies in a convex polygon, or within a margin of its sides */
	public static boolean contains(double[] polygon, double x, double y, double margin) {
		int side = 0;
		boolean inside = true;
		int n = polygon.length;
		for (int i = 0; i < n; i += 2) {
			double dx = polygon[(i + 2) % n] - polygon[i];
			double dy = polygon[(i + 3) % n] - polygon[i + 1];
			double cross = dx * (y - polygon[i + 1]) - dy * (x - polygon[i]);
			int sign = cross > 0 ? 1 : cross < 0 ? -1 : 0;
			if (sign != 0 && side != 0 && sign != side) {
				inside = false;
			}
			side = side == 0 ? sign : side;
		}
		return inside || distance(polygon, x, y, true) <= margin;
	}

	/** @return distance of a point from a line through points, closed or open */
	public static double distance(double[] line, double x, double y, boolean closed) {
		double least = Double.POSITIVE_INFINITY;
		int n = line.length;
		for (int i = 0; i + 2 < n || closed && i < n; i += 2) {
			double ax = line[i];
			double ay = line[i + 1];
			double dx = line[(i + 2) % n] - ax;
			double dy = line[(i + 3) % n] - ay;
			double square = dx * dx + dy * dy;
			double t = square == 0 ? 0 : Math.max(0, Math.min(1, ((x - ax) * dx + (y - ay) * dy) / square));
			least = Math.min(least, Math.hypot(x - ax - t * dx, y - ay - t * dy));
		}
		return least;
	}

	/** @return the four corners of a box of left, top, width, height */
	public static double[] corners(double[] box) {
		return new double[] { box[0], box[1], box[0] + box[2], box[1], box[0] + box[2], box[1] + box[3], box[0],
				box[1] + box[3] };
	}

	/** @return whether two boxes of left, top, width, height share area */
	public static boolean overlap(double[] a, double[] b) {
		return a[0] < b[0] + b[2] && b[0] < a[0] + a[2] && a[1] < b[1] + b[3] && b[1] < a[1] + a[3];
	}
}
