package gapwright.physics.gap;

/**
 * Side field of a square-edged half pole above an infinite plane, planar, per metre of depth and over µ₀: what is added
 * to w/(2δ). Serves to tell what the published short form is worth.
 */
public final class CornerField {

	private static final int MOST_STEPS = 100;

	private CornerField() {
	}

	/**
	 * Exact for every height of the side, as long as the half pole is wide against δ (error of the straight part about
	 * e^(−πw/(2δ))): (1/π)·[ln(1 + q²) + 2 − ln 4] with q − atan q = πh/(2δ).
	 * Source: Schwarz-Christoffel map of a right-angled corner over a plane; derived.
	 *
	 * @param height of the side over the distance δ to the plane, ≥ 0
	 */
	public static double exact(double height) {
		if (!(height >= 0)) {
			throw new IllegalArgumentException("height = " + height + ": must be 0 or above");
		}
		double target = Math.PI / 2 * height;
		// convex and rising: from above the root Newton falls onto it
		double q = target + Math.PI / 2;
		for (int step = 0; step < MOST_STEPS && q > 0; step++) {
			double next = q - (q - Math.atan(q) - target) * (1 + q * q) / (q * q);
			if (!(next < q)) {
				break;
			}
			q = Math.max(next, 0);
		}
		return (Math.log1p(q * q) + 2 - Math.log(4)) / Math.PI;
	}

	/**
	 * The limit for h ≫ δ, as published: (2/π)·[1 + ln(πh/(4δ))].
	 *
	 * @param height of the side over the distance δ to the plane, &gt; 0
	 */
	public static double published(double height) {
		return 2 / Math.PI * (1 + Math.log(Math.PI * height / 4));
	}
}
