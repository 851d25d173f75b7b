package gapwright.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

import gapwright.model.check.Severity;
import gapwright.physics.network.Solution;

/** Leakages and connections at one operating point, from the inductance matrix there. */
final class Pairs {

	private static final double TOO_TIGHT = InductanceMatrix.TOO_TIGHT;
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

	/** Where windings share all their flux, the difference that is their leakage has no digits left. */
	void noteSharedFlux() {
		for (int i = 0; i < inductance.length; i++) {
			List<String> others = new ArrayList<>();
			for (int j = i + 1; j < inductance.length; j++) {
				double both = inductance[i][i] * inductance[j][j];
				boolean shared = both > 0 && 1 - inductance[i][j] * inductance[i][j] / both < TOO_TIGHT;
				if (shared && !hasLeakage(i, j)) {
					others.add("'" + input.windings().get(j).id() + "'");
				}
			}
			if (!others.isEmpty() && input.windings().get(i).whole()) {
				findings.add(new Finding(Severity.NOTE, "coupling-complete", input.windings().get(i).id(), null,
						"it shares all flux of the drawn network with " + String.join(", ", others)
								+ ", so the leakage told between them is 0; a built pair has some",
						"Add a leakage between the windings, or air paths between their legs."));
			}
		}
	}

	private boolean hasLeakage(int i, int j) {
		return input.leakages.stream().anyMatch(l -> l.first() == i && l.second() == j || l.first() == j && l.second() == i);
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
			results.add(new ConnectionResult(data.id(), data.series(), ids,
					Arrays.stream(data.senses()).mapToObj(sense -> sense < 0).toList(), data.series() ? series(data) : parallel(data)));
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
		for (int i = 0; i < n; i++) {
			for (int j = i + 1; j < n; j++) {
				if (1 - l[i][j] * l[i][j] / (l[i][i] * l[j][j]) < TOO_TIGHT) {
					return unequal(data, data.windings()[distinct.get(i)], data.windings()[distinct.get(j)]);
				}
			}
		}
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

	/** All flux of one is the other's, but not with the same linkage: the two would short-circuit each other. */
	private double unequal(StudyInput.ConnectionData data, int first, int second) {
		findings.add(new Finding(Severity.ERROR, "unequal-parallel-turns", data.id(), point,
				"'" + input.windings().get(first).id() + "' and '" + input.windings().get(second).id()
						+ "' share all their flux with different turns or senses: in parallel a current would circulate between them",
				"Give both the same number of turns and the same sense."));
		return Double.NaN;
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
