package gapwright.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;

import gapwright.model.Design;
import gapwright.model.check.Severity;
import gapwright.physics.network.Excitation;
import gapwright.physics.network.ImposedLinkagesConflictException;
import gapwright.physics.network.Network;
import gapwright.physics.network.NetworkSolver;
import gapwright.physics.network.Solution;

/**
 * Computes a design at all its operating points: at the mean currents, and at both ends of the ripple or voltage swing
 * for the peak flux density that a leg is judged by.
 */
public final class Study {

	/** Part of the largest inductance: what is less is rounding. */
	private static final double NO_INDUCTANCE = 1e-12;

	private final StudyInput input;
	private final BooleanSupplier cancelled;
	private final Map<Network, NetworkSolver> solvers = new IdentityHashMap<>();
	private final Findings findings = new Findings();
	private Solution warm;
	private boolean sharedFluxNoted;

	private Study(StudyInput input, BooleanSupplier cancelled) {
		this.input = input;
		this.cancelled = cancelled;
		input.findings.forEach(findings::add);
	}

	/** Lowers and computes in the calling thread. */
	public static StudyResult of(Design design) {
		return run(Lowering.of(design));
	}

	/** Computes; safe in any thread. */
	public static StudyResult run(StudyInput input) {
		return run(input, () -> false);
	}

	/**
	 * Computes; safe in any thread.
	 *
	 * @param cancelled asked between solves
	 * @throws CancellationException when it answered true
	 */
	public static StudyResult run(StudyInput input, BooleanSupplier cancelled) {
		return new Study(input, cancelled).run();
	}

	private StudyResult run() {
		List<OperatingPointResult> points = new ArrayList<>();
		for (StudyInput.PointData point : input.points) {
			points.add(point.drives() == null ? notSolved(point, 0, Double.NaN) : solve(point));
		}
		LegState worst = LegState.WITHIN;
		for (OperatingPointResult point : points) {
			for (LegResult leg : point.legs()) {
				LegState counts = leg.state() == LegState.UNKNOWN ? LegState.NEAR : leg.state();
				worst = counts.compareTo(worst) > 0 ? counts : worst;
			}
		}
		return new StudyResult(input.design, points, findings.list(), worst);
	}

	private OperatingPointResult solve(StudyInput.PointData point) {
		int windings = input.windings.size();
		double[] mean = point.drives().stream().mapToDouble(StudyInput.DriveData::meanCurrent).toArray();
		Solution atMean = solve(point, Excitation.currents(mean));
		if (!atMean.converged()) {
			return notConverged(point, atMean);
		}
		double[] peak = absolute(atMean.legFluxDensity());
		double[] lowest = atMean.windingCurrent().clone();
		double[] highest = lowest.clone();
		boolean swings = point.drives().stream().anyMatch(d -> d.ripple() != 0 || d.linkageSwing() != 0);
		for (int sign = -1; sign <= 1 && swings; sign += 2) {
			double[] current = new double[windings];
			double[] linkage = new double[windings];
			for (int w = 0; w < windings; w++) {
				StudyInput.DriveData drive = point.drives().get(w);
				current[w] = drive.imposesLinkage() ? Double.NaN : drive.meanCurrent() + sign * drive.ripple() / 2;
				linkage[w] = drive.imposesLinkage() ? atMean.linkage()[w] + sign * drive.linkageSwing() / 2 : Double.NaN;
			}
			Solution end;
			try {
				end = solve(point, Excitation.mixed(current, linkage));
			} catch (ImposedLinkagesConflictException e) {
				findings.add(conflict(point, e.winding(), atMean.differentialInductance()));
				return notSolved(point, 0, Double.NaN);
			}
			if (!end.converged()) {
				return notConverged(point, end);
			}
			double[] there = absolute(end.legFluxDensity());
			for (int k = 0; k < peak.length; k++) {
				peak[k] = Math.max(peak[k], there[k]);
			}
			for (int w = 0; w < windings; w++) {
				lowest[w] = Math.min(lowest[w], end.windingCurrent()[w]);
				highest[w] = Math.max(highest[w], end.windingCurrent()[w]);
			}
		}
		return result(point, atMean, peak, lowest, highest);
	}

	private Finding conflict(StudyInput.PointData point, int winding, double[][] inductance) {
		double largest = 0;
		for (int w = 0; w < inductance.length; w++) {
			largest = Math.max(largest, inductance[w][w]);
		}
		boolean alone = point.drives().stream().filter(StudyInput.DriveData::imposesLinkage).count() == 1;
		String id = input.windings.get(winding).id();
		if (alone || !(inductance[winding][winding] > NO_INDUCTANCE * largest)) {
			return new Finding(Severity.ERROR, "voltage-without-flux", id, point.id(),
					"no flux links it, so it takes up no volt-seconds: its coils lie on no closed path or cancel one another",
					"Close the path of the flux, check the senses of its coils, or give it a current drive.");
		}
		return new Finding(Severity.ERROR, "imposed-linkages-conflict", id, point.id(),
				"its voltage cannot be imposed beside the others': they link the same flux",
				"Give one of them a current drive, or add a leakage path between them.");
	}

	private Solution solve(StudyInput.PointData point, Excitation excitation) {
		if (cancelled.getAsBoolean()) {
			throw new CancellationException();
		}
		NetworkSolver solver = solvers.computeIfAbsent(point.network(), NetworkSolver::new);
		Solution solution = warm == null ? solver.solve(excitation) : solver.solve(excitation, warm);
		if (solution.converged()) {
			warm = solution;
		}
		return solution;
	}

	private static double[] absolute(double[] values) {
		return Arrays.stream(values).map(Math::abs).toArray();
	}

	private OperatingPointResult notConverged(StudyInput.PointData point, Solution solution) {
		findings.add(new Finding(Severity.ERROR, "not-converged", point.id(), point.id(),
				"no solution after " + solution.iterations() + " steps, flux residual "
						+ String.format(Locale.ROOT, "%.1e", solution.fluxResidual()),
				"Please report this design: a solution always exists."));
		return notSolved(point, solution.iterations(), solution.fluxResidual());
	}

	private static OperatingPointResult notSolved(StudyInput.PointData point, int iterations, double residual) {
		return new OperatingPointResult(point.id(), false, iterations, residual, Double.NaN, Double.NaN, List.of(),
				List.of(), List.of(), List.of(), new InductanceMatrix(List.of(), new double[0][]));
	}

	private OperatingPointResult result(StudyInput.PointData point, Solution s, double[] peak, double[] lowest,
			double[] highest) {
		LegJudge judge = new LegJudge(input, point, findings);
		List<LegResult> legs = new ArrayList<>();
		for (int k = 0; k < input.legs.size(); k++) {
			legs.add(judge.judge(k, s, peak[k]));
		}
		List<GapResult> gaps = new ArrayList<>();
		for (StudyInput.GapData gap : input.gaps) {
			gaps.add(new GapResult(gap.id(), gap.leg(), gap.permeance(), gap.fringingFactor(),
					s.legFlux()[gap.legIndex()] / gap.permeance()));
		}
		List<AirPathResult> airPaths = new ArrayList<>();
		for (int p = 0; p < input.airPaths.size(); p++) {
			airPaths.add(new AirPathResult(input.airPaths.get(p), s.airFlux()[p]));
		}
		RippleOnBias.add(input, point, s, findings);
		long carrying = Arrays.stream(s.windingCurrent()).filter(i -> i != 0).count();
		List<WindingResult> windings = new ArrayList<>();
		List<Integer> whole = new ArrayList<>();
		for (int w = 0; w < input.windings.size(); w++) {
			if (!input.windings.get(w).whole()) {
				continue;
			}
			whole.add(w);
			double current = s.windingCurrent()[w];
			boolean alone = carrying == 1 && current != 0 && !input.network.hasMagnets();
			double turns = input.windings.get(w).turns();
			windings.add(new WindingResult(input.windings.get(w).id(), current, s.linkage()[w],
					alone ? s.linkage()[w] / current : Double.NaN, lowest[w], highest[w],
					s.differentialInductance()[w][w] / (turns * turns)));
		}
		double[][] inductance = new double[whole.size()][whole.size()];
		for (int i = 0; i < whole.size(); i++) {
			for (int j = 0; j < whole.size(); j++) {
				inductance[i][j] = s.differentialInductance()[whole.get(i)][whole.get(j)];
			}
		}
		List<String> ids = windings.stream().map(WindingResult::id).toList();
		Pairs pairs = new Pairs(input, point.id(), s, findings);
		if (!sharedFluxNoted) {
			sharedFluxNoted = true;
			pairs.noteSharedFlux();
		}
		return new OperatingPointResult(point.id(), true, s.iterations(), s.fluxResidual(), s.energy(), s.coEnergy(),
				List.copyOf(legs), List.copyOf(gaps), List.copyOf(airPaths), List.copyOf(windings),
				new InductanceMatrix(ids, inductance), pairs.leakages(), pairs.connections());
	}
}
