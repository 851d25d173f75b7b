package gapwright.physics.material;

/**
 * B = µ₀·µr·H.
 *
 * @param relativePermeability µr, ≥ 1
 */
public record LinearBh(double relativePermeability) implements BhCurve {

	/** @throws IllegalArgumentException when µr is below 1 or not finite */
	public LinearBh {
		Domain.atLeast(1, "relativePermeability", relativePermeability);
	}

	@Override
	public LinearBh with(double permeability, double polarisationRatio) {
		return new LinearBh(permeability);
	}

	@Override
	public double fluxDensity(double h) {
		return MU_0 * relativePermeability * h;
	}

	@Override
	public double slope(double h) {
		return MU_0 * relativePermeability;
	}

	@Override
	public double curvature(double h) {
		return 0;
	}

	@Override
	public double coEnergyDensity(double h) {
		return 0.5 * MU_0 * relativePermeability * h * h;
	}

	@Override
	public double fieldStrength(double b) {
		return b / (MU_0 * relativePermeability);
	}
}
