package gapwright.physics.material;

import java.util.Arrays;
import java.util.OptionalDouble;

/** The relative permeabilities of a curve, by the terms of IEC 60401-3 and IEC 62044-2 (from memory). */
public final class Permeability {

	/** Share of the greatest differential permeability that is left at the knee (own rule). */
	private static final double LEFT_AT_KNEE = 0.2;
	/** Where the search for the knee begins and ends, A/m: below and above anything a core sees. */
	private static final double LEAST_FIELD = 1e-6;
	private static final double GREATEST_FIELD = 1e9;
	/** Pieces between two corners, or in an octave of field strength, in which the slope is looked at. */
	private static final int PIECES = 8;
	private static final int HALVINGS = 100;

	private Permeability() {
	}

	/** @return lim B/(µ₀H) for H → 0 */
	public static double initial(BhCurve curve) {
		return curve.slope(0) / BhCurve.MU_0;
	}

	/**
	 * Without bias, at a peak field strength.
	 *
	 * @param fieldStrength A/m, finite; 0 gives the initial permeability
	 * @return B/(µ₀H)
	 */
	public static double amplitude(BhCurve curve, double fieldStrength) {
		return fieldStrength == 0 ? initial(curve) : curve.fluxDensity(fieldStrength) / (BhCurve.MU_0 * fieldStrength);
	}

	/**
	 * At a point of the curve; what an incremental permeability tends to for ever smaller loops where there is no
	 * hysteresis.
	 *
	 * @param fieldStrength A/m, finite
	 * @return dB/dH/µ₀
	 */
	public static double differential(BhCurve curve, double fieldStrength) {
		return curve.slope(fieldStrength) / BhCurve.MU_0;
	}

	/**
	 * The smallest flux density, past the steepest point, at which the differential permeability has fallen to a fifth of
	 * its maximum: a saturation derived where no maker gives one. Own rule.
	 *
	 * @return T, &gt; 0; empty where the permeability never falls so far, as without saturation
	 */
	public static OptionalDouble knee(BhCurve curve) {
		double[] fields = fields(curve);
		int steepest = 0;
		for (int i = 1; i < fields.length; i++) {
			if (curve.slope(fields[i]) > curve.slope(fields[steepest])) {
				steepest = i;
			}
		}
		double wanted = LEFT_AT_KNEE * greatest(curve, fields, steepest);
		for (int i = steepest + 1; i < fields.length; i++) {
			if (curve.slope(fields[i]) <= wanted) {
				return OptionalDouble.of(curve.fluxDensity(crossing(curve, wanted, fields[i - 1], fields[i])));
			}
		}
		return OptionalDouble.empty();
	}

	/** Slope at the maximum next to the steepest field, by golden section. */
	private static double greatest(BhCurve curve, double[] fields, int steepest) {
		double low = fields[Math.max(0, steepest - 1)];
		double high = fields[Math.min(fields.length - 1, steepest + 1)];
		double golden = 0.5 * (Math.sqrt(5) - 1);
		for (int i = 0; i < HALVINGS; i++) {
			double left = high - golden * (high - low);
			double right = low + golden * (high - low);
			if (curve.slope(left) >= curve.slope(right)) {
				high = right;
			} else {
				low = left;
			}
		}
		return Math.max(curve.slope(fields[steepest]), curve.slope(0.5 * (low + high)));
	}

	private static double crossing(BhCurve curve, double wanted, double from, double to) {
		double low = from;
		double high = to;
		for (int i = 0; i < HALVINGS; i++) {
			double middle = 0.5 * (low + high);
			if (curve.slope(middle) <= wanted) {
				high = middle;
			} else {
				low = middle;
			}
		}
		return high;
	}

	/** Field strengths, rising, close enough together to see every bend. */
	private static double[] fields(BhCurve curve) {
		double[] corners = curve.corners();
		int octaves = (int) Math.ceil(Math.log(GREATEST_FIELD / LEAST_FIELD) / Math.log(2));
		double[] fields = new double[1 + PIECES * (octaves + corners.length)];
		int n = 1;
		for (int i = 0; i < PIECES * octaves; i++) {
			fields[n++] = LEAST_FIELD * Math.pow(2, i / (double) PIECES);
		}
		double before = 0;
		for (double corner : corners) {
			for (int i = 1; i <= PIECES; i++) {
				fields[n++] = before + (corner - before) * i / PIECES;
			}
			before = corner;
		}
		Arrays.sort(fields);
		return fields;
	}
}
