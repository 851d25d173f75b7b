package gapwright.physics.network;

import gapwright.physics.material.BhCurve;
import gapwright.physics.material.BlendedBh;

/**
 * One leg under an imposed MMF f: finds H of H·l + R·A·B(H) = f, hence flux and its derivative. The left side rises
 * with H, and for the concave curves Newton from below never leaves its bracket; tables fall back on halving.
 */
final class LegKernel {

	/** More than enough for halving alone to reach rounding from any bracket. */
	private static final int MOST_STEPS = 1100;
	/** Floor of dB/dH in the Jacobian as a fraction of µ₀: the end of a table may come out flat. */
	private static final double LEAST_SLOPE = 1e-3 * BhCurve.MU_0;

	private LegKernel() {
	}

	/**
	 * @param f        A
	 * @param guess    A/m, any
	 * @param length   m, ≥ 0
	 * @param reactive R·A, m²/H, ≥ 0; not 0 when length is
	 * @return H, A/m
	 */
	static double fieldStrength(BhCurve curve, double f, double guess, double length, double reactive) {
		if (f == 0) {
			return 0;
		}
		if (length == 0) {
			return curve.fieldStrength(f / reactive);
		}
		double target = Math.abs(f);
		double high = target / length;
		if (reactive == 0) {
			return Math.copySign(high, f);
		}
		if (curve instanceof BlendedBh blended) {
			return Math.copySign(byFluxDensity(blended, target, length, reactive), f);
		}
		// the three terms of the defect are known no better; steps below that would wander without end
		double rounding = 2 * Math.ulp(target);
		double low = 0;
		double h = Math.copySign(1, guess) == Math.copySign(1, f) ? Math.min(Math.abs(guess), high) : 0;
		for (int i = 0; i < MOST_STEPS; i++) {
			double defect = h * length + reactive * curve.fluxDensity(h) - target;
			if (Math.abs(defect) <= rounding) {
				break;
			}
			if (defect > 0) {
				high = h;
			} else {
				low = h;
			}
			double next = h - defect / (length + reactive * curve.slope(h));
			if (Math.abs(next - h) <= 2 * Math.ulp(h)) {
				h = next;
				break;
			}
			// an end of the bracket was tried before: on an S-shaped table Newton can go to and fro between both
			h = next > low && next < high ? next : low + 0.5 * (high - low);
		}
		return Math.copySign(h, f);
	}

	/**
	 * H(B)·l + R·A·B = f by its flux density: of a blend only H(B) comes without a search. Newton from above, where the
	 * left side is convex for concave curves, halving where it leaves its bracket.
	 */
	private static double byFluxDensity(BlendedBh curve, double target, double length, double reactive) {
		double rounding = 2 * Math.ulp(target);
		double low = 0;
		double high = target / reactive;
		double b = high;
		double h = curve.fieldStrength(b);
		for (int i = 0; i < MOST_STEPS; i++) {
			double defect = h * length + reactive * b - target;
			if (Math.abs(defect) <= rounding) {
				break;
			}
			if (defect > 0) {
				high = b;
			} else {
				low = b;
			}
			double next = b - defect / (length * curve.fieldSlope(b) + reactive);
			// a step this small leaves an error of its square, which is below rounding
			boolean settled = Math.abs(next - b) <= 1e-10 * b;
			b = settled || next > low && next < high ? next : low + 0.5 * (high - low);
			h = curve.fieldStrength(b);
			if (settled || !(high - low > Math.ulp(high))) {
				break;
			}
		}
		return h;
	}

	/** @return dφ/df, H: A·B′/(l + R·A·B′) */
	static double conductance(double slope, double length, double area, double reluctance) {
		double floored = flooredSlope(slope);
		return area * floored / (length + reluctance * area * floored);
	}

	static double flooredSlope(double slope) {
		return Math.max(slope, LEAST_SLOPE);
	}
}
