package gapwright.physics.network;

import java.util.Arrays;

/**
 * Which branches lie on closed paths, and which joint potentials are unknowns. A bridge of the graph carries no flux,
 * so the solver leaves bridges out: the rest falls into components, each grounded at its first joint.
 */
final class Topology {

	/** In {@link #unknown()}: the joint is its component's reference. */
	static final int GROUND = -1;

	private final boolean[] bridge;
	private final int[] unknown;
	private final int[] ground;
	private final int unknowns;

	Topology(Network network) {
		bridge = findBridges(network);
		int[] component = components(network, bridge);
		int[] first = new int[network.jointCount()];
		Arrays.fill(first, -1);
		ground = new int[network.jointCount()];
		unknown = new int[network.jointCount()];
		int next = 0;
		for (int j = 0; j < unknown.length; j++) {
			if (first[component[j]] >= 0) {
				unknown[j] = next++;
			} else {
				first[component[j]] = j;
				unknown[j] = GROUND;
			}
			ground[j] = first[component[j]];
		}
		unknowns = next;
	}

	/** @return per branch, whether it is on no closed path */
	boolean[] bridges() {
		return bridge;
	}

	/** @return per joint, the index of its potential among the unknowns, or {@link #GROUND} */
	int[] unknown() {
		return unknown;
	}

	/** @return per joint, the reference joint of its component */
	int[] ground() {
		return ground;
	}

	int unknowns() {
		return unknowns;
	}

	/** @return per joint, the number of its component over the branches that are not left out */
	static int[] components(Network network, boolean[] leftOut) {
		int[] parent = new int[network.jointCount()];
		Arrays.setAll(parent, j -> j);
		for (int k = 0; k < network.branchCount(); k++) {
			if (!leftOut[k]) {
				parent[root(parent, network.to(k))] = root(parent, network.from(k));
			}
		}
		int[] number = new int[parent.length];
		Arrays.fill(number, -1);
		int next = 0;
		int[] component = new int[parent.length];
		for (int j = 0; j < parent.length; j++) {
			int root = root(parent, j);
			if (number[root] < 0) {
				number[root] = next++;
			}
			component[j] = number[root];
		}
		return component;
	}

	private static int root(int[] parent, int joint) {
		int j = joint;
		while (parent[j] != j) {
			parent[j] = parent[parent[j]];
			j = parent[j];
		}
		return j;
	}

	/**
	 * Tarjan's bridge search, without recursion since a ladder of legs can be as deep as it is long: a tree branch is a
	 * bridge when nothing below it reaches back above it.
	 */
	private static boolean[] findBridges(Network network) {
		int joints = network.jointCount();
		int branches = network.branchCount();
		int[] start = new int[joints + 1];
		for (int k = 0; k < branches; k++) {
			start[network.from(k) + 1]++;
			start[network.to(k) + 1]++;
		}
		for (int j = 0; j < joints; j++) {
			start[j + 1] += start[j];
		}
		int[] fill = Arrays.copyOf(start, joints);
		int[] incident = new int[2 * branches];
		for (int k = 0; k < branches; k++) {
			incident[fill[network.from(k)]++] = k;
			incident[fill[network.to(k)]++] = k;
		}
		boolean[] bridge = new boolean[branches];
		int[] order = new int[joints];
		int[] reach = new int[joints];
		int[] entered = new int[joints];
		int[] next = Arrays.copyOf(start, joints);
		int[] stack = new int[joints];
		Arrays.fill(entered, -1);
		int clock = 0;
		for (int first = 0; first < joints; first++) {
			if (order[first] != 0) {
				continue;
			}
			int depth = 0;
			stack[0] = first;
			order[first] = reach[first] = ++clock;
			while (depth >= 0) {
				int j = stack[depth];
				if (next[j] < start[j + 1]) {
					int k = incident[next[j]++];
					if (k == entered[j]) {
						continue;
					}
					int other = network.from(k) == j ? network.to(k) : network.from(k);
					if (order[other] == 0) {
						entered[other] = k;
						order[other] = reach[other] = ++clock;
						stack[++depth] = other;
					} else {
						reach[j] = Math.min(reach[j], order[other]);
					}
				} else {
					depth--;
					if (depth >= 0) {
						int above = stack[depth];
						reach[above] = Math.min(reach[above], reach[j]);
						if (reach[j] > order[above]) {
							bridge[entered[j]] = true;
						}
					}
				}
			}
		}
		return bridge;
	}
}
