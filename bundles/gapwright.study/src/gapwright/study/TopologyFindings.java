package gapwright.study;

import java.util.HashMap;
import java.util.Map;

import gapwright.model.AirPath;
import gapwright.model.Coil;
import gapwright.model.Design;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.Winding;
import gapwright.physics.material.LinearBh;
import gapwright.physics.network.Network;

/** What the shape of the network says: legs, coils and joints on no closed path, islands, air paths too good to be so. */
final class TopologyFindings {

	private final Design design;
	private final Network network;
	private final Map<Leg, Integer> legIndex;
	private final Map<Joint, Integer> joints;
	private final Islands islands;
	private final Findings findings;

	TopologyFindings(Design design, Network network, Map<Leg, Integer> legIndex, Map<Joint, Integer> joints,
			Islands islands, Findings findings) {
		this.design = design;
		this.network = network;
		this.legIndex = legIndex;
		this.joints = joints;
		this.islands = islands;
		this.findings = findings;
	}

	void add() {
		boolean[] noReturn = network.legsWithoutReturn();
		Map<Leg, Integer> lonely = new HashMap<>();
		for (Leg leg : design.getLegs()) {
			Integer index = legIndex.get(leg);
			if (index != null && noReturn[index]) {
				lonely.put(leg, index);
				findings.note("leg-without-return", Lowering.id(leg),
						"the leg lies on no closed path, so it carries no flux",
						"Close the path with legs, or with an air path.");
			}
		}
		for (Winding winding : design.getWindings()) {
			for (Coil coil : winding.getCoils()) {
				if (lonely.containsKey(coil.getLeg())) {
					findings.warning("coil-without-return", Lowering.id(coil),
							"the coil is on a leg without a return path, so it links no flux",
							"Close the path with legs, or with an air path.");
				}
			}
		}
		joints(noReturn);
		int count = islands.count(design);
		if (count > 1) {
			findings.note("network-islands", "", "the design falls into " + count
					+ " networks that no leg or air path connects", "");
		}
		airPaths();
	}

	private void joints(boolean[] noReturn) {
		boolean[] used = new boolean[network.jointCount()];
		boolean[] closed = new boolean[network.jointCount()];
		for (int k = 0; k < network.branchCount(); k++) {
			boolean loop = k >= network.legCount() || !noReturn[k];
			for (int end : new int[] { network.from(k), network.to(k) }) {
				used[end] = true;
				closed[end] |= loop;
			}
		}
		for (Joint joint : design.getJoints()) {
			int index = joints.get(joint);
			if (islands.isSound(joint) && !used[index]) {
				findings.note("joint-without-leg", Lowering.id(joint), "no leg or air path ends at the joint", "");
			} else if (islands.isSound(joint) && !closed[index]) {
				findings.note("joint-without-return", Lowering.id(joint), "the joint lies on no closed path", "");
			}
		}
	}

	/** Permeance of an unsaturated leg is the most its iron and gaps can carry; air beats that only by mistake. */
	private void airPaths() {
		boolean hasIron = false;
		double best = 0;
		for (int k = 0; k < network.legCount(); k++) {
			hasIron |= !(network.curve(k) instanceof LinearBh linear && linear.relativePermeability() == 1);
			double iron = network.curve(k).slope(0) * network.ironArea(k);
			best = Math.max(best, iron / (network.pathLength(k) + network.seriesReluctance(k) * iron));
		}
		int index = 0;
		for (AirPath path : design.getAirPaths()) {
			boolean lowered = islands.isSound(path.getFrom()) && islands.isSound(path.getTo());
			if (lowered && index < network.airPathCount()) {
				double permeance = network.permeance(index++);
				if (hasIron && permeance > best) {
					findings.warning("air-path-large", Lowering.id(path),
							"its permeance of " + Figures.of(permeance * 1e9) + " nH is above that of every leg",
							"Check its unit.");
				}
			}
		}
	}
}
