package gapwright.physics.network;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.List;

/**
 * Joint potentials of a whole island. The solver grounds each component that remains without bridges; a bridge carries
 * no flux, so its sources alone set the difference between its ends.
 */
final class Potentials {

	private Potentials() {
	}

	/** @return A, one per joint; 0 at the first joint of each island */
	static double[] of(Network network, Topology topology, State state) {
		int[] unknown = topology.unknown();
		double[] potential = new double[network.jointCount()];
		for (int j = 0; j < potential.length; j++) {
			potential[j] = unknown[j] < 0 ? 0 : state.potential[unknown[j]];
		}
		boolean[] bridge = topology.bridges();
		boolean any = false;
		for (boolean one : bridge) {
			any |= one;
		}
		if (any) {
			joinAcrossBridges(network, bridge, state, potential);
		}
		return potential;
	}

	private static void joinAcrossBridges(Network network, boolean[] bridge, State state, double[] potential) {
		int[] component = Topology.components(network, bridge);
		int components = 0;
		for (int c : component) {
			components = Math.max(components, c + 1);
		}
		List<List<Integer>> bridgesOf = new ArrayList<>();
		for (int c = 0; c < components; c++) {
			bridgesOf.add(new ArrayList<>());
		}
		for (int k = 0; k < bridge.length; k++) {
			if (bridge[k]) {
				bridgesOf.get(component[network.from(k)]).add(k);
				bridgesOf.get(component[network.to(k)]).add(k);
			}
		}
		double[] offset = new double[components];
		boolean[] placed = new boolean[components];
		ArrayDeque<Integer> open = new ArrayDeque<>();
		for (int first = 0; first < components; first++) {
			if (placed[first]) {
				continue;
			}
			placed[first] = true;
			open.add(first);
			while (!open.isEmpty()) {
				int c = open.remove();
				for (int k : bridgesOf.get(c)) {
					int a = network.from(k);
					int b = network.to(k);
					// no flux, hence u_a − u_b + F = 0; the state holds F alone for a bridge
					double mmf = k < network.legCount() ? state.mmf[k] : 0;
					int other = component[a] == c ? component[b] : component[a];
					if (placed[other]) {
						continue;
					}
					placed[other] = true;
					offset[other] = component[a] == c ? offset[c] + potential[a] + mmf - potential[b]
							: offset[c] + potential[b] - mmf - potential[a];
					open.add(other);
				}
			}
		}
		for (int j = 0; j < potential.length; j++) {
			potential[j] += offset[component[j]];
		}
	}
}
