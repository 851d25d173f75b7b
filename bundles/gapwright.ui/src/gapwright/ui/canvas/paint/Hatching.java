package gapwright.ui.canvas.paint;

import java.util.ArrayList;
import java.util.List;

/** Parallel lines under 45 degrees cut to a convex polygon. */
final class Hatching {

	private Hatching() {
	}

	/** @return x1, y1, x2, y2 of each line; they hang on a grid of the page, so neighbouring polygons continue */
	static List<double[]> across(double[] polygon, double spacing) {
		double least = Double.POSITIVE_INFINITY;
		double most = Double.NEGATIVE_INFINITY;
		for (int i = 0; i < polygon.length; i += 2) {
			double level = polygon[i] + polygon[i + 1];
			least = Math.min(least, level);
			most = Math.max(most, level);
		}
		double step = spacing * Math.sqrt(2);
		List<double[]> lines = new ArrayList<>();
		for (double level = Math.ceil(least / step) * step; level < most; level += step) {
			double[] line = cut(polygon, level);
			if (line != null) {
				lines.add(line);
			}
		}
		return lines;
	}

	/** Where x + y = level crosses the polygon. */
	private static double[] cut(double[] polygon, double level) {
		double[] line = new double[4];
		int found = 0;
		int n = polygon.length;
		for (int i = 0; i < n && found < 4; i += 2) {
			double x1 = polygon[i];
			double y1 = polygon[i + 1];
			double x2 = polygon[(i + 2) % n];
			double y2 = polygon[(i + 3) % n];
			double d1 = x1 + y1 - level;
			double d2 = x2 + y2 - level;
			if (d1 <= 0 != d2 <= 0) {
				double t = d1 / (d1 - d2);
				line[found++] = x1 + t * (x2 - x1);
				line[found++] = y1 + t * (y2 - y1);
			}
		}
		return found == 4 ? line : null;
	}
}
