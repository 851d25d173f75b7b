package gapwright.physics.material;

/**
 * B = µ₀H + χH/(1 + χ|H|/Js), χ = µ₀(µi − 1). Approaches saturation slowly, as 1/H: at χH/Js = 9 the polarisation
 * is 90 % of Js. Source: Fröhlich 1881, Kennelly 1891 (from memory).
 *
 * @param initialPermeability    µi, relative, &gt; 1
 * @param saturationPolarisation Js, T, &gt; 0; what the polarisation tends to, above any data sheet's saturation
 */
public record KneeBh(double initialPermeability, double saturationPolarisation) implements BhCurve {

	/** Below this χH/Js the closed form of the co-energy loses digits by cancellation and its series takes over. */
	private static final double SERIES_BELOW = 1e-4;

	/** @throws IllegalArgumentException when a parameter is outside its domain */
	public KneeBh {
		Domain.above(1, "initialPermeability", initialPermeability);
		Domain.above(0, "saturationPolarisation", saturationPolarisation);
	}

	/**
	 * The curve that passes through a data sheet's saturation point.
	 *
	 * @param initialPermeability µi, relative, &gt; 1
	 * @param fieldStrength       H of the point, A/m, &gt; 0
	 * @param fluxDensity         B of the point, T; between µ₀H and µ₀µiH
	 * @throws IllegalArgumentException when no such curve exists
	 */
	public static KneeBh through(double initialPermeability, double fieldStrength, double fluxDensity) {
		double polarisation = fluxDensity - MU_0 * fieldStrength;
		double unsaturated = MU_0 * (initialPermeability - 1) * fieldStrength;
		if (!(polarisation > 0 && unsaturated > polarisation)) {
			throw new IllegalArgumentException("no knee curve with initial permeability " + initialPermeability
					+ " passes through " + fluxDensity + " T at " + fieldStrength + " A/m");
		}
		return new KneeBh(initialPermeability, polarisation * unsaturated / (unsaturated - polarisation));
	}

	@Override
	public KneeBh with(double permeability, double polarisationRatio) {
		return new KneeBh(permeability, Domain.above(0, "polarisationRatio", polarisationRatio) * saturationPolarisation);
	}

	private double chi() {
		return MU_0 * (initialPermeability - 1);
	}

	@Override
	public double fluxDensity(double h) {
		double chi = chi();
		return MU_0 * h + chi * h / (1 + chi * Math.abs(h) / saturationPolarisation);
	}

	@Override
	public double slope(double h) {
		double chi = chi();
		double d = 1 + chi * Math.abs(h) / saturationPolarisation;
		return MU_0 + chi / (d * d);
	}

	@Override
	public double curvature(double h) {
		double chi = chi();
		double d = 1 + chi * Math.abs(h) / saturationPolarisation;
		return -Math.signum(h) * 2 * chi * chi / (saturationPolarisation * d * d * d);
	}

	@Override
	public double coEnergyDensity(double h) {
		double chi = chi();
		double a = Math.abs(h);
		double y = chi * a / saturationPolarisation;
		if (y < SERIES_BELOW) {
			return 0.5 * MU_0 * a * a + chi * a * a * (0.5 - y / 3 + y * y / 4 - y * y * y / 5);
		}
		return 0.5 * MU_0 * a * a + saturationPolarisation * saturationPolarisation / chi * (y - Math.log1p(y));
	}

	/** In closed form, the positive root of µ₀qH² + (µ₀ + χ − Bq)H − B = 0 with q = χ/Js, and a Newton step against rounding. */
	@Override
	public double fieldStrength(double b) {
		if (b == 0) {
			return 0;
		}
		double target = Math.abs(b);
		double q = chi() / saturationPolarisation;
		double p = MU_0 + chi() - target * q;
		double root = Math.sqrt(p * p + 4 * MU_0 * q * target);
		// the form without cancellation
		double h = p > 0 ? 2 * target / (p + root) : (root - p) / (2 * MU_0 * q);
		h -= (fluxDensity(h) - target) / slope(h);
		return Math.copySign(h, b);
	}
}
