package gapwright.study.tolerance;

import java.util.SplittableRandom;

/** Draws deviations: uniform, or normal with the bound at three standard deviations and nothing beyond it. */
final class Draw {

	/** Standard deviations at the bound. */
	private static final double BOUND = 3;

	private Draw() {
	}

	/** @return −1 to 1 */
	static double share(SplittableRandom random, boolean normal) {
		if (!normal) {
			return 2 * random.nextDouble() - 1;
		}
		while (true) {
			double z = gaussian(random) / BOUND;
			if (Math.abs(z) <= 1) {
				return z;
			}
		}
	}

	/** Source: Marsaglia and Bray's polar method (1964), from memory. */
	private static double gaussian(SplittableRandom random) {
		while (true) {
			double u = 2 * random.nextDouble() - 1;
			double v = 2 * random.nextDouble() - 1;
			double s = u * u + v * v;
			if (s < 1 && s > 0) {
				return u * Math.sqrt(-2 * Math.log(s) / s);
			}
		}
	}
}
