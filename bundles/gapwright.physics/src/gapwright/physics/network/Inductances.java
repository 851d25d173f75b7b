package gapwright.physics.network;

import java.util.Arrays;

/**
 * Differential inductances from the factorised Jacobian: with W = N − C·Y⁻¹·CᵀG·N, L = NᵀG·W (exact; one
 * back-substitution per winding). WᵀGW would need the air paths in its sum, this form does not.
 */
final class Inductances {

	private final Network network;
	private final CoilTable coils;
	private final boolean[] bridge;
	private final int[] unknown;
	/** Y⁻¹CᵀG·N_w per winding. */
	private final double[][] response;
	private final double[] turnsOnLeg;

	Inductances(Network network, Topology topology, CoilTable coils) {
		this.network = network;
		this.coils = coils;
		bridge = topology.bridges();
		unknown = topology.unknown();
		response = new double[network.windingCount()][topology.unknowns()];
		turnsOnLeg = new double[network.legCount()];
	}

	/** @return Y⁻¹CᵀG·N_w as of the last {@link #respond} */
	double[] response(int winding) {
		return response[winding];
	}

	/** Writes CᵀG·N_w, the flux leaving each joint per ampere with all potentials held, Wb/A. */
	void source(int winding, double[] conductance, double[] out) {
		Arrays.fill(out, 0);
		for (int c = 0; c < coils.coils(winding); c++) {
			int k = coils.leg(winding, c);
			if (bridge[k]) {
				continue;
			}
			double perAmpere = conductance[k] * coils.turns(winding, c);
			int a = unknown[network.from(k)];
			int b = unknown[network.to(k)];
			if (a >= 0) {
				out[a] += perAmpere;
			}
			if (b >= 0) {
				out[b] -= perAmpere;
			}
		}
	}

	void respond(int winding, double[] conductance, SymmetricFactor factor) {
		source(winding, conductance, response[winding]);
		factor.solve(response[winding]);
	}

	/** Fills row and column of one winding against those numbered up to it; all must have responded. */
	void fill(int j, double[] conductance, double[][] inductance) {
		for (int c = 0; c < coils.coils(j); c++) {
			turnsOnLeg[coils.leg(j, c)] += coils.turns(j, c);
		}
		for (int i = 0; i <= j; i++) {
			double sum = 0;
			for (int c = 0; c < coils.coils(i); c++) {
				int k = coils.leg(i, c);
				if (bridge[k]) {
					continue;
				}
				int a = unknown[network.from(k)];
				int b = unknown[network.to(k)];
				double drop = (a < 0 ? 0 : response[j][a]) - (b < 0 ? 0 : response[j][b]);
				sum += coils.turns(i, c) * conductance[k] * (turnsOnLeg[k] - drop);
			}
			inductance[i][j] = sum;
			inductance[j][i] = sum;
		}
		for (int c = 0; c < coils.coils(j); c++) {
			turnsOnLeg[coils.leg(j, c)] = 0;
		}
	}
}
