package gapwright.physics.network;

import java.util.function.IntUnaryOperator;

/** Copies of a network with something changed that should, or should not, matter. */
final class Rebuild {

	private Rebuild() {
	}

	/** A copy in which new leg k is old leg legOf(k) and new joint j is old joint j renumbered by jointOf. */
	static Network.Builder of(Network n, IntUnaryOperator legOf, IntUnaryOperator jointOf, boolean coils) {
		Network.Builder builder = Network.builder();
		int[] newLeg = new int[n.legCount()];
		for (int j = 0; j < n.jointCount(); j++) {
			builder.joint();
		}
		for (int k = 0; k < n.legCount(); k++) {
			int old = legOf.applyAsInt(k);
			newLeg[old] = k;
			builder.leg(jointOf.applyAsInt(n.from(old)), jointOf.applyAsInt(n.to(old)), n.curve(old), n.pathLength(old),
					n.ironArea(old), n.seriesReluctance(old), n.magnetMmf(old));
		}
		rest(n, jointOf, builder);
		if (coils) {
			for (int c = 0; c < n.coilCount(); c++) {
				builder.coil(n.coilWinding(c), newLeg[n.coilLeg(c)], n.coilTurns(c));
			}
		}
		return builder;
	}

	static Network.Builder withoutMagnets(Network n) {
		Network.Builder builder = Network.builder();
		for (int j = 0; j < n.jointCount(); j++) {
			builder.joint();
		}
		for (int k = 0; k < n.legCount(); k++) {
			builder.leg(n.from(k), n.to(k), n.curve(k), n.pathLength(k), n.ironArea(k), n.seriesReluctance(k), 0);
		}
		rest(n, j -> j, builder);
		for (int c = 0; c < n.coilCount(); c++) {
			builder.coil(n.coilWinding(c), n.coilLeg(c), n.coilTurns(c));
		}
		return builder;
	}

	private static void rest(Network n, IntUnaryOperator jointOf, Network.Builder builder) {
		for (int p = 0; p < n.airPathCount(); p++) {
			int branch = n.legCount() + p;
			builder.airPath(jointOf.applyAsInt(n.from(branch)), jointOf.applyAsInt(n.to(branch)), n.permeance(p));
		}
		for (int w = 0; w < n.windingCount(); w++) {
			builder.winding();
		}
	}
}
