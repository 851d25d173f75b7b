package gapwright.physics.network;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

import gapwright.physics.material.BhCurve;

/**
 * A reluctance network: joints, legs of iron with whatever lies in series with it, air paths, and windings. Immutable.
 * Elements are numbered from 0 in the order they were added; branches are the legs followed by the air paths.
 */
public final class Network {

	private final int joints;
	private final int[] from;
	private final int[] to;
	private final BhCurve[] curve;
	private final double[] pathLength;
	private final double[] ironArea;
	private final double[] seriesReluctance;
	private final double[] magnetMmf;
	private final double[] permeance;
	private final int windings;
	private final int[] coilWinding;
	private final int[] coilLeg;
	private final double[] coilTurns;
	private final boolean magnets;

	private Network(Builder builder) {
		joints = builder.joints;
		windings = builder.windings;
		int legs = builder.legs.size();
		int branches = legs + builder.airPaths.size();
		from = new int[branches];
		to = new int[branches];
		curve = new BhCurve[legs];
		pathLength = new double[legs];
		ironArea = new double[legs];
		seriesReluctance = new double[legs];
		magnetMmf = new double[legs];
		permeance = new double[branches - legs];
		for (int k = 0; k < legs; k++) {
			LegData leg = builder.legs.get(k);
			from[k] = leg.from;
			to[k] = leg.to;
			curve[k] = leg.curve;
			pathLength[k] = leg.pathLength;
			ironArea[k] = leg.ironArea;
			seriesReluctance[k] = leg.seriesReluctance;
			magnetMmf[k] = leg.magnetMmf;
		}
		for (int p = 0; p < permeance.length; p++) {
			AirData air = builder.airPaths.get(p);
			from[legs + p] = air.from;
			to[legs + p] = air.to;
			permeance[p] = air.permeance;
		}
		int coils = builder.coils.size();
		coilWinding = new int[coils];
		coilLeg = new int[coils];
		coilTurns = new double[coils];
		for (int c = 0; c < coils; c++) {
			CoilData coil = builder.coils.get(c);
			coilWinding[c] = coil.winding;
			coilLeg[c] = coil.leg;
			coilTurns[c] = coil.signedTurns;
		}
		magnets = Arrays.stream(magnetMmf).anyMatch(mmf -> mmf != 0);
	}

	/** The structure of another network with other numbers. */
	private Network(Network like, NetworkValues values) {
		joints = like.joints;
		windings = like.windings;
		from = like.from;
		to = like.to;
		curve = values.curve.clone();
		pathLength = values.pathLength.clone();
		ironArea = values.ironArea.clone();
		seriesReluctance = values.seriesReluctance.clone();
		magnetMmf = values.magnetMmf.clone();
		permeance = values.permeance.clone();
		coilWinding = like.coilWinding;
		coilLeg = like.coilLeg;
		coilTurns = values.coilTurns.clone();
		magnets = Arrays.stream(magnetMmf).anyMatch(mmf -> mmf != 0);
	}

	public static Builder builder() {
		return new Builder();
	}

	/** @return a copy of all numbers, to be changed and given to {@link #with} */
	public NetworkValues values() {
		return new NetworkValues(curve.clone(), pathLength.clone(), ironArea.clone(), seriesReluctance.clone(),
				magnetMmf.clone(), permeance.clone(), coilTurns.clone());
	}

	/**
	 * @return a network alike in structure with those numbers
	 * @throws IllegalArgumentException naming the number, what was found and what is allowed
	 */
	public Network with(NetworkValues values) {
		values.check(legCount(), airPathCount(), coilCount());
		return new Network(this, values);
	}

	/** @return whether another network has the same structure, down to the arrays that {@link #with} shares */
	boolean isAlike(Network other) {
		return from == other.from && to == other.to && coilWinding == other.coilWinding && coilLeg == other.coilLeg;
	}

	public int jointCount() {
		return joints;
	}

	public int legCount() {
		return curve.length;
	}

	public int airPathCount() {
		return permeance.length;
	}

	/** @return legs and air paths together */
	public int branchCount() {
		return from.length;
	}

	public int windingCount() {
		return windings;
	}

	public int coilCount() {
		return coilLeg.length;
	}

	/** @return joint where the branch (leg, or leg count + air path) begins */
	public int from(int branch) {
		return from[branch];
	}

	/** @return joint where the branch (leg, or leg count + air path) ends */
	public int to(int branch) {
		return to[branch];
	}

	public BhCurve curve(int leg) {
		return curve[leg];
	}

	/** @return length of the path in iron, m, ≥ 0 */
	public double pathLength(int leg) {
		return pathLength[leg];
	}

	/** @return iron area, m², &gt; 0 */
	public double ironArea(int leg) {
		return ironArea[leg];
	}

	/** @return reluctance of gaps and magnet in series with the iron, 1/H, ≥ 0 */
	public double seriesReluctance(int leg) {
		return seriesReluctance[leg];
	}

	/** @return MMF of the leg's magnet, A, positive from → to */
	public double magnetMmf(int leg) {
		return magnetMmf[leg];
	}

	/** @return permeance of an air path, H, &gt; 0 */
	public double permeance(int airPath) {
		return permeance[airPath];
	}

	public int coilWinding(int coil) {
		return coilWinding[coil];
	}

	public int coilLeg(int coil) {
		return coilLeg[coil];
	}

	/** @return turns of a coil, negative when it is wound in the opposing sense */
	public double coilTurns(int coil) {
		return coilTurns[coil];
	}

	/** @return whether any leg has a magnet with an MMF; energies then have no natural zero */
	public boolean hasMagnets() {
		return magnets;
	}

	/** @return legs on no closed path; they carry no flux whatever their MMF */
	public boolean[] legsWithoutReturn() {
		return Arrays.copyOf(new Topology(this).bridges(), legCount());
	}

	/**
	 * @return per joint, the number of its island: joints with a connection through legs or air paths, closed or not,
	 *         share one
	 */
	public int[] islands() {
		return Topology.components(this, new boolean[branchCount()]);
	}

	private record LegData(int from, int to, BhCurve curve, double pathLength, double ironArea,
			double seriesReluctance, double magnetMmf) {
	}

	private record AirData(int from, int to, double permeance) {
	}

	private record CoilData(int winding, int leg, double signedTurns) {
	}

	/** Collects the elements of a network; every method refuses what is outside its domain. */
	public static final class Builder {

		private final List<LegData> legs = new ArrayList<>();
		private final List<AirData> airPaths = new ArrayList<>();
		private final List<CoilData> coils = new ArrayList<>();
		private int joints;
		private int windings;

		private Builder() {
		}

		/** @return number of the new joint */
		public int joint() {
			return joints++;
		}

		/**
		 * @param from             joint where positive flux enters
		 * @param to               another joint, where it leaves
		 * @param curve            of the iron
		 * @param pathLength       m, ≥ 0; 0 only with a series reluctance
		 * @param ironArea         m², &gt; 0: gross area times stacking factor
		 * @param seriesReluctance 1/H, ≥ 0: gaps and magnet, by the gross area
		 * @param magnetMmf        A, positive from → to
		 * @return number of the new leg
		 * @throws IllegalArgumentException naming the argument, what was found and what is allowed
		 */
		public int leg(int from, int to, BhCurve curve, double pathLength, double ironArea, double seriesReluctance,
				double magnetMmf) {
			ends(from, to);
			require(curve != null, "curve", null, "given");
			require(pathLength >= 0 && finite(pathLength), "pathLength", pathLength, "finite and at least 0 m");
			require(ironArea > 0 && finite(ironArea), "ironArea", ironArea, "finite and above 0 m²");
			require(seriesReluctance >= 0 && finite(seriesReluctance), "seriesReluctance", seriesReluctance,
					"finite and at least 0 1/H");
			require(pathLength > 0 || seriesReluctance > 0, "pathLength", pathLength,
					"above 0 m in a leg without a gap");
			require(finite(magnetMmf), "magnetMmf", magnetMmf, "finite");
			legs.add(new LegData(from, to, curve, pathLength, ironArea, seriesReluctance, magnetMmf));
			return legs.size() - 1;
		}

		/**
		 * @param permeance H, &gt; 0
		 * @return number of the new air path
		 * @throws IllegalArgumentException naming the argument, what was found and what is allowed
		 */
		public int airPath(int from, int to, double permeance) {
			ends(from, to);
			require(permeance > 0 && finite(permeance), "permeance", permeance, "finite and above 0 H");
			airPaths.add(new AirData(from, to, permeance));
			return airPaths.size() - 1;
		}

		/** @return number of the new winding, as yet without coils */
		public int winding() {
			return windings++;
		}

		/**
		 * Adds a coil to a winding, in series with its others.
		 *
		 * @param signedTurns positive when a positive current drives flux from → to
		 * @throws IllegalArgumentException naming the argument, what was found and what is allowed
		 */
		public Builder coil(int winding, int leg, double signedTurns) {
			require(winding >= 0 && winding < windings, "winding", winding, "below " + windings);
			require(leg >= 0 && leg < legs.size(), "leg", leg, "below " + legs.size());
			require(finite(signedTurns) && signedTurns != 0, "signedTurns", signedTurns, "finite and not 0");
			coils.add(new CoilData(winding, leg, signedTurns));
			return this;
		}

		public Network build() {
			return new Network(this);
		}

		private void ends(int from, int to) {
			require(from >= 0 && from < joints, "from", from, "a joint below " + joints);
			require(to >= 0 && to < joints, "to", to, "a joint below " + joints);
			require(from != to, "to", to, "another joint than from");
		}

		private static boolean finite(double value) {
			return !Double.isNaN(value) && !Double.isInfinite(value);
		}

		private static void require(boolean holds, String name, Object found, String allowed) {
			if (!holds) {
				throw new IllegalArgumentException(name + " = " + found + ": must be " + allowed);
			}
		}
	}
}
