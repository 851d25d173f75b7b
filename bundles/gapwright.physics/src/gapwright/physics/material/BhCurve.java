package gapwright.physics.material;

/**
 * Flux density against field strength of a material without hysteresis. Every curve is odd in the field strength,
 * strictly increasing and continuously differentiable but for single points. SI units throughout.
 */
public interface BhCurve {

	/** Permeability of free space, H/m. Source: 4π·10⁻⁷, the value before the 2019 revision of the SI; 5.5e-10 off. */
	double MU_0 = 4e-7 * Math.PI;

	/**
	 * @param fieldStrength H, A/m, finite
	 * @return B, T
	 */
	double fluxDensity(double fieldStrength);

	/**
	 * @param fieldStrength H, A/m, finite
	 * @return dB/dH, H/m, ≥ 0
	 */
	double slope(double fieldStrength);

	/**
	 * @param fieldStrength H, A/m, finite
	 * @return d²B/dH², H/A; one-sided where it jumps
	 */
	double curvature(double fieldStrength);

	/**
	 * @param fieldStrength H, A/m, finite
	 * @return ∫₀ᴴ B dH, J/m³, ≥ 0, even in H
	 */
	double coEnergyDensity(double fieldStrength);

	/**
	 * The same material in another state: its polarisation at saturation multiplied, its initial permeability replaced.
	 * The polarisation keeps its shape, J(H) becomes r·J(k·H).
	 *
	 * @param initialPermeability relative, in the curve's own domain
	 * @param polarisationRatio   r, &gt; 0; without effect on a curve that has no saturation
	 * @throws IllegalArgumentException when a parameter is outside its domain or the curve would no longer rise
	 */
	BhCurve with(double initialPermeability, double polarisationRatio);

	/**
	 * Field strengths, A/m, rising and above 0, between which the curve is smooth; none where it is smooth everywhere.
	 */
	default double[] corners() {
		return new double[0];
	}

	/**
	 * The inverse of {@link #fluxDensity}, by bracketed Newton steps to rounding.
	 *
	 * @param fluxDensity B, T, finite
	 * @return H, A/m
	 */
	default double fieldStrength(double fluxDensity) {
		double target = Math.abs(fluxDensity);
		if (target == 0) {
			return 0;
		}
		double low = 0;
		double high = target / MU_0;
		while (fluxDensity(high) < target) {
			low = high;
			high *= 2;
		}
		double h = Math.min(high, Math.max(low, target / slope(0)));
		for (int i = 0; i < 200; i++) {
			double error = fluxDensity(h) - target;
			if (error == 0) {
				break;
			}
			if (error > 0) {
				high = h;
			} else {
				low = h;
			}
			double next = h - error / slope(h);
			if (!(next > low && next < high)) {
				next = low + 0.5 * (high - low);
			}
			if (Math.abs(next - h) <= Math.ulp(h)) {
				h = next;
				break;
			}
			h = next;
		}
		return Math.copySign(h, fluxDensity);
	}
}
