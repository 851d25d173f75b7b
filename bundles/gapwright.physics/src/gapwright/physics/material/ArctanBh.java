package gapwright.physics.material;

/**
 * B = µ₀H + (2Js/π)·atan(κH), κ = πχ/(2Js), χ = µ₀(µi − 1). A sharper knee than {@link KneeBh}. Source: textbook
 * form.
 *
 * @param initialPermeability    µi, relative, &gt; 1
 * @param saturationPolarisation Js, T, &gt; 0; what the polarisation tends to
 */
public record ArctanBh(double initialPermeability, double saturationPolarisation) implements BhCurve {

	/** Below this κH the closed form of the co-energy loses digits by cancellation and its series takes over. */
	private static final double SERIES_BELOW = 1e-3;

	/** @throws IllegalArgumentException when a parameter is outside its domain */
	public ArctanBh {
		Domain.above(1, "initialPermeability", initialPermeability);
		Domain.above(0, "saturationPolarisation", saturationPolarisation);
	}

	@Override
	public ArctanBh with(double permeability, double polarisationRatio) {
		return new ArctanBh(permeability, Domain.above(0, "polarisationRatio", polarisationRatio) * saturationPolarisation);
	}

	private double chi() {
		return MU_0 * (initialPermeability - 1);
	}

	private double kappa() {
		return Math.PI * chi() / (2 * saturationPolarisation);
	}

	@Override
	public double fluxDensity(double h) {
		return MU_0 * h + 2 * saturationPolarisation / Math.PI * Math.atan(kappa() * h);
	}

	@Override
	public double slope(double h) {
		double y = kappa() * h;
		return MU_0 + chi() / (1 + y * y);
	}

	@Override
	public double curvature(double h) {
		double kappa = kappa();
		double y = kappa * h;
		return -2 * chi() * kappa * y / ((1 + y * y) * (1 + y * y));
	}

	@Override
	public double coEnergyDensity(double h) {
		double kappa = kappa();
		double y = kappa * Math.abs(h);
		double shape = y < SERIES_BELOW ? y * y * (0.5 - y * y / 12 + y * y * y * y / 30)
				: y * Math.atan(y) - 0.5 * Math.log1p(y * y);
		return 0.5 * MU_0 * h * h + 2 * saturationPolarisation / (Math.PI * kappa) * shape;
	}
}
