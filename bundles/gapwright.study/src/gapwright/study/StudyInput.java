package gapwright.study;

import java.util.List;
import java.util.stream.IntStream;

import gapwright.model.TolerancedFeature;
import gapwright.physics.gap.Fringing;
import gapwright.physics.gap.GapGeometry;
import gapwright.physics.leakage.WindingPair;
import gapwright.physics.network.Network;
import gapwright.study.vary.DesignNumbers;

/**
 * A design lowered to plain numbers at one moment: nothing of the model is left in it, so it may be computed with in any
 * thread while the design is edited on. Made by {@link Lowering}.
 */
public final class StudyInput {

	/** What is judged about a leg; index is the network's. @param magnet id of its magnet, or null */
	public record LegData(String id, MaterialData material, String magnet) {

		public SaturationData saturation() {
			return material.saturation();
		}
	}

	/**
	 * A gap whose permeance is known.
	 *
	 * @param firstBar  id of the leg whose width, as drawn, ends the window towards the gap's first end; null where that
	 *                  distance does not depend on a leg's width
	 * @param secondBar likewise towards the other end
	 */
	public record GapData(String id, String leg, int legIndex, Fringing method, GapGeometry geometry, String firstBar,
			String secondBar) {

		double permeance() {
			return method.permeance(geometry);
		}

		double fringingFactor() {
			return method.factor(geometry).value();
		}
	}

	/** How a winding is driven at a point. Mean and ripple for a current; bias and swing for a voltage. */
	public record DriveData(double meanCurrent, double ripple, double linkageSwing, boolean imposesLinkage) {

		static final DriveData NONE = new DriveData(0, 0, 0, false);
	}

	/**
	 * @param drives  one per winding of the network; null when the point cannot be computed
	 * @param network at this temperature; the same for all points where no curve depends on it
	 */
	public record PointData(String id, double celsius, List<DriveData> drives, Network network) {
	}

	/**
	 * @param whole whether all its coils are in the network, so that its linkage is known
	 * @param turns of all coils, whatever their sense
	 */
	public record WindingData(String id, boolean whole, int turns) {
	}

	/** Leakage of two windings, by their index; the pair is null where its sizes make no sense. */
	public record LeakageData(String id, int first, int second, WindingPair pair) {
	}

	/**
	 * A tolerance, on several elements that deviate together.
	 *
	 * @param feature  which value
	 * @param targets  ids of the elements
	 * @param share    greatest deviation as a share of the nominal value; NaN where an amount is given
	 * @param amount   greatest deviation in the value's SI unit; NaN where a share is given
	 * @param normal   normally distributed with the bound at three standard deviations, else uniformly
	 */
	public record ToleranceData(String id, TolerancedFeature feature, List<String> targets, double share, double amount,
			boolean normal) {
	}

	/** Windings joined, by their index, each with its sense, 1 or −1. */
	public record ConnectionData(String id, boolean series, int[] windings, int[] senses) {
	}

	final String design;
	final double nearFraction;
	final Network network;
	final List<LegData> legs;
	final List<GapData> gaps;
	final List<String> airPaths;
	final List<WindingData> windings;
	final List<LeakageData> leakages;
	final List<ConnectionData> connections;
	final List<PointData> points;
	final List<Finding> findings;
	private final List<String> coils;
	private final DesignNumbers numbers;
	private final List<ToleranceData> tolerances;

	StudyInput(String design, double nearFraction, Network network, List<LegData> legs, List<GapData> gaps,
			List<String> airPaths, List<WindingData> windings, List<LeakageData> leakages, List<ConnectionData> connections,
			List<PointData> points, List<Finding> findings, List<String> coils, DesignNumbers numbers,
			List<ToleranceData> tolerances) {
		this.design = design;
		this.nearFraction = nearFraction;
		this.network = network;
		this.legs = List.copyOf(legs);
		this.gaps = List.copyOf(gaps);
		this.airPaths = List.copyOf(airPaths);
		this.windings = List.copyOf(windings);
		this.leakages = List.copyOf(leakages);
		this.connections = List.copyOf(connections);
		this.points = List.copyOf(points);
		this.findings = List.copyOf(findings);
		this.coils = List.copyOf(coils);
		this.numbers = numbers;
		this.tolerances = List.copyOf(tolerances);
	}

	/** @return ids of the coils in the network, in its order */
	public List<String> coils() {
		return coils;
	}

	/** @return the numbers as drawn; copy before changing one */
	public DesignNumbers numbers() {
		return numbers;
	}

	/** @return tolerances without error */
	public List<ToleranceData> tolerances() {
		return tolerances;
	}

	/**
	 * @return the operating point with that id
	 * @throws IllegalArgumentException when it is not there or cannot be computed
	 */
	public PointData computable(String id) {
		PointData point = point(id);
		if (point == null || point.drives() == null) {
			throw new IllegalArgumentException(point == null ? "there is no operating point '" + id + "'"
					: "the operating point '" + id + "' cannot be computed, see the findings");
		}
		return point;
	}

	public String design() {
		return design;
	}

	/** @return of saturation, from which on a leg is near it */
	public double nearFraction() {
		return nearFraction;
	}

	public List<LegData> legs() {
		return legs;
	}

	public List<GapData> gaps() {
		return gaps;
	}

	/** @return ids, in the network's order */
	public List<String> airPaths() {
		return airPaths;
	}

	public List<WindingData> windings() {
		return windings;
	}

	public List<PointData> points() {
		return points;
	}

	/** @return the operating point with that id, or null */
	public PointData point(String id) {
		return points.stream().filter(point -> point.id().equals(id)).findFirst().orElse(null);
	}

	/** @return index of the winding with that id, or -1 */
	public int winding(String id) {
		return IntStream.range(0, windings.size()).filter(w -> windings.get(w).id().equals(id)).findFirst().orElse(-1);
	}

	/** @return largest magnitude of a winding's current at any operating point, ripple included, A; 0 when it is never driven */
	public double largestCurrent(String winding) {
		int w = winding(winding);
		double largest = 0;
		for (PointData point : points) {
			if (w >= 0 && point.drives() != null) {
				DriveData drive = point.drives().get(w);
				largest = Math.max(largest, Math.abs(drive.meanCurrent()) + drive.ripple() / 2);
			}
		}
		return largest;
	}

	/** @return what lowering the design found */
	public List<Finding> findings() {
		return findings;
	}

	/** @return legs and air paths that will be computed with; a measure of the work */
	public int branchCount() {
		return network.branchCount();
	}
}
