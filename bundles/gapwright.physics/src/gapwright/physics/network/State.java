package gapwright.physics.network;

import java.util.Arrays;

import gapwright.physics.material.BhCurve;

/** A trial solution: potentials, currents, and what follows from them branch by branch. Reused from step to step. */
final class State {

	private Network network;
	private final int[] unknown;
	private final boolean[] bridge;
	private final int legs;
	final double[] potential;
	final double[] current;
	final double[] mmf;
	final double[] field;
	final double[] flux;
	/** Flux leaving at each unknown, Wb. */
	final double[] imbalance;

	State(Network network, Topology topology) {
		this.network = network;
		unknown = topology.unknown();
		bridge = topology.bridges();
		legs = network.legCount();
		potential = new double[topology.unknowns()];
		current = new double[network.windingCount()];
		mmf = new double[network.branchCount()];
		field = new double[legs];
		flux = new double[network.branchCount()];
		imbalance = new double[topology.unknowns()];
	}

	/** @param other of the same structure */
	void exchange(Network other) {
		network = other;
	}

	void copyFrom(State other) {
		System.arraycopy(other.potential, 0, potential, 0, potential.length);
		System.arraycopy(other.current, 0, current, 0, current.length);
		System.arraycopy(other.field, 0, field, 0, field.length);
	}

	/** Solves every leg at the potentials and currents set; field strengths serve as first guesses. */
	void evaluate() {
		for (int k = 0; k < legs; k++) {
			mmf[k] = network.magnetMmf(k);
		}
		for (int c = 0; c < network.coilCount(); c++) {
			mmf[network.coilLeg(c)] += network.coilTurns(c) * current[network.coilWinding(c)];
		}
		Arrays.fill(imbalance, 0);
		for (int k = 0; k < flux.length; k++) {
			if (bridge[k]) {
				flux[k] = 0;
				if (k < legs) {
					field[k] = 0;
				}
				continue;
			}
			int a = unknown[network.from(k)];
			int b = unknown[network.to(k)];
			double drop = (a < 0 ? 0 : potential[a]) - (b < 0 ? 0 : potential[b]);
			if (k < legs) {
				mmf[k] += drop;
				legFlux(k);
			} else {
				mmf[k] = drop;
				flux[k] = network.permeance(k - legs) * drop;
			}
			if (a >= 0) {
				imbalance[a] += flux[k];
			}
			if (b >= 0) {
				imbalance[b] -= flux[k];
			}
		}
	}

	private void legFlux(int k) {
		BhCurve curve = network.curve(k);
		double area = network.ironArea(k);
		double reluctance = network.seriesReluctance(k);
		double h = LegKernel.fieldStrength(curve, mmf[k], field[k], network.pathLength(k), reluctance * area);
		field[k] = h;
		// a leg that is all gap: B(H) would only add the rounding of the inverse
		flux[k] = network.pathLength(k) == 0 ? mmf[k] / reluctance : area * curve.fluxDensity(h);
	}

	/** dφ/df of every branch, H; 0 on bridges. */
	void conductances(double[] g) {
		for (int k = 0; k < flux.length; k++) {
			if (bridge[k]) {
				g[k] = 0;
			} else if (k >= legs) {
				g[k] = network.permeance(k - legs);
			} else if (network.pathLength(k) == 0) {
				g[k] = 1 / network.seriesReluctance(k);
			} else {
				g[k] = LegKernel.conductance(network.curve(k).slope(field[k]), network.pathLength(k),
						network.ironArea(k), network.seriesReluctance(k));
			}
		}
	}

	/** Ψ = Σ A·l·w′(H) + ½R·φ² over legs, ½P·Δu² over air paths: the co-energy, J. */
	double coEnergy() {
		double sum = 0;
		for (int k = 0; k < flux.length; k++) {
			if (bridge[k]) {
				continue;
			}
			if (k >= legs) {
				sum += 0.5 * flux[k] * mmf[k];
			} else {
				double iron = network.ironArea(k) * network.pathLength(k);
				sum += (iron == 0 ? 0 : iron * network.curve(k).coEnergyDensity(field[k]))
						+ 0.5 * network.seriesReluctance(k) * flux[k] * flux[k];
			}
		}
		return sum;
	}

	double linkage(int winding) {
		double sum = 0;
		for (int c = 0; c < network.coilCount(); c++) {
			if (network.coilWinding(c) == winding) {
				sum += network.coilTurns(c) * flux[network.coilLeg(c)];
			}
		}
		return sum;
	}

	/** Σ |turns·flux|: the scale against which a winding's linkage is known, since coils may oppose. Wb. */
	double linkageScale(int winding) {
		double sum = 0;
		for (int c = 0; c < network.coilCount(); c++) {
			if (network.coilWinding(c) == winding) {
				sum += Math.abs(network.coilTurns(c) * flux[network.coilLeg(c)]);
			}
		}
		return sum;
	}

	/** Σ |turns| of a winding. */
	double turns(int winding) {
		double sum = 0;
		for (int c = 0; c < network.coilCount(); c++) {
			sum += network.coilWinding(c) == winding ? Math.abs(network.coilTurns(c)) : 0;
		}
		return sum;
	}

	/**
	 * What of a flux would change if a potential, a source or a field changed by as much as itself, Wb: a short leg of
	 * high permeability, or a steep knee far out, magnifies their rounding.
	 */
	double fluxMagnified(double[] conductance) {
		double largest = 0;
		for (int k = 0; k < flux.length; k++) {
			if (bridge[k]) {
				continue;
			}
			int a = unknown[network.from(k)];
			int b = unknown[network.to(k)];
			double first = a < 0 ? 0 : potential[a];
			double second = b < 0 ? 0 : potential[b];
			double scale = Math.max(Math.max(Math.abs(first), Math.abs(second)), Math.abs(mmf[k] - (first - second)));
			largest = Math.max(largest, conductance[k] * scale);
			if (k < legs) {
				largest = Math.max(largest,
						network.ironArea(k) * network.curve(k).slope(field[k]) * Math.abs(field[k]));
			}
		}
		return largest;
	}

	double largestFlux() {
		double largest = 0;
		for (double phi : flux) {
			largest = Math.max(largest, Math.abs(phi));
		}
		return largest;
	}

	double largestImbalance() {
		double largest = 0;
		for (double r : imbalance) {
			largest = Math.max(largest, Math.abs(r));
		}
		return largest;
	}

	/** Largest |H·l + R·φ − f| over the largest |f|, a ratio. */
	double mmfDefect() {
		double defect = 0;
		double largest = 0;
		for (int k = 0; k < legs; k++) {
			if (!bridge[k]) {
				largest = Math.max(largest, Math.abs(mmf[k]));
				defect = Math.max(defect, Math.abs(
						field[k] * network.pathLength(k) + network.seriesReluctance(k) * flux[k] - mmf[k]));
			}
		}
		for (int c = 0; c < network.coilCount(); c++) {
			largest = Math.max(largest, Math.abs(network.coilTurns(c) * current[network.coilWinding(c)]));
		}
		for (int k = 0; k < legs; k++) {
			largest = Math.max(largest, Math.abs(network.magnetMmf(k)));
		}
		return largest == 0 ? 0 : defect / largest;
	}
}
