package gapwright.ui.canvas.looks;

import gapwright.study.LegState;
import gapwright.ui.canvas.paint.Pen;
import gapwright.ui.canvas.paint.Tone;

/**
 * A leg: a hollow bar with the flux as a tube along its axis, as wide as its share of saturation. Hatched when near,
 * outlined twice when over, so that it reads without colour.
 *
 * @param outline  of the bar
 * @param tube     of the flux; empty while there is no result
 * @param axis     x1, y1, x2, y2 of the visible part, from its first joint
 * @param width    of the bar
 * @param state    null while there is no result
 * @param fluxSign 1 along the axis, -1 against it, 0 for none
 * @param crossed  pixels along the axis at which a gap, a magnet or a joint lies on it
 */
public record LegLook(double[] outline, double[] tube, double[] axis, double width, LegState state, int fluxSign,
		double[] crossed)
		implements Look {

	private static final double OUTER = 4;
	private static final double CHEVRON_DISTANCE = 60;
	private static final int MOST_CHEVRONS = 6;
	private static final double CHEVRON_CLEAR = 28;
	private static final double CROSSING = 19;

	@Override
	public double[] bounds() {
		return Shapes.bounds(OUTER + 2, outline);
	}

	@Override
	public double[] highlight() {
		return outline;
	}

	@Override
	public boolean contains(double x, double y) {
		return Shapes.contains(outline, x, y, 2);
	}

	@Override
	public void paint(Pen pen) {
		pen.fill(outline, Tone.IRON, 1);
		if (tube.length > 0) {
			tube(pen);
		}
		boolean over = state == LegState.OVER;
		pen.outline(outline, over ? Tone.OVER : Tone.INK, over ? 2.4 : 1.4);
		if (over) {
			pen.outline(grown(), Tone.OVER, 1.2);
		}
		if (fluxSign != 0) {
			chevrons(pen);
		}
	}

	private void tube(Pen pen) {
		switch (state) {
		case WITHIN -> pen.fill(tube, Tone.WITHIN, 0.55);
		case NEAR -> {
			pen.fill(tube, Tone.NEAR, 0.3);
			pen.hatch(tube, Tone.NEAR, 6, 2);
		}
		case OVER -> {
			pen.fill(tube, Tone.OVER, 0.45);
			pen.hatch(tube, Tone.OVER, 5, 2);
		}
		case UNKNOWN -> pen.fill(tube, Tone.UNKNOWN, 0.3);
		}
	}

	/** The outline moved outwards, for a convex shape from its middle. */
	private double[] grown() {
		double[] box = Shapes.bounds(0, outline);
		double cx = box[0] + box[2] / 2;
		double cy = box[1] + box[3] / 2;
		double[] grown = outline.clone();
		double ux = axis[2] - axis[0];
		double uy = axis[3] - axis[1];
		double length = Math.max(1e-9, Math.hypot(ux, uy));
		ux /= length;
		uy /= length;
		for (int i = 0; i < grown.length; i += 2) {
			double s = (grown[i] - cx) * ux + (grown[i + 1] - cy) * uy;
			double t = -(grown[i] - cx) * uy + (grown[i + 1] - cy) * ux;
			double ds = Math.signum(s) * OUTER;
			double dt = Math.signum(t) * OUTER;
			grown[i] += ds * ux - dt * uy;
			grown[i + 1] += ds * uy + dt * ux;
		}
		return grown;
	}

	private boolean isCrossed(int count, double clear, double length) {
		for (int k = 0; k < count; k++) {
			double at = length * (clear + (1 - 2 * clear) * (k + 0.5) / count);
			if (isCrossed(at)) {
				return true;
			}
		}
		return false;
	}

	private boolean isCrossed(double at) {
		for (double s : crossed) {
			if (Math.abs(s - at) < CROSSING) {
				return true;
			}
		}
		return false;
	}

	private void chevrons(Pen pen) {
		double dx = axis[2] - axis[0];
		double dy = axis[3] - axis[1];
		double length = Math.hypot(dx, dy);
		double size = Math.min(5, Math.min(width * 0.3, length * 0.3));
		if (size < 1.5) {
			return;
		}
		double ux = fluxSign * dx / length;
		double uy = fluxSign * dy / length;
		// the ends belong to the joints' rings
		double clear = Math.min(CHEVRON_CLEAR, length / 5) / length;
		int count = Math.max(1, Math.min(MOST_CHEVRONS, (int) (length * (1 - 2 * clear) / CHEVRON_DISTANCE)));
		// where a chevron would hide under a gap, one more moves them all off it
		count += isCrossed(count, clear, length) ? 1 : 0;
		for (int k = 0; k < count; k++) {
			double share = clear + (1 - 2 * clear) * (k + 0.5) / count;
			if (count > 1 && isCrossed(share * length)) {
				continue;
			}
			double x = axis[0] + share * dx;
			double y = axis[1] + share * dy;
			double back = size / 1.3;
			double[] points = { x - back * ux - size * uy, y - back * uy + size * ux, x + back * ux, y + back * uy,
					x - back * ux + size * uy, y - back * uy - size * ux };
			pen.line(points, Tone.PAPER, 4, false);
			pen.line(points, Tone.INK, 2, false);
		}
	}
}
