package gapwright.study;

import java.util.List;

/**
 * Inductances at an operating point's mean currents.
 *
 * @param windings     ids, in the order of rows and columns
 * @param differential H, ∂linkage/∂current, symmetric
 */
public record InductanceMatrix(List<String> windings, double[][] differential) {

	/** 1 − k² below which a leakage is a difference without digits, and is 0 as far as the network can tell. */
	static final double TOO_TIGHT = 1e-9;

	/** @return the differential inductance of a winding, H; NaN when it is not in the matrix */
	public double of(String winding) {
		int at = windings.indexOf(winding);
		return at < 0 ? Double.NaN : differential[at][at];
	}

	/** @return H between two windings, differential; NaN when either is not in the matrix */
	public double mutual(String first, String second) {
		int i = windings.indexOf(first);
		int j = windings.indexOf(second);
		return i < 0 || j < 0 ? Double.NaN : differential[i][j];
	}

	/**
	 * @return H, what is left at the first winding when the second is short-circuited, L₁₁ − L₁₂²/L₂₂; loses
	 *         log₁₀(1/(1 − k²)) digits, and is 0 where 1 − k² is below 1e-9; NaN when either has no inductance
	 */
	public double leakage(String first, String second) {
		double mutual = mutual(first, second);
		double left = of(first) - mutual * mutual / of(second);
		return left < TOO_TIGHT * of(first) ? 0 : left;
	}

	/** @return coupling coefficient of two windings, -1 to 1; NaN when either has no inductance */
	public double coupling(String first, String second) {
		int i = windings.indexOf(first);
		int j = windings.indexOf(second);
		if (i < 0 || j < 0) {
			return Double.NaN;
		}
		// beyond 1 is rounding alone
		return Math.max(-1, Math.min(1, differential[i][j] / Math.sqrt(differential[i][i] * differential[j][j])));
	}
}
