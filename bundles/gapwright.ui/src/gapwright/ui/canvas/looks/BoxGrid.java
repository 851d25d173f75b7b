package gapwright.ui.canvas.looks;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Boxes of left, top, width, height, found by place: a drawing of many legs asks only what lies near. */
final class BoxGrid {

	/** About the size of a label, so that a box lies in a few cells, px. */
	private static final double CELL = 64;

	private final Map<Long, List<double[]>> cells = new HashMap<>();

	void add(double[] box) {
		int right = cell(box[0] + box[2]);
		int bottom = cell(box[1] + box[3]);
		for (int i = cell(box[0]); i <= right; i++) {
			for (int k = cell(box[1]); k <= bottom; k++) {
				cells.computeIfAbsent(key(i, k), key -> new ArrayList<>()).add(box);
			}
		}
	}

	/** @return whether a box shares area with one in the grid */
	boolean overlaps(double[] box) {
		int right = cell(box[0] + box[2]);
		int bottom = cell(box[1] + box[3]);
		for (int i = cell(box[0]); i <= right; i++) {
			for (int k = cell(box[1]); k <= bottom; k++) {
				for (double[] other : cells.getOrDefault(key(i, k), List.of())) {
					if (Shapes.overlap(box, other)) {
						return true;
					}
				}
			}
		}
		return false;
	}

	/** @return whether a point lies inside a box of the grid */
	boolean covers(double x, double y) {
		for (double[] box : cells.getOrDefault(key(cell(x), cell(y)), List.of())) {
			if (x > box[0] && x < box[0] + box[2] && y > box[1] && y < box[1] + box[3]) {
				return true;
			}
		}
		return false;
	}

	private static int cell(double pixels) {
		return (int) Math.floor(pixels / CELL);
	}

	private static long key(int column, int row) {
		return (long) column << 32 | row & 0xffffffffL;
	}
}
