package gapwright.study.sensitivity;

/** A few linear equations with a symmetric positive definite matrix. */
final class SmallSystem {

	private SmallSystem() {
	}

	/** @param a n rows of n + 1, the last the right-hand side; destroyed. @return the solution */
	static double[] solve(double[][] a) {
		int n = a.length;
		for (int k = 0; k < n; k++) {
			for (int i = 0; i < n; i++) {
				double factor = i == k ? 0 : a[i][k] / a[k][k];
				for (int j = k; j <= n && i != k; j++) {
					a[i][j] -= factor * a[k][j];
				}
			}
		}
		double[] x = new double[n];
		for (int i = 0; i < n; i++) {
			x[i] = a[i][n] / a[i][i];
		}
		return x;
	}
}
