package gapwright.physics.network;

import java.util.Arrays;

/** For small networks: the lower triangle row by row, no search, no allocation. */
final class DenseFactor implements SymmetricFactor {

	private final int n;
	private final double[] a;
	private final int[] rowOf;
	private final int[] columnOf;

	/** @param first, second unknown at either end of each branch, negative where there is none; both negative: ignored */
	DenseFactor(int unknowns, int[] first, int[] second) {
		n = unknowns;
		a = new double[n * n];
		rowOf = first;
		columnOf = second;
	}

	@Override
	public int factor(double[] conductance) {
		Arrays.fill(a, 0);
		for (int k = 0; k < rowOf.length; k++) {
			int i = rowOf[k];
			int j = columnOf[k];
			double g = conductance[k];
			if (i >= 0) {
				a[i * n + i] += g;
			}
			if (j >= 0) {
				a[j * n + j] += g;
				if (i >= 0) {
					a[i > j ? i * n + j : j * n + i] -= g;
				}
			}
		}
		for (int i = 0; i < n; i++) {
			int row = i * n;
			for (int j = 0; j < i; j++) {
				int other = j * n;
				double sum = a[row + j];
				for (int k = 0; k < j; k++) {
					sum -= a[row + k] * a[other + k];
				}
				a[row + j] = sum * a[other + j];
			}
			double pivot = a[row + i];
			for (int k = 0; k < i; k++) {
				pivot -= a[row + k] * a[row + k];
			}
			if (!(pivot > 0)) {
				return i;
			}
			// the diagonal keeps the reciprocal: a multiplication costs less than a division
			a[row + i] = 1 / Math.sqrt(pivot);
		}
		return -1;
	}

	@Override
	public void solve(double[] b) {
		for (int i = 0; i < n; i++) {
			double sum = b[i];
			int row = i * n;
			for (int k = 0; k < i; k++) {
				sum -= a[row + k] * b[k];
			}
			b[i] = sum * a[row + i];
		}
		for (int i = n - 1; i >= 0; i--) {
			double x = b[i] * a[i * n + i];
			b[i] = x;
			int row = i * n;
			for (int k = 0; k < i; k++) {
				b[k] -= a[row + k] * x;
			}
		}
	}
}
