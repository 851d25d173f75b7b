package gapwright.physics.leakage;

import static gapwright.physics.material.BhCurve.MU_0;

import java.util.List;

/**
 * Leakage inductance of windings in a rectangular window with infinitely permeable walls, planar: a double Fourier
 * series of the field. For windings of unequal height, off-centre, or side by side, where the simple energy method
 * doubts itself. Source: Roth (1928), from memory; checked against the one-dimensional field for full height.
 */
public final class IdealWindow {

	/** Terms in each direction: 100 give 3 in a million for windings a tenth of the window wide. */
	private static final int TERMS = 200;

	/**
	 * Cross-section of a winding in the window.
	 *
	 * @param x      m, its side nearest to the left wall
	 * @param y      m, its side nearest to the lower wall
	 * @param width  m, &gt; 0
	 * @param height m, &gt; 0
	 * @param turns  signed; the sum of turns times current over all windings must be 0
	 */
	public record Rectangle(double x, double y, double width, double height, double turns) {
	}

	private IdealWindow() {
	}

	/**
	 * @param width      of the window, m
	 * @param height     of the window, m
	 * @param rectangles each with its turns per ampere of the winding referred to; they must sum to 0
	 * @return leakage inductance per metre of turn, H/m
	 * @throws IllegalArgumentException when the turns do not balance or a rectangle leaves the window
	 */
	public static double inductancePerMetre(double width, double height, List<Rectangle> rectangles) {
		double sum = rectangles.stream().mapToDouble(Rectangle::turns).sum();
		double most = rectangles.stream().mapToDouble(r -> Math.abs(r.turns())).max().orElse(0);
		if (Math.abs(sum) > 1e-9 * most) {
			throw new IllegalArgumentException("ampere-turns sum to " + sum + ": must balance");
		}
		for (Rectangle r : rectangles) {
			boolean inside = r.x() >= 0 && r.y() >= 0 && r.width() > 0 && r.height() > 0
					&& r.x() + r.width() <= width * (1 + 1e-12) && r.y() + r.height() <= height * (1 + 1e-12);
			if (!inside) {
				throw new IllegalArgumentException(r + ": must lie in the window of " + width + " m by " + height + " m");
			}
		}
		double energy = 0;
		for (int m = 0; m < TERMS; m++) {
			for (int n = 0; n < TERMS; n++) {
				if (m + n == 0) {
					continue;
				}
				double source = 0;
				for (Rectangle r : rectangles) {
					source += r.turns() * meanCosine(m * Math.PI / width, r.x(), r.width())
							* meanCosine(n * Math.PI / height, r.y(), r.height());
				}
				double waves = Math.pow(m * Math.PI / width, 2) + Math.pow(n * Math.PI / height, 2);
				energy += (m == 0 ? 1 : 2) * (n == 0 ? 1 : 2) * source * source / waves;
			}
		}
		return MU_0 * energy / (width * height);
	}

	/** Mean of cos(k·s) from s to s + length. */
	private static double meanCosine(double k, double from, double length) {
		return k == 0 ? 1 : (Math.sin(k * (from + length)) - Math.sin(k * from)) / (k * length);
	}
}
