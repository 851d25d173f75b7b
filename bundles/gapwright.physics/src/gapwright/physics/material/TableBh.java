package gapwright.physics.material;

import java.util.Arrays;

/**
 * A curve through measured points: monotone cubic between them, mirrored in the origin, slope µ₀ (constant
 * polarisation) beyond the last. Slopes at the points by the weighted harmonic mean. Source: Fritsch and Butland 1984
 * (from memory), as in SciPy's PchipInterpolator.
 */
public final class TableBh implements BhCurve {

	private final double[] h;
	private final double[] b;
	private final double[] d;
	/** Coefficients of (H − H_i)² and (H − H_i)³ in each interval. */
	private final double[] c2;
	private final double[] c3;
	/** Co-energy density at each point. */
	private final double[] w;

	/**
	 * @param fieldStrength A/m, rising, from 0 or above
	 * @param fluxDensity   T, rising, as long as fieldStrength; the origin is added if it is missing
	 * @throws IllegalArgumentException naming the first point that does not rise, or when there is none but the origin
	 */
	public TableBh(double[] fieldStrength, double[] fluxDensity) {
		if (fieldStrength.length != fluxDensity.length) {
			throw new IllegalArgumentException(
					fieldStrength.length + " field strengths but " + fluxDensity.length + " flux densities");
		}
		boolean hasOrigin = fieldStrength.length > 0 && fieldStrength[0] == 0 && fluxDensity[0] == 0;
		h = hasOrigin ? fieldStrength.clone() : withZero(fieldStrength);
		b = hasOrigin ? fluxDensity.clone() : withZero(fluxDensity);
		int last = h.length - 1;
		if (last < 1) {
			throw new IllegalArgumentException("a table needs at least one point besides the origin");
		}
		for (int i = 1; i <= last; i++) {
			if (!(h[i] > h[i - 1] && b[i] > b[i - 1]) || Double.isInfinite(h[i]) || Double.isInfinite(b[i])) {
				throw new IllegalArgumentException("point " + (hasOrigin ? i + 1 : i) + " (" + h[i] + " A/m, " + b[i]
						+ " T) does not rise above the one before (" + h[i - 1] + " A/m, " + b[i - 1] + " T)");
			}
		}
		d = slopes(h, b);
		c2 = new double[last];
		c3 = new double[last];
		w = new double[last + 1];
		for (int i = 0; i < last; i++) {
			double step = h[i + 1] - h[i];
			double secant = (b[i + 1] - b[i]) / step;
			c2[i] = (3 * secant - 2 * d[i] - d[i + 1]) / step;
			c3[i] = (d[i] + d[i + 1] - 2 * secant) / (step * step);
			w[i + 1] = w[i] + area(i, step);
		}
	}

	private static double[] withZero(double[] values) {
		double[] longer = new double[values.length + 1];
		System.arraycopy(values, 0, longer, 1, values.length);
		return longer;
	}

	private static double[] slopes(double[] h, double[] b) {
		int last = h.length - 1;
		double[] slope = new double[last + 1];
		// mirrored in the origin, the two secants there are equal
		slope[0] = (b[1] - b[0]) / (h[1] - h[0]);
		for (int i = 1; i < last; i++) {
			double before = h[i] - h[i - 1];
			double after = h[i + 1] - h[i];
			double w1 = 2 * after + before;
			double w2 = after + 2 * before;
			slope[i] = (w1 + w2) / (w1 * before / (b[i] - b[i - 1]) + w2 * after / (b[i + 1] - b[i]));
		}
		slope[last] = last == 1 ? slope[0] : endSlope(h, b, last);
		return slope;
	}

	private static double endSlope(double[] h, double[] b, int last) {
		double h0 = h[last] - h[last - 1];
		double h1 = h[last - 1] - h[last - 2];
		double m0 = (b[last] - b[last - 1]) / h0;
		double m1 = (b[last - 1] - b[last - 2]) / h1;
		// all secants rise, so of the usual limits only the one against a falling end can apply
		return Math.max(0, ((2 * h0 + h1) * m0 - h0 * m1) / (h0 + h1));
	}

	private double area(int i, double s) {
		return s * (b[i] + s * (d[i] / 2 + s * (c2[i] / 3 + s * c3[i] / 4)));
	}

	/** @return index of the interval that holds a, or -1 beyond the last point */
	private int interval(double a) {
		int last = h.length - 1;
		if (a > h[last]) {
			return -1;
		}
		int at = Arrays.binarySearch(h, a);
		return Math.min(at >= 0 ? at : -at - 2, last - 1);
	}

	@Override
	public double fluxDensity(double fieldStrength) {
		double a = Math.abs(fieldStrength);
		int i = interval(a);
		double value;
		if (i < 0) {
			int last = h.length - 1;
			value = b[last] + MU_0 * (a - h[last]);
		} else {
			double s = a - h[i];
			value = b[i] + s * (d[i] + s * (c2[i] + s * c3[i]));
		}
		return Math.copySign(value, fieldStrength);
	}

	@Override
	public double slope(double fieldStrength) {
		double a = Math.abs(fieldStrength);
		int i = interval(a);
		if (i < 0) {
			return MU_0;
		}
		double s = a - h[i];
		return Math.max(0, d[i] + s * (2 * c2[i] + 3 * c3[i] * s));
	}

	@Override
	public double curvature(double fieldStrength) {
		double a = Math.abs(fieldStrength);
		int i = interval(a);
		return i < 0 ? 0 : Math.signum(fieldStrength) * (2 * c2[i] + 6 * c3[i] * (a - h[i]));
	}

	@Override
	public double coEnergyDensity(double fieldStrength) {
		double a = Math.abs(fieldStrength);
		int i = interval(a);
		if (i < 0) {
			int last = h.length - 1;
			double s = a - h[last];
			return w[last] + s * (b[last] + 0.5 * MU_0 * s);
		}
		return w[i] + area(i, a - h[i]);
	}

	@Override
	public double fieldStrength(double fluxDensity) {
		double target = Math.abs(fluxDensity);
		int last = h.length - 1;
		if (target >= b[last]) {
			return Math.copySign(h[last] + (target - b[last]) / MU_0, fluxDensity);
		}
		int at = Arrays.binarySearch(b, target);
		if (at >= 0) {
			return Math.copySign(h[at], fluxDensity);
		}
		return Math.copySign(inverse(-at - 2, target), fluxDensity);
	}

	/** Newton steps on the cubic of interval i, halving wherever one leaves the bracket. */
	private double inverse(int i, double target) {
		double low = h[i];
		double high = h[i + 1];
		double x = low + (high - low) * (target - b[i]) / (b[i + 1] - b[i]);
		for (int n = 0; n < 100; n++) {
			double error = fluxDensity(x) - target;
			if (error == 0) {
				return x;
			}
			if (error > 0) {
				high = x;
			} else {
				low = x;
			}
			double next = x - error / slope(x);
			if (!(next > low && next < high)) {
				next = low + 0.5 * (high - low);
			}
			if (Math.abs(next - x) <= Math.ulp(x)) {
				return next;
			}
			x = next;
		}
		return x;
	}

	/** @throws IllegalArgumentException also when a piece that rises slower than air would fall */
	@Override
	public TableBh with(double initialPermeability, double polarisationRatio) {
		Domain.above(0, "polarisationRatio", polarisationRatio);
		double faster = (Domain.above(1, "initialPermeability", initialPermeability) - 1) / (initialPermeability() - 1);
		if (!(faster > 0)) {
			throw new IllegalArgumentException("the table begins no steeper than air: it has no permeability to change");
		}
		double[] field = new double[h.length];
		double[] flux = new double[h.length];
		for (int i = 1; i < h.length; i++) {
			field[i] = h[i] * polarisationRatio / faster;
			flux[i] = polarisationRatio * (b[i] - MU_0 * h[i]) + MU_0 * field[i];
		}
		return new TableBh(field, flux);
	}

	private double initialPermeability() {
		return d[0] / MU_0;
	}

	@Override
	public double[] corners() {
		return Arrays.copyOfRange(h, 1, h.length);
	}

	/** @return relative slope of the last piece's secant: near 1 where the table ends saturated */
	public double endPermeability() {
		int last = h.length - 1;
		return (b[last] - b[last - 1]) / (h[last] - h[last - 1]) / MU_0;
	}

	/** @return number of points, the origin included */
	public int size() {
		return h.length;
	}

	/** @return A/m at point i, the origin is 0 */
	public double fieldStrengthAt(int i) {
		return h[i];
	}

	/** @return T at point i, the origin is 0 */
	public double fluxDensityAt(int i) {
		return b[i];
	}
}
