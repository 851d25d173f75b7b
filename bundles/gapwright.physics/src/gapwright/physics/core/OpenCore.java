package gapwright.physics.core;

/**
 * Rods: their own ends oppose the field that magnetises them. Figures for cylinders come from boundary-element solutions
 * with an error of 0.3 % up to ten diameters (background: Chen, Brug, Goldfarb, IEEE Trans. Magnetics 27, 1991, from
 * memory); for ellipsoids they are exact (Osborn, Phys. Rev. 67, 1945, from memory).
 */
public final class OpenCore {

	private static final double[] LENGTHS = { 1, 2, 5, 10, 20, 50 };
	private static final double[] MIDDLE = { 0.2275, 0.1180, 0.0399, 0.0153, 0.00536, 0.00121 };
	private static final double[] MEAN = { 0.2590, 0.1409, 0.0506, 0.0202, 0.00729, 0.00169 };
	/** Close to a sphere the closed form cancels; its series takes over. */
	private static final double NEARLY_ROUND = 1e-3;

	private OpenCore() {
	}

	/** @param m length over diameter of a prolate ellipsoid, ≥ 1. @return demagnetising factor along its axis */
	public static double ellipsoid(double m) {
		if (!(m >= 1)) {
			throw new IllegalArgumentException("length over diameter = " + m + ": must be 1 or more");
		}
		if (m - 1 < NEARLY_ROUND) {
			double x = m - 1;
			return 1.0 / 3 - 4.0 / 15 * x + 6.0 / 35 * x * x;
		}
		double root = Math.sqrt(m * m - 1);
		return (m / root * Math.log(m + root) - 1) / (m * m - 1);
	}

	/** @param m length over diameter, 1 to 50. @return demagnetising factor of a rod of high permeability at its middle */
	public static double rodAtMiddle(double m) {
		return interpolate(m, MIDDLE);
	}

	/** @param m length over diameter, 1 to 50. @return the same, mean over its volume */
	public static double rodMean(double m) {
		return interpolate(m, MEAN);
	}

	/** @return µ_app = µ_r/(1 + N(µ_r − 1)): flux density in the rod over µ₀ times the field applied, a ratio */
	public static double apparentPermeability(double relativePermeability, double factor) {
		return relativePermeability / (1 + factor * (relativePermeability - 1));
	}

	/** Linear in the logarithms. */
	private static double interpolate(double m, double[] factors) {
		int last = LENGTHS.length - 1;
		if (!(m >= LENGTHS[0] && m <= LENGTHS[last])) {
			throw new IllegalArgumentException("length over diameter = " + m + ": must be from 1 to 50");
		}
		int i = 0;
		while (i < last - 1 && m > LENGTHS[i + 1]) {
			i++;
		}
		double share = Math.log(m / LENGTHS[i]) / Math.log(LENGTHS[i + 1] / LENGTHS[i]);
		return factors[i] * Math.pow(factors[i + 1] / factors[i], share);
	}
}
