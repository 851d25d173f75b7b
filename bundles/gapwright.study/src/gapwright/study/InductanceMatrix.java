package gapwright.study;

import java.util.List;

/**
 * Inductances at an operating point's mean currents.
 *
 * @param windings     ids, in the order of rows and columns
 * @param differential H, ∂linkage/∂current, symmetric
 */
public record InductanceMatrix(List<String> windings, double[][] differential) {

	/** @return the differential inductance of a winding, H; NaN when it is not in the matrix */
	public double of(String winding) {
		int at = windings.indexOf(winding);
		return at < 0 ? Double.NaN : differential[at][at];
	}

	/** @return coupling coefficient of two windings, -1 to 1; NaN when either has no inductance */
	public double coupling(String first, String second) {
		int i = windings.indexOf(first);
		int j = windings.indexOf(second);
		return i < 0 || j < 0 ? Double.NaN : differential[i][j] / Math.sqrt(differential[i][i] * differential[j][j]);
	}
}
