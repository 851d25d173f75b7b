package gapwright.ui.canvas.looks;

import java.util.ArrayList;
import java.util.List;

import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.canvas.paint.Tone;

/**
 * A coil: its turns cut open on both sides of the bar, a dot where the current comes out of the page, a cross where it
 * goes in (trade practice).
 *
 * @param toward x, y of each turn on the side where the current comes out
 * @param away   x, y of each turn on the other side
 * @param radius of a turn
 * @param marked whether a current flows; without one the turns are empty
 */
public record CoilLook(double[] toward, double[] away, double radius, boolean marked) implements Look {

	/** Below this radius turns run together; they are drawn as a band. */
	private static final double LEAST = 1.6;
	private static final double LEAST_MARK = 3;
	private static final double MOST_MARK = 12;

	@Override
	public double[] bounds() {
		return Shapes.bounds(radius + 2, toward, away);
	}

	@Override
	public boolean contains(double x, double y) {
		return in(toward, x, y) || in(away, x, y);
	}

	private boolean in(double[] turns, double x, double y) {
		double[] box = Shapes.bounds(radius, turns);
		return x >= box[0] && x <= box[0] + box[2] && y >= box[1] && y <= box[1] + box[3];
	}

	/** @return left, top, width, height of every turn; of either side where turns run together */
	public List<double[]> boxes() {
		List<double[]> boxes = new ArrayList<>();
		for (double[] side : new double[][] { toward, away }) {
			if (radius < LEAST) {
				boxes.add(Shapes.bounds(radius + 1, side));
				continue;
			}
			for (int i = 0; i < side.length; i += 2) {
				boxes.add(new double[] { side[i] - radius, side[i + 1] - radius, 2 * radius, 2 * radius });
			}
		}
		return boxes;
	}

	@Override
	public void paint(Pen pen) {
		side(pen, toward, true);
		side(pen, away, false);
	}

	private void side(Pen pen, double[] turns, boolean dot) {
		if (radius < LEAST) {
			double[] box = Shapes.bounds(radius, turns);
			double[] band = { box[0], box[1], box[0] + box[2], box[1], box[0] + box[2], box[1] + box[3], box[0],
					box[1] + box[3] };
			pen.fill(band, Tone.COPPER, 1);
			pen.outline(band, Tone.COIL, 1.2);
			return;
		}
		for (int i = 0; i < turns.length; i += 2) {
			double x = turns[i];
			double y = turns[i + 1];
			pen.disc(x, y, radius - 0.6, Tone.COPPER, Tone.COIL, 1.2);
			if (marked && radius >= LEAST_MARK) {
				mark(pen, x, y, dot);
			}
		}
	}

	private void mark(Pen pen, double x, double y, boolean dot) {
		if (dot) {
			pen.disc(x, y, Math.max(1, Math.min(MOST_MARK / 2, radius * 0.22)), Tone.COIL, Tone.COIL, 1);
		} else {
			double arm = Math.min(MOST_MARK, radius * 0.42);
			pen.line(new double[] { x - arm, y - arm, x + arm, y + arm }, Tone.COIL, 1.3, false);
			pen.line(new double[] { x - arm, y + arm, x + arm, y - arm }, Tone.COIL, 1.3, false);
		}
	}
}
