package gapwright.physics.network;

/** A converged solution with the derivatives of every branch there, and the factorised Jacobian. */
final class OperatingState {

	private final Network network;
	private final Solution solution;
	private final boolean[] bridge;
	private final int[] unknown;
	private final int unknowns;
	private final double[] slope;
	private final double[] stiffness;
	private final double[] conductance;
	private final SymmetricFactor factor;

	OperatingState(Network network, Solution solution) {
		this.network = network;
		this.solution = solution;
		Topology topology = new Topology(network);
		bridge = topology.bridges();
		unknown = topology.unknown();
		unknowns = topology.unknowns();
		int legs = network.legCount();
		slope = new double[legs];
		stiffness = new double[legs];
		conductance = new double[network.branchCount()];
		for (int k = 0; k < conductance.length; k++) {
			if (k < legs) {
				slope[k] = LegKernel.flooredSlope(network.curve(k).slope(field(k)));
				stiffness[k] = network.pathLength(k) + network.seriesReluctance(k) * network.ironArea(k) * slope[k];
			}
			if (!bridge[k]) {
				conductance[k] = k < legs ? network.ironArea(k) * slope[k] / stiffness[k]
						: network.permeance(k - legs);
			}
		}
		factor = NetworkSolver.factor(network, topology);
		int failed = factor.factor(conductance);
		if (failed >= 0) {
			throw new IllegalStateException("the Jacobian is not positive definite at unknown " + failed);
		}
	}

	Network network() {
		return network;
	}

	boolean isBridge(int branch) {
		return bridge[branch];
	}

	double current(int winding) {
		return solution.windingCurrent()[winding];
	}

	double flux(int branch) {
		int legs = network.legCount();
		return branch < legs ? solution.legFlux()[branch] : solution.airFlux()[branch - legs];
	}

	double field(int leg) {
		return solution.legFieldStrength()[leg];
	}

	double fluxDensity(int leg) {
		return solution.legFluxDensity()[leg];
	}

	/** @return dB/dH, H/m */
	double slope(int leg) {
		return slope[leg];
	}

	/** @return D = df/dH = l + R·A·B′, m */
	double stiffness(int leg) {
		return stiffness[leg];
	}

	/** @return dG/dH = A·B″·l/D², H per A/m: how the leg's permeance follows its field strength */
	double conductanceSlope(int leg) {
		double d = stiffness[leg];
		return network.ironArea(leg) * network.curve(leg).curvature(field(leg)) * network.pathLength(leg) / (d * d);
	}

	/** @return G = dφ/df, H; 0 on a bridge */
	double conductance(int branch) {
		return conductance[branch];
	}

	/** @return C·Y⁻¹·Cᵀ·v over all branches, v one value per branch */
	double[] throughNetwork(double[] v) {
		double[] x = new double[unknowns];
		for (int k = 0; k < v.length; k++) {
			if (bridge[k]) {
				continue;
			}
			int a = unknown[network.from(k)];
			int b = unknown[network.to(k)];
			if (a >= 0) {
				x[a] += v[k];
			}
			if (b >= 0) {
				x[b] -= v[k];
			}
		}
		factor.solve(x);
		double[] drop = new double[v.length];
		for (int k = 0; k < v.length; k++) {
			int a = unknown[network.from(k)];
			int b = unknown[network.to(k)];
			drop[k] = bridge[k] ? 0 : (a < 0 ? 0 : x[a]) - (b < 0 ? 0 : x[b]);
		}
		return drop;
	}
}
