package gapwright.ui.canvas.looks;

import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.canvas.paint.Tone;

/**
 * A magnet: a block across the bar, and beside it an arrow the way it drives the flux.
 *
 * @param block across the bar
 * @param arrow x1, y1, x2, y2, tail to tip
 */
public record MagnetLook(double[] block, double[] arrow) implements Look {

	private static final double HEAD = 5;

	@Override
	public double[] bounds() {
		return Shapes.bounds(HEAD + 2, block, arrow);
	}

	@Override
	public double[] highlight() {
		return block;
	}

	@Override
	public boolean contains(double x, double y) {
		return Shapes.contains(block, x, y, 2);
	}

	@Override
	public void paint(Pen pen) {
		pen.fill(block, Tone.MAGNET, 0.8);
		pen.outline(block, Tone.INK, 1.4);
		double dx = arrow[2] - arrow[0];
		double dy = arrow[3] - arrow[1];
		double length = Math.max(1e-9, Math.hypot(dx, dy));
		dx /= length;
		dy /= length;
		double[] head = { arrow[2] - HEAD * (dx - dy), arrow[3] - HEAD * (dy + dx), arrow[2], arrow[3],
				arrow[2] - HEAD * (dx + dy), arrow[3] - HEAD * (dy - dx) };
		pen.line(arrow, Tone.PAPER, 5, false);
		pen.line(head, Tone.PAPER, 5, false);
		pen.line(arrow, Tone.INK, 2, false);
		pen.line(head, Tone.INK, 2, false);
	}
}
