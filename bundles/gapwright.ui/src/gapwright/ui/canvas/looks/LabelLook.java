package gapwright.ui.canvas.looks;

import java.util.List;

import gapwright.ui.canvas.paint.Align;
import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.canvas.paint.Tone;

/**
 * A label where it was found room.
 *
 * @param lines  from top to bottom
 * @param box    left, top, width, height
 * @param align  of the lines within the box
 * @param leader from the element to the label, or empty
 * @param badge  tone of the badge before the label, or null for none
 */
public record LabelLook(List<LabelLine> lines, double[] box, Align align, double[] leader, Tone badge) implements Look {

	/** Room that a badge takes beside the lines, px. */
	public static final double BADGE = 28;
	private static final double HALF = 10;
	private static final double LEADING = 1.25;

	/** @return height of lines, px */
	public static double height(List<LabelLine> lines) {
		return lines.stream().mapToDouble(line -> line.size() * LEADING).sum();
	}

	@Override
	public double[] bounds() {
		return leader.length == 0 ? grown(box) : Shapes.bounds(3, corners(box), leader);
	}

	private static double[] grown(double[] box) {
		return new double[] { box[0] - 3, box[1] - 3, box[2] + 6, box[3] + 6 };
	}

	private static double[] corners(double[] box) {
		return new double[] { box[0], box[1], box[0] + box[2], box[1] + box[3] };
	}

	@Override
	public boolean contains(double x, double y) {
		return x >= box[0] && x <= box[0] + box[2] && y >= box[1] && y <= box[1] + box[3];
	}

	@Override
	public void paint(Pen pen) {
		if (leader.length > 0) {
			pen.line(leader, Tone.NOTE, 1, false);
		}
		double left = box[0];
		double width = box[2];
		if (badge != null) {
			badge(pen, align == Align.END ? left + width - HALF : left + HALF, box[1] + box[3] / 2);
			width -= BADGE;
			left += align == Align.END ? 0 : BADGE;
		}
		double x = align == Align.START ? left : align == Align.MIDDLE ? left + width / 2 : left + width;
		double y = box[1];
		for (LabelLine line : lines) {
			pen.text(line.text(), x, y + line.size(), align, line.size(), line.bold(), line.tone());
			y += line.size() * LEADING;
		}
	}

	private void badge(Pen pen, double x, double y) {
		pen.fill(new double[] { x, y - HALF, x + HALF, y, x, y + HALF, x - HALF, y }, badge, 1);
		pen.line(new double[] { x, y - 5, x, y + 1 }, Tone.PAPER, 2, false);
		pen.line(new double[] { x, y + 4, x, y + 5 }, Tone.PAPER, 2, false);
	}
}
