package gapwright.physics.gap;

/**
 * A gap and what lies round it, as far as any fringing method asks.
 *
 * @param section  gross section of the poles
 * @param length   of each piece, m, &gt; 0
 * @param pieces   ≥ 1; more than one are spread evenly over the window
 * @param place    what the pole faces stand opposite
 * @param toFirst  from the middle of the gap to the first end of the window, m, along the leg; NaN where unknown
 * @param toSecond from the middle of the gap to the other end, m; NaN where unknown
 */
public record GapGeometry(Section section, double length, int pieces, Place place, double toFirst, double toSecond) {

	/** What a pole face stands opposite. */
	public enum Place {
		/** Another pole alike, both with their sides in a winding window closed by yokes. */
		WITHIN_LEG,
		/** A yoke, much wider than the pole. */
		AGAINST_YOKE,
		/** Another pole alike, in the open. */
		BETWEEN_POLES
	}

	/** @throws IllegalArgumentException when the length is not above 0, or there is no piece */
	public GapGeometry {
		Positive.check("length", length);
		if (pieces < 1) {
			throw new IllegalArgumentException("pieces = " + pieces + ": must be 1 or more");
		}
	}

	/** A gap of which no more is known than its section and length: enough for NONE and WIDENED. */
	public static GapGeometry plain(Section section, double length, int pieces) {
		return new GapGeometry(section, length, pieces, Place.WITHIN_LEG, Double.NaN, Double.NaN);
	}

	/** A gap half way along a window of the given height, m. */
	public static GapGeometry centred(Section section, double length, int pieces, double windowHeight) {
		return new GapGeometry(section, length, pieces, Place.WITHIN_LEG, windowHeight / 2, windowHeight / 2);
	}

	/** @return height of the window, m; NaN where unknown */
	public double windowHeight() {
		return toFirst + toSecond;
	}

	/** @return height of the pole's side on the first end's side of the gap, m; may be ≤ 0 where the gap lies in a corner */
	public double firstPole() {
		return poleHeight(toFirst);
	}

	/** @return height of the pole's side on the other side of the gap, m */
	public double secondPole() {
		return poleHeight(toSecond);
	}

	private double poleHeight(double distance) {
		if (place == Place.AGAINST_YOKE) {
			return windowHeight() - length;
		}
		return pieces == 1 ? distance - length / 2 : (windowHeight() - pieces * length) / (2 * pieces);
	}

	/** @return ∂firstPole/∂toFirst and ∂firstPole/∂toSecond in this order; those of the second pole are the reverse */
	double[] poleSlopes() {
		if (place == Place.AGAINST_YOKE) {
			return new double[] { 1, 1 };
		}
		return pieces == 1 ? new double[] { 1, 0 } : new double[] { 0.5 / pieces, 0.5 / pieces };
	}

	/** @return ∂firstPole/∂length = ∂secondPole/∂length */
	double poleSlopeByLength() {
		return place == Place.AGAINST_YOKE ? -1 : -0.5;
	}
}
