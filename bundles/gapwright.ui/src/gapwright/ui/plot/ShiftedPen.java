package gapwright.ui.plot;

import gapwright.ui.canvas.paint.Align;
import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.canvas.paint.Tone;

/** Draws lower on the page. */
record ShiftedPen(Pen pen, double down) implements Pen {

	private double[] shifted(double[] points) {
		double[] result = points.clone();
		for (int i = 1; i < result.length; i += 2) {
			result[i] += down;
		}
		return result;
	}

	@Override
	public void fill(double[] polygon, Tone tone, double opacity) {
		pen.fill(shifted(polygon), tone, opacity);
	}

	@Override
	public void outline(double[] polygon, Tone tone, double width) {
		pen.outline(shifted(polygon), tone, width);
	}

	@Override
	public void line(double[] points, Tone tone, double width, boolean dashed) {
		pen.line(shifted(points), tone, width, dashed);
	}

	@Override
	public void disc(double x, double y, double radius, Tone fill, Tone stroke, double width) {
		pen.disc(x, y + down, radius, fill, stroke, width);
	}

	@Override
	public void text(String text, double x, double y, Align align, double size, boolean bold, Tone tone) {
		pen.text(text, x, y + down, align, size, bold, tone);
	}

	@Override
	public double textWidth(String text, double size, boolean bold) {
		return pen.textWidth(text, size, bold);
	}
}
