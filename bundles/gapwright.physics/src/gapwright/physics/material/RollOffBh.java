package gapwright.physics.material;

/**
 * A powder core by the roll-off of its incremental permeability under bias, integrated:
 * dB/dH = µ₀ + χ/(1 + (|H|/H½)^c), χ = µ₀(µi − 1). Source: makers' fit of per cent permeability against bias, taken as
 * dB/dH (common practice).
 *
 * @param initialPermeability µi, relative, &gt; 1
 * @param halfFieldStrength   H½, A/m, &gt; 0; where the susceptibility has fallen to one half
 * @param exponent            c, &gt; 1
 */
public record RollOffBh(double initialPermeability, double halfFieldStrength, double exponent) implements BhCurve {

	/** Both series gain at least a factor of two per term. */
	private static final int MOST_TERMS = 80;
	/** Abscissae and weights of the 16-point Gauss-Legendre rule, positive half. */
	private static final double[] NODES = { 0.0950125098376374, 0.2816035507792589, 0.4580167776572274,
			0.6178762444026438, 0.7554044083550030, 0.8656312023878318, 0.9445750230732326, 0.9894009349916499 };
	private static final double[] WEIGHTS = { 0.1894506104550685, 0.1826034150449236, 0.1691565193950025,
			0.1495959888165767, 0.1246289712555339, 0.0951585116824928, 0.0622535239386479, 0.0271524594117541 };
	/** Below 2^-30 the integrand of the co-energy is h to rounding. */
	private static final double SMALLEST_OCTAVE = 0x1p-30;

	/** @throws IllegalArgumentException when a parameter is outside its domain */
	public RollOffBh {
		Domain.above(1, "initialPermeability", initialPermeability);
		Domain.above(0, "halfFieldStrength", halfFieldStrength);
		Domain.above(1, "exponent", exponent);
	}

	/**
	 * The curve of a maker's fit of per cent initial permeability against bias, 1/(a + b·H^c).
	 *
	 * @param initialPermeability µi, relative, &gt; 1
	 * @param a                   &gt; 0; 0.01 in the usual fit, where no bias leaves 100 per cent
	 * @param b                   &gt; 0; for H in A/m. A fit for oersted has 79.5775^c times as much
	 * @param exponent            c, &gt; 1
	 * @throws IllegalArgumentException when a parameter is outside its domain
	 */
	public static RollOffBh ofPerCentFit(double initialPermeability, double a, double b, double exponent) {
		double ratio = Domain.above(0, "a", a) / Domain.above(0, "b", b);
		return new RollOffBh(initialPermeability, Math.pow(ratio, 1 / Domain.above(1, "exponent", exponent)), exponent);
	}

	/** The exponent stays; the half field strength follows, so that the limiting polarisation is what is asked for. */
	@Override
	public RollOffBh with(double permeability, double polarisationRatio) {
		double initial = Domain.above(1, "initialPermeability", permeability);
		return new RollOffBh(initial, halfFieldStrength * Domain.above(0, "polarisationRatio", polarisationRatio)
				* (initialPermeability - 1) / (initial - 1), exponent);
	}

	private double chi() {
		return MU_0 * (initialPermeability - 1);
	}

	@Override
	public double fluxDensity(double h) {
		double integral = integral(Math.abs(h) / halfFieldStrength);
		return MU_0 * h + Math.copySign(chi() * halfFieldStrength * integral, h);
	}

	@Override
	public double slope(double h) {
		return MU_0 + chi() / (1 + Math.pow(Math.abs(h) / halfFieldStrength, exponent));
	}

	@Override
	public double curvature(double h) {
		double y = Math.abs(h) / halfFieldStrength;
		double x = Math.pow(y, exponent);
		double xPerY = Math.pow(y, exponent - 1);
		return -Math.signum(h) * chi() * exponent / halfFieldStrength * xPerY / ((1 + x) * (1 + x));
	}

	/** By parts: ∫₀ʸ I = y·I(y) − ∫₀ʸ h/(1 + h^c) dh, the last octave by octave. */
	@Override
	public double coEnergyDensity(double h) {
		double y = Math.abs(h) / halfFieldStrength;
		double first = y * integral(y) - firstMoment(y);
		return 0.5 * MU_0 * h * h + chi() * halfFieldStrength * halfFieldStrength * first;
	}

	/**
	 * Polarisation the curve tends to, T: χ·H½·(π/c)/sin(π/c). Should be near the material's saturation; far off, the
	 * roll-off was fitted over too short a range.
	 */
	public double limitingPolarisation() {
		double angle = Math.PI / exponent;
		return chi() * halfFieldStrength * angle / Math.sin(angle);
	}

	/** ∫₀ʸ dh/(1 + h^c), by the hypergeometric series in x/(1 + x), or from infinity in its reciprocal. */
	private double integral(double y) {
		if (y == 0) {
			return 0;
		}
		double x = Math.pow(y, exponent);
		if (x <= 1) {
			return y / (1 + x) * series(x / (1 + x), 1 / exponent);
		}
		double angle = Math.PI / exponent;
		double inverse = 1 / x;
		double tail = Math.pow(y, 1 - exponent) / (exponent - 1) / (1 + inverse)
				* series(inverse / (1 + inverse), 1 - 1 / exponent);
		return angle / Math.sin(angle) - tail;
	}

	private static double series(double z, double q) {
		double term = 1;
		double sum = 1;
		for (int n = 0; n < MOST_TERMS && term > 1e-17 * sum; n++) {
			term *= z * (n + 1) / (q + n + 1);
			sum += term;
		}
		return sum;
	}

	private double firstMoment(double y) {
		double sum = 0;
		double high = y;
		while (high > SMALLEST_OCTAVE * y) {
			double low = 0.5 * high;
			double middle = 0.5 * (low + high);
			double half = 0.5 * (high - low);
			double part = 0;
			for (int i = 0; i < NODES.length; i++) {
				part += WEIGHTS[i] * (moment(middle - half * NODES[i]) + moment(middle + half * NODES[i]));
			}
			sum += half * part;
			high = low;
		}
		return sum + 0.5 * high * high;
	}

	private double moment(double h) {
		return h / (1 + Math.pow(h, exponent));
	}
}
