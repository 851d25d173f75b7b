package gapwright.ui.canvas.looks;

import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.canvas.paint.Tone;

/** A joint: a small ring, as large at every zoom. */
public record JointLook(double x, double y) implements Look {

	private static final double RADIUS = 4.5;
	private static final double REACH = 7;

	@Override
	public double[] bounds() {
		return new double[] { x - REACH, y - REACH, 2 * REACH, 2 * REACH };
	}

	@Override
	public boolean contains(double px, double py) {
		return Math.hypot(px - x, py - y) <= REACH;
	}

	@Override
	public void paint(Pen pen) {
		pen.disc(x, y, RADIUS, Tone.PAPER, Tone.INK, 1.4);
	}
}
