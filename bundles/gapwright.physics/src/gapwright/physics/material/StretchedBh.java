package gapwright.physics.material;

import java.util.Arrays;

/**
 * A curve with its field strength divided by a factor at every flux density: B(H) = B₀(k·H). Initial permeability is k
 * times that of the base, and so is every other slope, the tail beyond saturation included.
 *
 * @param base   any curve
 * @param factor k, &gt; 0
 */
public record StretchedBh(BhCurve base, double factor) implements BhCurve {

	/** @throws IllegalArgumentException when the factor is not above 0 */
	public StretchedBh {
		Domain.above(0, "factor", factor);
	}

	@Override
	public double fluxDensity(double h) {
		return base.fluxDensity(factor * h);
	}

	@Override
	public double slope(double h) {
		return factor * base.slope(factor * h);
	}

	@Override
	public double curvature(double h) {
		return factor * factor * base.curvature(factor * h);
	}

	@Override
	public double coEnergyDensity(double h) {
		return base.coEnergyDensity(factor * h) / factor;
	}

	@Override
	public double fieldStrength(double fluxDensity) {
		return base.fieldStrength(fluxDensity) / factor;
	}

	@Override
	public StretchedBh with(double initialPermeability, double polarisationRatio) {
		return new StretchedBh(base.with(initialPermeability / factor, polarisationRatio), factor);
	}

	@Override
	public double[] corners() {
		return Arrays.stream(base.corners()).map(h -> h / factor).toArray();
	}
}
