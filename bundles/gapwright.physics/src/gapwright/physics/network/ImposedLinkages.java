package gapwright.physics.network;

/**
 * The part of a Newton step that belongs to windings with an imposed linkage: their currents are unknowns beside the
 * potentials, and the Schur complement of the potentials is their block of the inductance matrix.
 */
final class ImposedLinkages {

	/** A pivot this small against its diagonal is rounding: the windings are proportional. */
	private static final double SINGULAR = 1e-13;

	private final Inductances inductances;
	private final int[] winding;
	private final double[] linkage;
	private final double[][] all;
	private final double[][] block;
	private final double[] defect;
	private final double[] change;

	ImposedLinkages(Excitation excitation, Inductances inductances) {
		this.inductances = inductances;
		int windings = excitation.windingCount();
		int count = 0;
		for (int w = 0; w < windings; w++) {
			count += excitation.imposesLinkage(w) ? 1 : 0;
		}
		winding = new int[count];
		linkage = new double[count];
		int at = 0;
		for (int w = 0; w < windings; w++) {
			if (excitation.imposesLinkage(w)) {
				winding[at] = w;
				linkage[at++] = excitation.linkage(w);
			}
		}
		all = new double[windings][windings];
		block = new double[count][count];
		defect = new double[count];
		change = new double[count];
	}

	/** Current changes of the imposed windings go to step, and the potentials' steps are corrected for them. */
	void join(State state, double[] conductance, SymmetricFactor factor, double[] potentialStep, double[] currentStep) {
		for (int w = 0; w < all.length; w++) {
			inductances.respond(w, conductance, factor);
		}
		for (int w = 0; w < all.length; w++) {
			inductances.fill(w, conductance, all);
		}
		for (int v = 0; v < winding.length; v++) {
			double[] response = inductances.response(winding[v]);
			defect[v] = state.linkage(winding[v]) - linkage[v];
			double sum = -defect[v];
			// hᵀY⁻¹r, with Y⁻¹h at hand
			for (int i = 0; i < response.length; i++) {
				sum += response[i] * state.imbalance[i];
			}
			change[v] = sum;
			for (int u = 0; u < winding.length; u++) {
				block[v][u] = all[winding[v]][winding[u]];
			}
		}
		solveBlock();
		for (int v = 0; v < winding.length; v++) {
			currentStep[winding[v]] = change[v];
			double[] response = inductances.response(winding[v]);
			for (int i = 0; i < response.length; i++) {
				potentialStep[i] -= response[i] * change[v];
			}
		}
	}

	/** r_λ·Δi: what the imposed windings add to the slope along the step. */
	double slope(State state, double[] currentStep) {
		double sum = 0;
		for (int v = 0; v < winding.length; v++) {
			sum += (state.linkage(winding[v]) - linkage[v]) * currentStep[winding[v]];
		}
		return sum;
	}

	/** Σ λ·i, which the minimised function has less than the co-energy. */
	double work(State state) {
		double sum = 0;
		for (int v = 0; v < winding.length; v++) {
			sum += linkage[v] * state.current[winding[v]];
		}
		return sum;
	}

	/**
	 * @param ratio    of the winding's Σ |turns·flux|, or of its linkage where that is more
	 * @param rounding Wb that any flux may be off by rounding alone
	 * @return whether every imposed linkage is met to within the one or the other
	 */
	boolean isMet(State state, double ratio, double rounding) {
		for (int v = 0; v < winding.length; v++) {
			int w = winding[v];
			double off = Math.abs(state.linkage(w) - linkage[v]);
			double scale = Math.max(state.linkageScale(w), Math.abs(linkage[v]));
			if (!(off <= Math.max(ratio * scale, rounding * state.turns(w)))) {
				return false;
			}
		}
		return true;
	}

	boolean isEmpty() {
		return winding.length == 0;
	}

	private void solveBlock() {
		int m = winding.length;
		for (int i = 0; i < m; i++) {
			double own = block[i][i];
			for (int j = 0; j < i; j++) {
				double sum = block[i][j];
				for (int k = 0; k < j; k++) {
					sum -= block[i][k] * block[j][k];
				}
				block[i][j] = sum / block[j][j];
				own -= block[i][j] * block[i][j];
			}
			if (!(own > SINGULAR * block[i][i])) {
				throw new ImposedLinkagesConflictException(winding[i]);
			}
			block[i][i] = Math.sqrt(own);
		}
		for (int i = 0; i < m; i++) {
			for (int k = 0; k < i; k++) {
				change[i] -= block[i][k] * change[k];
			}
			change[i] /= block[i][i];
		}
		for (int i = m - 1; i >= 0; i--) {
			for (int k = i + 1; k < m; k++) {
				change[i] -= block[k][i] * change[k];
			}
			change[i] /= block[i][i];
		}
	}
}
