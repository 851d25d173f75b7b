package gapwright.study;

import java.util.List;

import gapwright.physics.gap.Fringing;
import gapwright.physics.gap.GapGeometry;
import gapwright.physics.network.Network;

/**
 * A design lowered to plain numbers at one moment: nothing of the model is left in it, so it may be computed with in any
 * thread while the design is edited on. Made by {@link Lowering}.
 */
public final class StudyInput {

	/** What is judged about a leg; index is the network's. */
	record LegData(String id, SaturationData saturation, String material) {
	}

	/**
	 * A gap whose permeance is known.
	 *
	 * @param firstBar  id of the leg whose width, as drawn, ends the window towards the gap's first end; null where that
	 *                  distance does not depend on a leg's width
	 * @param secondBar likewise towards the other end
	 */
	record GapData(String id, String leg, int legIndex, Fringing method, GapGeometry geometry, String firstBar,
			String secondBar) {

		double permeance() {
			return method.permeance(geometry);
		}

		double fringingFactor() {
			return method.factor(geometry).value();
		}
	}

	/** How a winding is driven at a point. Mean and ripple for a current; bias and swing for a voltage. */
	record DriveData(double meanCurrent, double ripple, double linkageSwing, boolean imposesLinkage) {

		static final DriveData NONE = new DriveData(0, 0, 0, false);
	}

	/** @param drives one per winding of the network; null when the point cannot be computed */
	record PointData(String id, double celsius, List<DriveData> drives) {
	}

	/** @param whole whether all its coils are in the network, so that its linkage is known */
	record WindingData(String id, boolean whole) {
	}

	final String design;
	final double nearFraction;
	final Network network;
	final List<LegData> legs;
	final List<GapData> gaps;
	final List<String> airPaths;
	final List<WindingData> windings;
	final List<PointData> points;
	final List<Finding> findings;

	StudyInput(String design, double nearFraction, Network network, List<LegData> legs, List<GapData> gaps,
			List<String> airPaths, List<WindingData> windings, List<PointData> points, List<Finding> findings) {
		this.design = design;
		this.nearFraction = nearFraction;
		this.network = network;
		this.legs = List.copyOf(legs);
		this.gaps = List.copyOf(gaps);
		this.airPaths = List.copyOf(airPaths);
		this.windings = List.copyOf(windings);
		this.points = List.copyOf(points);
		this.findings = List.copyOf(findings);
	}

	/** @return legs and air paths that will be computed with; a measure of the work */
	public int branchCount() {
		return network.branchCount();
	}
}
