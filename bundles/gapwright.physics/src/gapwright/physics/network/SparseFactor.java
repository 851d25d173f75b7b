package gapwright.physics.network;

import java.util.Arrays;

/**
 * For large networks: up-looking sparse Cholesky. Order, elimination tree and the pattern of every row of L are found
 * once; {@link #factor} only fills numbers in. Method: Davis, Direct Methods for Sparse Linear Systems, 2006, ch. 4
 * (from memory).
 */
final class SparseFactor implements SymmetricFactor {

	private final int n;
	private final int[] order;
	/** Upper triangle of the permuted Y by columns: off-diagonal rows, then values; the diagonal apart. */
	private final int[] columnStart;
	private final int[] rowIndex;
	private final double[] offDiagonal;
	private final double[] diagonal;
	/** Where each branch adds its conductance: the two diagonals and the off-diagonal entry, -1 for none. */
	private final int[] diagonalA;
	private final int[] diagonalB;
	private final int[] entry;
	/** Columns met by each row of L, in the order in which to eliminate them. */
	private final int[] patternStart;
	private final int[] pattern;
	/** L by columns without its diagonal. */
	private final int[] factorStart;
	private final int[] factorRow;
	private final double[] factorValue;
	private final double[] pivot;
	private final int[] filled;
	private final double[] work;

	/** @param first, second unknown at either end of each branch, negative where there is none; both negative: ignored */
	SparseFactor(int unknowns, int[] first, int[] second) {
		n = unknowns;
		order = MinimumDegree.order(n, first, second);
		int[] place = new int[n];
		for (int k = 0; k < n; k++) {
			place[order[k]] = k;
		}
		int branches = first.length;
		diagonalA = new int[branches];
		diagonalB = new int[branches];
		entry = new int[branches];
		columnStart = new int[n + 1];
		for (int k = 0; k < branches; k++) {
			diagonalA[k] = first[k] < 0 ? -1 : place[first[k]];
			diagonalB[k] = second[k] < 0 ? -1 : place[second[k]];
			if (diagonalA[k] >= 0 && diagonalB[k] >= 0) {
				columnStart[Math.max(diagonalA[k], diagonalB[k]) + 1]++;
			}
		}
		for (int j = 0; j < n; j++) {
			columnStart[j + 1] += columnStart[j];
		}
		// parallel branches keep entries of their own: adding twice into the work vector is harmless
		int[] fill = Arrays.copyOf(columnStart, n);
		rowIndex = new int[columnStart[n]];
		offDiagonal = new double[rowIndex.length];
		for (int k = 0; k < branches; k++) {
			entry[k] = -1;
			if (diagonalA[k] >= 0 && diagonalB[k] >= 0) {
				entry[k] = fill[Math.max(diagonalA[k], diagonalB[k])]++;
				rowIndex[entry[k]] = Math.min(diagonalA[k], diagonalB[k]);
			}
		}
		diagonal = new double[n];
		int[] parent = eliminationTree();
		patternStart = new int[n + 1];
		int[] size = new int[n];
		int[][] rows = new int[n][];
		int[] mark = new int[n];
		Arrays.fill(mark, -1);
		int[] path = new int[n];
		int[] reach = new int[n];
		for (int k = 0; k < n; k++) {
			int top = reach(k, parent, mark, path, reach);
			rows[k] = Arrays.copyOfRange(reach, top, n);
			for (int j : rows[k]) {
				size[j]++;
			}
			patternStart[k + 1] = patternStart[k] + rows[k].length;
		}
		pattern = new int[patternStart[n]];
		factorStart = new int[n + 1];
		for (int k = 0; k < n; k++) {
			System.arraycopy(rows[k], 0, pattern, patternStart[k], rows[k].length);
			factorStart[k + 1] = factorStart[k] + size[k];
		}
		factorRow = new int[factorStart[n]];
		factorValue = new double[factorStart[n]];
		pivot = new double[n];
		filled = new int[n];
		work = new double[n];
	}

	/** @return entries of L below the diagonal */
	int fill() {
		return factorRow.length;
	}

	private int[] eliminationTree() {
		int[] parent = new int[n];
		int[] ancestor = new int[n];
		for (int k = 0; k < n; k++) {
			parent[k] = -1;
			ancestor[k] = -1;
			for (int p = columnStart[k]; p < columnStart[k + 1]; p++) {
				int i = rowIndex[p];
				while (i != -1 && i < k) {
					int above = ancestor[i];
					ancestor[i] = k;
					if (above == -1) {
						parent[i] = k;
					}
					i = above;
				}
			}
		}
		return parent;
	}

	/** Columns that row k of L meets: everything on the way up the tree from the entries of column k, to reach[top…]. */
	private int reach(int k, int[] parent, int[] mark, int[] path, int[] reach) {
		int top = n;
		mark[k] = k;
		for (int p = columnStart[k]; p < columnStart[k + 1]; p++) {
			int length = 0;
			int i = rowIndex[p];
			while (mark[i] != k) {
				path[length++] = i;
				mark[i] = k;
				i = parent[i];
			}
			while (length > 0) {
				reach[--top] = path[--length];
			}
		}
		return top;
	}

	@Override
	public int factor(double[] conductance) {
		Arrays.fill(diagonal, 0);
		for (int k = 0; k < entry.length; k++) {
			double g = conductance[k];
			if (diagonalA[k] >= 0) {
				diagonal[diagonalA[k]] += g;
			}
			if (diagonalB[k] >= 0) {
				diagonal[diagonalB[k]] += g;
			}
			if (entry[k] >= 0) {
				offDiagonal[entry[k]] = -g;
			}
		}
		System.arraycopy(factorStart, 0, filled, 0, n);
		for (int k = 0; k < n; k++) {
			for (int p = columnStart[k]; p < columnStart[k + 1]; p++) {
				work[rowIndex[p]] += offDiagonal[p];
			}
			double d = diagonal[k];
			for (int q = patternStart[k]; q < patternStart[k + 1]; q++) {
				int j = pattern[q];
				double value = work[j] * pivot[j];
				work[j] = 0;
				int end = filled[j];
				for (int p = factorStart[j]; p < end; p++) {
					work[factorRow[p]] -= factorValue[p] * value;
				}
				d -= value * value;
				factorRow[end] = k;
				factorValue[end] = value;
				filled[j] = end + 1;
			}
			work[k] = 0;
			if (!(d > 0)) {
				Arrays.fill(work, 0);
				return order[k];
			}
			pivot[k] = 1 / Math.sqrt(d);
		}
		return -1;
	}

	@Override
	public void solve(double[] b) {
		for (int k = 0; k < n; k++) {
			work[k] = b[order[k]];
		}
		for (int j = 0; j < n; j++) {
			double x = work[j] * pivot[j];
			work[j] = x;
			for (int p = factorStart[j]; p < factorStart[j + 1]; p++) {
				work[factorRow[p]] -= factorValue[p] * x;
			}
		}
		for (int j = n - 1; j >= 0; j--) {
			double x = work[j];
			for (int p = factorStart[j]; p < factorStart[j + 1]; p++) {
				x -= factorValue[p] * work[factorRow[p]];
			}
			work[j] = x * pivot[j];
		}
		for (int k = 0; k < n; k++) {
			b[order[k]] = work[k];
			work[k] = 0;
		}
	}
}
