package gapwright.physics.material;

import java.util.Arrays;
import java.util.stream.DoubleStream;

/**
 * A material between two curves of its own, as at a temperature between two measured ones: at every flux density the
 * field strength is the weighted mean of both, H(B) = (1 − s)·H₁(B) + s·H₂(B). Rises strictly because both do. All
 * else follows without approximation from dH/dB and d²H/dB² and from the co-energies, which add with the same weights,
 * w′ = (1 − s)·w₁′(H₁) + s·w₂′(H₂), because ∫H dB does. Source: linear interpolation of the field strength in
 * temperature; own rule.
 *
 * @param first  at share 0
 * @param second at share 1
 * @param share  s, from 0 to 1
 */
public record BlendedBh(BhCurve first, BhCurve second, double share) implements BhCurve {

	/** Halving alone comes to rounding in this many steps from any bracket met. */
	private static final int MOST_STEPS = 200;
	/** A Newton step this small beside the value leaves an error of its square, which is below rounding. */
	private static final double QUADRATIC = 1e-10;

	/** @throws IllegalArgumentException when the share is not from 0 to 1 */
	public BlendedBh {
		if (!(share >= 0 && share <= 1)) {
			throw new IllegalArgumentException("share = " + share + ": must be from 0 to 1");
		}
	}

	@Override
	public double fluxDensity(double h) {
		return Math.copySign(magnitude(Math.abs(h)), h);
	}

	/** Newton's steps on H(B) − H, within the bracket that both curves make. */
	private double magnitude(double h) {
		double b1 = first.fluxDensity(h);
		double b2 = second.fluxDensity(h);
		double low = Math.min(b1, b2);
		double high = Math.max(b1, b2);
		double b = start(h, b1, b2);
		for (int i = 0; i < MOST_STEPS && low < high; i++) {
			double h1 = first.fieldStrength(b);
			double h2 = second.fieldStrength(b);
			double error = h1 + share * (h2 - h1) - h;
			if (error == 0) {
				return b;
			}
			if (error > 0) {
				high = b;
			} else {
				low = b;
			}
			double next = b - error * slope(first.slope(h1), second.slope(h2));
			if (Math.abs(next - b) <= QUADRATIC * b) {
				return next;
			}
			b = next > low && next < high ? next : low + 0.5 * (high - low);
		}
		return b;
	}

	/** Where the tangents of both inverses at this field strength, blended, meet it. */
	private double start(double h, double b1, double b2) {
		double weight1 = (1 - share) / first.slope(h);
		double weight2 = share / second.slope(h);
		double b = (weight1 * b1 + weight2 * b2) / (weight1 + weight2);
		return b >= Math.min(b1, b2) && b <= Math.max(b1, b2) ? b : b1 + share * (b2 - b1);
	}

	/** dB/dH from those of both curves at the same flux density: their weighted harmonic mean. */
	private double slope(double slope1, double slope2) {
		double weight = (1 - share) * slope2 + share * slope1;
		return weight == 0 ? 0 : slope1 * slope2 / weight;
	}

	@Override
	public double slope(double h) {
		double b = fluxDensity(h);
		return slope(first.slope(first.fieldStrength(b)), second.slope(second.fieldStrength(b)));
	}

	/** d²B/dH² = B′³·Σ weight·B″/B′³ of both curves at the same flux density. */
	@Override
	public double curvature(double h) {
		double b = fluxDensity(h);
		double h1 = first.fieldStrength(b);
		double h2 = second.fieldStrength(b);
		double slope1 = first.slope(h1);
		double slope2 = second.slope(h2);
		double weight = (1 - share) * slope2 + share * slope1;
		// both flat at one point: the limit of equal slopes
		double share1 = weight == 0 ? 1 : slope2 / weight;
		double share2 = weight == 0 ? 1 : slope1 / weight;
		return (1 - share) * first.curvature(h1) * share1 * share1 * share1
				+ share * second.curvature(h2) * share2 * share2 * share2;
	}

	@Override
	public double coEnergyDensity(double h) {
		double b = fluxDensity(h);
		return (1 - share) * first.coEnergyDensity(first.fieldStrength(b))
				+ share * second.coEnergyDensity(second.fieldStrength(b));
	}

	@Override
	public double fieldStrength(double b) {
		double h1 = first.fieldStrength(b);
		return h1 + share * (second.fieldStrength(b) - h1);
	}

	/**
	 * Slope of the inverse, dH/dB, which takes no search as that of B(H) does.
	 *
	 * @param fluxDensity T
	 * @return m/H; infinite where a table is flat
	 */
	public double fieldSlope(double fluxDensity) {
		return (1 - share) / first.slope(first.fieldStrength(fluxDensity))
				+ share / second.slope(second.fieldStrength(fluxDensity));
	}

	@Override
	public BlendedBh with(double initialPermeability, double polarisationRatio) {
		return new BlendedBh(first.with(initialPermeability, polarisationRatio),
				second.with(initialPermeability, polarisationRatio), share);
	}

	@Override
	public double[] corners() {
		return DoubleStream.concat(ofCurve(first), ofCurve(second)).sorted().distinct().toArray();
	}

	private DoubleStream ofCurve(BhCurve curve) {
		return Arrays.stream(curve.corners()).map(curve::fluxDensity).map(this::fieldStrength);
	}
}
