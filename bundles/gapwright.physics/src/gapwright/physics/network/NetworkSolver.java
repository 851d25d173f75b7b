package gapwright.physics.network;

import java.util.Arrays;

/**
 * Finds the fluxes of a reluctance network by minimising its co-energy over the joint potentials. The co-energy is
 * strictly convex because every branch's flux rises with its MMF, so there is one solution and the damped Newton method
 * finds it from any start. Where linkages are imposed, the currents of those windings join the unknowns.
 * <p>
 * Structure (bridges, ordering, work space) is set up once; {@link #solve} allocates nothing but its result. Cost per
 * Newton step: one evaluation of every leg and one Cholesky factorisation, dense below {@value #DENSE_UP_TO} joints,
 * sparse with a fill-reducing order above. Not safe for use by several threads at once.
 * <p>
 * Sources: Ampère's and Gauss's laws; damped Newton: Boyd and Vandenberghe, Convex Optimization, 2004, ch. 9 (from
 * memory).
 */
public final class NetworkSolver {

	/** Up to here a dense triangle is faster than index lists; measured on lattices. */
	private static final int DENSE_UP_TO = 40;
	/** A damped step always succeeds; this only bounds what a defect could cost. */
	private static final int MOST_ITERATIONS = 100;
	/** Interpolation with every third step a halving: enough to part any two doubles. */
	private static final int MOST_TRIALS = 180;
	/** Share of the slope that may be left where a search ends; a half still left hard knees crossed to and fro. */
	private static final double GENTLE = 0.1;
	/** Joint imbalance over the largest flux that counts as balanced. */
	private static final double FLUX_BOUND = 1e-12;
	/** Below this Wb a flux is no flux. */
	private static final double NO_FLUX = 1e-18;
	private static final double MMF_BOUND = 1e-10;
	/** Once balanced, one more step usually gains everything down to here; it is taken when it costs no search. */
	private static final double POLISHED = 1e-15;
	/** Units of rounding of potentials, sources and fields that an imbalance cannot be told from. */
	private static final double ROUNDING = 16 * 0x1p-53;
	private static final double SUFFICIENT_DECREASE = 1e-4;
	/** Near the minimum the change of the co-energy is lost in rounding below this fraction of it. */
	private static final double LOST_IN_ROUNDING = 1e-10;

	private Network network;
	private final Topology topology;
	private final SymmetricFactor factor;
	private Inductances inductances;
	private final double[] conductance;
	private final double[] potentialStep;
	private final double[] currentStep;
	private ImposedLinkages none;
	private State state;
	private State trial;

	public NetworkSolver(Network network) {
		this.network = network;
		topology = new Topology(network);
		factor = factor(network, topology);
		int branches = network.branchCount();
		int unknowns = topology.unknowns();
		inductances = new Inductances(network, topology, new CoilTable(network));
		none = new ImposedLinkages(Excitation.currents(), inductances);
		conductance = new double[branches];
		potentialStep = new double[unknowns];
		currentStep = new double[network.windingCount()];
		state = new State(network, topology);
		trial = new State(network, topology);
	}

	/** @return the factor of the Jacobian that suits the network's size, without numbers as yet */
	static SymmetricFactor factor(Network network, Topology topology) {
		int branches = network.branchCount();
		int[] first = new int[branches];
		int[] second = new int[branches];
		boolean[] bridge = topology.bridges();
		for (int k = 0; k < branches; k++) {
			first[k] = bridge[k] ? Topology.GROUND : topology.unknown()[network.from(k)];
			second[k] = bridge[k] ? Topology.GROUND : topology.unknown()[network.to(k)];
		}
		int unknowns = topology.unknowns();
		return unknowns <= DENSE_UP_TO ? new DenseFactor(unknowns, first, second)
				: new SparseFactor(unknowns, first, second);
	}

	public Network network() {
		return network;
	}

	/**
	 * Goes on with another network of the same structure, without setting the structure up again.
	 *
	 * @param other made by {@link Network#with} from this solver's network, or from what that was made from
	 * @throws IllegalArgumentException when it has another structure
	 */
	public void exchange(Network other) {
		if (!network.isAlike(other)) {
			throw new IllegalArgumentException("the other network has another structure");
		}
		network = other;
		inductances = new Inductances(network, topology, new CoilTable(network));
		none = new ImposedLinkages(Excitation.currents(), inductances);
		state.exchange(network);
		trial.exchange(network);
	}

	/**
	 * Solves from zero potentials.
	 *
	 * @param excitation one entry per winding
	 * @throws IllegalArgumentException         when the excitation has another number of windings
	 * @throws ImposedLinkagesConflictException when imposed linkages do not determine the currents
	 */
	public Solution solve(Excitation excitation) {
		checkCount(excitation);
		Arrays.fill(state.potential, 0);
		Arrays.fill(state.field, 0);
		for (int w = 0; w < state.current.length; w++) {
			state.current[w] = excitation.imposesLinkage(w) ? 0 : excitation.current(w);
		}
		return descend(excitation);
	}

	/**
	 * Solves from an earlier solution of this network, or of one alike in structure; the result is the same to rounding.
	 *
	 * @param start a converged solution
	 */
	public Solution solve(Excitation excitation, Solution start) {
		if (!start.converged() || start.jointPotential().length != network.jointCount()
				|| start.legFlux().length != network.legCount()) {
			return solve(excitation);
		}
		checkCount(excitation);
		int[] unknown = topology.unknown();
		for (int j = 0; j < unknown.length; j++) {
			if (unknown[j] >= 0) {
				state.potential[unknown[j]] = start.jointPotential()[j] - start.jointPotential()[topology.ground()[j]];
			}
		}
		System.arraycopy(start.legFieldStrength(), 0, state.field, 0, state.field.length);
		for (int w = 0; w < state.current.length; w++) {
			state.current[w] = excitation.imposesLinkage(w) ? start.windingCurrent()[w] : excitation.current(w);
		}
		return descend(excitation);
	}

	private void checkCount(Excitation excitation) {
		if (excitation.windingCount() != network.windingCount()) {
			throw new IllegalArgumentException("the excitation has " + excitation.windingCount()
					+ " windings, the network " + network.windingCount());
		}
	}

	private Solution descend(Excitation excitation) {
		ImposedLinkages imposed = excitation.imposesAnyLinkage() ? new ImposedLinkages(excitation, inductances) : none;
		state.evaluate();
		boolean balancedBefore = false;
		for (int iteration = 0; iteration <= MOST_ITERATIONS; iteration++) {
			state.conductances(conductance);
			boolean balanced = isBalanced(imposed);
			if (balanced && (balancedBefore || isPolished(imposed))) {
				return result(iteration);
			}
			if (iteration == MOST_ITERATIONS || factor.factor(conductance) >= 0) {
				return failure(iteration);
			}
			step(imposed);
			if (!search(imposed)) {
				return balanced ? result(iteration) : failure(iteration);
			}
			balancedBefore = balanced;
		}
		throw new AssertionError("the loop returns");
	}

	private boolean isBalanced(ImposedLinkages imposed) {
		if (!(state.mmfDefect() <= MMF_BOUND)) {
			return false;
		}
		double bound = Math.max(NO_FLUX, FLUX_BOUND * state.largestFlux());
		if (state.largestImbalance() <= bound && imposed.isMet(state, FLUX_BOUND, 0)) {
			return true;
		}
		double rounding = ROUNDING * state.fluxMagnified(conductance);
		return state.largestImbalance() <= Math.max(bound, rounding) && imposed.isMet(state, FLUX_BOUND, rounding);
	}

	private boolean isPolished(ImposedLinkages imposed) {
		return state.largestImbalance() <= POLISHED * state.largestFlux() && imposed.isMet(state, POLISHED, 0);
	}

	private void step(ImposedLinkages imposed) {
		for (int i = 0; i < potentialStep.length; i++) {
			potentialStep[i] = -state.imbalance[i];
		}
		factor.solve(potentialStep);
		if (!imposed.isEmpty()) {
			Arrays.fill(currentStep, 0);
			imposed.join(state, conductance, factor, potentialStep, currentStep);
		}
	}

	/**
	 * Takes the full step when the slope along it has not changed sign. Otherwise the minimum along the step is
	 * bracketed, and approached until nine tenths of the slope are gone and the co-energy has fallen enough, or rounding hides
	 * its fall. Stopping at the first fall instead can cross a sharp knee at every step, to and fro, without end.
	 */
	private boolean search(ImposedLinkages imposed) {
		double slope = slope(state, imposed);
		if (tryStep(1, imposed) <= 0) {
			return accept();
		}
		double start = state.coEnergy() - imposed.work(state);
		boolean lostInRounding = Math.abs(slope) < LOST_IN_ROUNDING * Math.abs(start);
		double before = 0;
		double slopeBefore = slope;
		double beyond = 1;
		double slopeBeyond = slope(trial, imposed);
		double t = 1;
		double there = slopeBeyond;
		for (int i = 0; i < MOST_TRIALS; i++) {
			if (there <= 0 && there >= GENTLE * slope || there > 0 && (lostInRounding && there <= 0.9 * -slope
					|| there <= GENTLE * -slope
							&& trial.coEnergy() - imposed.work(trial) <= start + SUFFICIENT_DECREASE * t * slope)) {
				return accept();
			}
			if (there > 0) {
				beyond = t;
				slopeBeyond = there;
			} else {
				before = t;
				slopeBefore = there;
			}
			double share = i % 3 == 2 ? 0.5 : slopeBefore / (slopeBefore - slopeBeyond);
			t = before + share * (beyond - before);
			if (!(t > before && t < beyond)) {
				break;
			}
			there = tryStep(t, imposed);
		}
		if (before == 0) {
			return false;
		}
		// up to there the co-energy falls, by convexity
		tryStep(before, imposed);
		return accept();
	}

	/** @return slope of the minimised function at that fraction of the step */
	private double tryStep(double t, ImposedLinkages imposed) {
		trial.copyFrom(state);
		for (int i = 0; i < potentialStep.length; i++) {
			trial.potential[i] += t * potentialStep[i];
		}
		if (!imposed.isEmpty()) {
			for (int w = 0; w < currentStep.length; w++) {
				trial.current[w] += t * currentStep[w];
			}
		}
		trial.evaluate();
		return slope(trial, imposed);
	}

	private boolean accept() {
		State better = trial;
		trial = state;
		state = better;
		return true;
	}

	private double slope(State at, ImposedLinkages imposed) {
		double sum = imposed.isEmpty() ? 0 : imposed.slope(at, currentStep);
		for (int i = 0; i < potentialStep.length; i++) {
			sum += at.imbalance[i] * potentialStep[i];
		}
		return sum;
	}

	private Solution result(int iterations) {
		if (factor.factor(conductance) >= 0) {
			return failure(iterations);
		}
		int legs = network.legCount();
		int windings = network.windingCount();
		double[] fluxDensity = new double[legs];
		double[] drop = new double[legs];
		for (int k = 0; k < legs; k++) {
			fluxDensity[k] = state.flux[k] / network.ironArea(k);
			drop[k] = state.field[k] * network.pathLength(k);
		}
		double[][] inductance = new double[windings][windings];
		double[] linkage = new double[windings];
		double work = 0;
		for (int w = 0; w < windings; w++) {
			inductances.respond(w, conductance, factor);
			linkage[w] = state.linkage(w);
			work += state.current[w] * linkage[w];
		}
		for (int w = 0; w < windings; w++) {
			inductances.fill(w, conductance, inductance);
		}
		double coEnergy = network.hasMagnets() ? Double.NaN : state.coEnergy();
		double largest = state.largestFlux();
		return new Solution(true, iterations, largest == 0 ? 0 : state.largestImbalance() / largest, state.mmfDefect(),
				Arrays.copyOf(state.flux, legs), fluxDensity, state.field.clone(), drop,
				Arrays.copyOfRange(state.flux, legs, state.flux.length), Potentials.of(network, topology, state),
				state.current.clone(), linkage, inductance, work - coEnergy, coEnergy);
	}

	private Solution failure(int iterations) {
		int windings = network.windingCount();
		double[] perLeg = missing(network.legCount());
		double[][] inductance = new double[windings][];
		Arrays.setAll(inductance, w -> missing(windings));
		double largest = state.largestFlux();
		return new Solution(false, iterations, largest == 0 ? 0 : state.largestImbalance() / largest, state.mmfDefect(),
				perLeg, perLeg, perLeg, perLeg, missing(network.airPathCount()), missing(network.jointCount()),
				missing(windings), missing(windings), inductance, Double.NaN, Double.NaN);
	}

	private static double[] missing(int length) {
		double[] values = new double[length];
		Arrays.fill(values, Double.NaN);
		return values;
	}
}
