package gapwright.study;

import java.util.ArrayList;
import java.util.List;

import gapwright.model.check.Severity;
import gapwright.physics.network.Solution;

/** Leakages and connections at one operating point, from the inductance matrix there. */
final class Pairs {

	/** 1 − k² below which too few digits of a difference are left. */
	private static final double TOO_TIGHT = 1e-9;
	/** Part of a diagonal by which two windings may differ from being one and the same for small changes. */
	private static final double ALIKE = 1e-9;

	/** Below this two windings round one leg are not wound as usual, or not as drawn (common practice). */
	private static final double USUAL_COUPLING = 0.9;

	private final StudyInput input;
	private final String point;
	private final Findings findings;
	private final double[][] inductance;

	Pairs(StudyInput input, String point, Solution solution, Findings findings) {
		this.input = input;
		this.point = point;
		this.findings = findings;
		inductance = solution.differentialInductance();
	}

	List<LeakageResult> leakages() {
		List<LeakageResult> results = new ArrayList<>();
		for (StudyInput.LeakageData data : input.leakages) {
			int i = data.first();
			int j = data.second();
			double own = data.pair().inductance(input.windings.get(i).turns());
			double mutual = inductance[i][j];
			double uncoupled = inductance[i][i] - mutual * mutual / inductance[j][j];
			// windings round one leg share all its flux: what is left is rounding
			double drawn = uncoupled > TOO_TIGHT * inductance[i][i] ? uncoupled : 0;
			double coupling = mutual / Math.sqrt((inductance[i][i] + own) * inductance[j][j]);
			if (Math.abs(coupling) < USUAL_COUPLING) {
				findings.add(new Finding(Severity.NOTE, "coupling-low", data.id(), point,
						"the windings couple with " + Figures.of(coupling) + ", round one leg 0.98 to 0.999 are usual",
						"Check the sizes, or interleave the windings."));
			}
			results.add(new LeakageResult(data.id(), input.windings.get(i).id(), input.windings.get(j).id(), own,
					data.pair().rogowskiFactor(), own + drawn, coupling));
		}
		return results;
	}

	List<ConnectionResult> connections() {
		List<ConnectionResult> results = new ArrayList<>();
		for (StudyInput.ConnectionData data : input.connections) {
			List<String> ids = new ArrayList<>();
			for (int w : data.windings()) {
				ids.add(input.windings.get(w).id());
			}
			results.add(new ConnectionResult(data.id(), data.series(), ids, data.series() ? series(data) : parallel(data)));
		}
		return results;
	}

	/** sᵀLs */
	private double series(StudyInput.ConnectionData data) {
		double sum = 0;
		for (int i = 0; i < data.windings().length; i++) {
			for (int j = 0; j < data.windings().length; j++) {
				sum += data.senses()[i] * data.senses()[j] * inductance[data.windings()[i]][data.windings()[j]];
			}
		}
		return sum;
	}

	/** 1/(sᵀL⁻¹s); windings that are one for all flux count once, since between them the current may share in any way. */
	private double parallel(StudyInput.ConnectionData data) {
		List<Integer> distinct = new ArrayList<>();
		for (int i = 0; i < data.windings().length; i++) {
			int mine = i;
			if (distinct.stream().noneMatch(other -> alike(data, mine, other))) {
				distinct.add(i);
			}
		}
		int n = distinct.size();
		double[][] l = new double[n][n + 1];
		for (int i = 0; i < n; i++) {
			for (int j = 0; j < n; j++) {
				l[i][j] = signed(data, distinct.get(i), distinct.get(j));
			}
			l[i][n] = 1;
		}
		double sum = 0;
		double[] currents = solve(l);
		if (currents == null) {
			findings.add(new Finding(Severity.WARNING, "parallel-undetermined", data.id(), point,
					"the windings' fluxes depend on one another, so their inductance in parallel cannot be told",
					"Join only two of them, or draw the leakage between them."));
			return Double.NaN;
		}
		for (double current : currents) {
			sum += current;
		}
		return 1 / sum;
	}

	private double signed(StudyInput.ConnectionData data, int i, int j) {
		return data.senses()[i] * data.senses()[j] * inductance[data.windings()[i]][data.windings()[j]];
	}

	private boolean alike(StudyInput.ConnectionData data, int i, int j) {
		double own = signed(data, i, i);
		return Math.abs(signed(data, i, j) - own) <= ALIKE * own && Math.abs(signed(data, j, j) - own) <= ALIKE * own;
	}

	/** Cholesky-like elimination of a symmetric positive matrix with one right-hand side; null when it is singular. */
	private static double[] solve(double[][] a) {
		int n = a.length;
		for (int k = 0; k < n; k++) {
			double largest = 0;
			for (double[] row : a) {
				largest = Math.max(largest, Math.abs(row[k]));
			}
			if (!(a[k][k] > ALIKE * largest)) {
				return null;
			}
			for (int i = 0; i < n; i++) {
				if (i != k) {
					double factor = a[i][k] / a[k][k];
					for (int j = k; j <= n; j++) {
						a[i][j] -= factor * a[k][j];
					}
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
