package gapwright.ui.plot;

import java.util.List;

import gapwright.ui.canvas.paint.Tone;

/**
 * What a plot shows, in SI units.
 *
 * @param lines  in the order of their marks
 * @param levels drawn right across
 * @param spots  marked points with a word
 * @param bars   of a histogram
 */
public record Plot(Axis x, Axis y, List<Line> lines, List<Level> levels, List<Spot> spots, List<Bar> bars) {

	/**
	 * @param name read at its end and in the read-out
	 * @param x    rising or falling
	 * @param y    one per x; NaN interrupts the line
	 * @param tone of the line
	 * @param dash whether it is dashed, so that lines can be told apart without colour
	 */
	public record Line(String name, double[] x, double[] y, Tone tone, boolean dash) {

		/** @return y at an x by straight lines between the points; NaN outside */
		double at(double value) {
			for (int k = 1; k < x.length; k++) {
				double low = Math.min(x[k - 1], x[k]);
				double high = Math.max(x[k - 1], x[k]);
				if (value >= low && value <= high) {
					return high == low ? y[k] : y[k - 1] + (y[k] - y[k - 1]) * (value - x[k - 1]) / (x[k] - x[k - 1]);
				}
			}
			return Double.NaN;
		}
	}

	/** A limit. @param upright whether it stands at an x instead of lying at a y */
	public record Level(String name, double value, Tone tone, boolean upright) {
	}

	/** A point with a word beside it. */
	public record Spot(String name, double x, double y, Tone tone) {
	}

	/** A bar from one x to another, from 0 up to y. */
	public record Bar(double from, double to, double y, Tone tone) {
	}

	/** Lines that one can tell apart. */
	private static final Tone[] TONES = { Tone.WITHIN, Tone.MAGNET, Tone.COIL, Tone.INK, Tone.SELECTION, Tone.NOTE };

	/** @return tone of the n-th line */
	public static Tone tone(int n) {
		return TONES[n % TONES.length];
	}

	/** @return whether the n-th line is dashed */
	public static boolean isDashed(int n) {
		return n % 2 == 1;
	}

	/** @return the same plot over another part of its x axis */
	Plot over(double begin, double end) {
		return new Plot(x.over(begin, end), y, lines, levels, spots, bars);
	}
}
