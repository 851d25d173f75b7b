package gapwright.ui.canvas.looks;

import java.util.List;

import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.canvas.paint.Tone;

/**
 * A gap: a slot across the bar for each piece.
 *
 * @param slots each a block a little wider than the bar
 * @param faces both faces of each slot, x1, y1, x2, y2
 */
public record GapLook(List<double[]> slots, List<double[]> faces) implements Look {

	@Override
	public double[] bounds() {
		return Shapes.bounds(2, slots.toArray(double[][]::new));
	}

	@Override
	public boolean contains(double x, double y) {
		return slots.stream().anyMatch(slot -> Shapes.contains(slot, x, y, 2));
	}

	@Override
	public void paint(Pen pen) {
		slots.forEach(slot -> pen.fill(slot, Tone.PAPER, 1));
		faces.forEach(face -> pen.line(face, Tone.INK, 2, false));
	}
}
