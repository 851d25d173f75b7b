package gapwright.study.sweep;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Set;
import java.util.concurrent.CancellationException;
import java.util.stream.Collectors;
import java.util.stream.IntStream;

import gapwright.physics.network.Excitation;
import gapwright.physics.network.NetworkSolver;
import gapwright.physics.network.Solution;
import gapwright.study.OperatingPointResult;
import gapwright.study.Progress;
import gapwright.study.Study;
import gapwright.study.StudyInput;
import gapwright.study.vary.JudgedLegs;
import gapwright.study.WindingResult;

/** Varies the current of one winding at an operating point; each point starts from the one before. */
public final class BiasSweep {

	/** Part of the current, and of the limit, to which it is found where a leg reaches a limit. */
	private static final double FOUND_WITHIN = 1e-9;
	/** Part of the work that the points of the sweep are; the rest finds where legs reach their limits. */
	private static final double SWEPT = 0.8;

	private final StudyInput input;
	private final Progress progress;
	private final int winding;
	private final double[] held;
	private final NetworkSolver solver;
	private final SweepRequest request;
	private final StudyInput.PointData point;
	private Solution warm;
	private Set<Integer> exact = Set.of();

	private BiasSweep(StudyInput input, SweepRequest request, Progress progress) {
		this.input = input;
		this.request = request;
		this.progress = progress;
		point = input.point(request.operatingPoint());
		if (point == null) {
			throw new IllegalArgumentException("there is no operating point '" + request.operatingPoint() + "'");
		}
		winding = input.winding(request.winding());
		if (winding < 0 || !input.windings().get(winding).whole()) {
			throw new IllegalArgumentException(winding < 0 ? "there is no winding '" + request.winding() + "'"
					: "the winding '" + request.winding() + "' cannot be computed, see the findings");
		}
		if (point.drives() == null) {
			throw new IllegalArgumentException("the operating point '" + point.id() + "' cannot be computed, see the findings");
		}
		held = point.drives().stream().mapToDouble(StudyInput.DriveData::meanCurrent).toArray();
		solver = new NetworkSolver(point.network());
	}

	/**
	 * @param progress asked between points
	 * @throws IllegalArgumentException when the operating point or winding is not there or cannot be computed
	 * @throws CancellationException    when cancelled
	 */
	public static SweepResult run(StudyInput input, SweepRequest request, Progress progress) {
		return new BiasSweep(input, request, progress).run();
	}

	/**
	 * @return largest magnitude of a winding's current at any operating point, A, ripple and what voltages drive included; 0
	 *         when it carries none anywhere
	 */
	public static double largestCurrent(StudyInput input, String winding) {
		double largest = input.largestCurrent(winding);
		int w = input.winding(winding);
		if (w >= 0 && input.points().stream().anyMatch(p -> p.drives() != null && p.drives().get(w).imposesLinkage())) {
			for (OperatingPointResult point : Study.run(input).operatingPoints()) {
				WindingResult there = point.winding(winding);
				if (there != null) {
					largest = Math.max(largest, Math.max(Math.abs(there.lowestCurrent()), Math.abs(there.highestCurrent())));
				}
			}
		}
		return largest;
	}

	private SweepResult run() {
		int count = request.steps() + 1;
		double[] current = new double[count];
		double[] linkage = new double[count];
		double[] apparent = new double[count];
		double[] differential = new double[count];
		double[][] density = new double[input.legs().size()][count];
		boolean alone = !point.network().hasMagnets();
		for (int w = 0; w < held.length; w++) {
			alone &= w == winding || held[w] == 0;
		}
		for (int i = 0; i < count; i++) {
			current[i] = request.from() + (request.to() - request.from()) * i / request.steps();
			Solution s = solve(current[i]);
			linkage[i] = s.linkage()[winding];
			differential[i] = s.differentialInductance()[winding][winding];
			apparent[i] = !alone ? Double.NaN : current[i] == 0 ? differential[i] : linkage[i] / current[i];
			for (int k = 0; k < density.length; k++) {
				density[k][i] = s.legFluxDensity()[k];
			}
			progress.done(SWEPT * (i + 1) / count);
		}
		exact = fullest(density);
		List<SweepLeg> legs = new ArrayList<>();
		for (int k = 0; k < density.length; k++) {
			double saturation = input.legs().get(k).saturation().at(point.celsius());
			double near = saturation * input.nearFraction();
			legs.add(new SweepLeg(input.legs().get(k).id(), density[k], saturation, near, reaches(k, current, density[k], near),
					reaches(k, current, density[k], saturation)));
			progress.done(SWEPT + (1 - SWEPT) * (k + 1) / density.length);
		}
		return new SweepResult(point.id(), request.winding(), current, linkage, apparent, differential, legs);
	}

	/** Finding a current costs some solves for each leg: of a large design only the fullest legs are worth them. */
	private Set<Integer> fullest(double[][] density) {
		int[] legs = IntStream.range(0, density.length).toArray();
		if (legs.length <= JudgedLegs.ALL_UP_TO) {
			return IntStream.of(legs).boxed().collect(Collectors.toSet());
		}
		double[] use = new double[legs.length];
		Arrays.setAll(use, k -> Arrays.stream(density[k]).map(Math::abs).max().orElse(0) / input.legs().get(k).saturation().at(point.celsius()));
		return IntStream.of(legs).boxed().filter(k -> !Double.isNaN(use[k])).sorted(Comparator.comparingDouble(k -> -use[k]))
				.limit(JudgedLegs.FULLEST).collect(Collectors.toSet());
	}

	private Solution solve(double amperes) {
		if (progress.cancelled()) {
			throw new CancellationException();
		}
		held[winding] = amperes;
		Excitation excitation = Excitation.currents(held);
		Solution solution = warm == null ? solver.solve(excitation) : solver.solve(excitation, warm);
		if (solution.converged()) {
			warm = solution;
		}
		return solution;
	}

	/** Scans outwards from the least current, in both senses, then narrows down between the points where the limit is passed. */
	private double reaches(int leg, double[] current, double[] density, double limit) {
		boolean rises = request.to() > request.from();
		double least = Math.max(Math.min(request.from(), request.to()), Math.min(Math.max(request.from(), request.to()), 0));
		double atLeast = Double.NaN;
		for (int i = 0; i < current.length; i++) {
			atLeast = current[i] == least ? density[i] : atLeast;
		}
		if (Double.isNaN(atLeast) && Arrays.stream(density).anyMatch(b -> Math.abs(b) >= limit)) {
			atLeast = solve(least).legFluxDensity()[leg];
		}
		if (Math.abs(atLeast) >= limit) {
			return least;
		}
		double found = Double.NaN;
		for (int sense = -1; sense <= 1; sense += 2) {
			double at = least;
			double there = atLeast;
			for (int n = 0; n < current.length; n++) {
				int i = rises == sense > 0 ? n : current.length - 1 - n;
				if (sense * (current[i] - least) <= 0) {
					continue;
				}
				if (Math.abs(density[i]) >= limit) {
					double passed = between(leg, at, Math.abs(there) - limit, current[i], Math.abs(density[i]) - limit, limit);
					found = Double.isNaN(found) || Math.abs(passed) < Math.abs(found) ? passed : found;
					break;
				}
				at = current[i];
				there = density[i];
			}
		}
		return found;
	}

	/** False position; the end that stays counts half each time (Illinois rule), so that neither stays for long. */
	private double between(int leg, double below, double lacking, double above, double beyond, double limit) {
		if (!exact.contains(leg)) {
			// on a straight line between the two points
			return below + (above - below) * lacking / (lacking - beyond);
		}
		double low = below;
		double high = above;
		double atLow = lacking;
		double atHigh = beyond;
		double least = FOUND_WITHIN * Math.max(Math.abs(above - below), Math.max(Math.abs(above), Math.abs(below)));
		int stays = 0;
		while (Math.abs(high - low) > least) {
			double middle = (low * atHigh - high * atLow) / (atHigh - atLow);
			boolean isInside = Math.min(low, high) < middle && middle < Math.max(low, high);
			middle = isInside ? middle : (low + high) / 2;
			double value = Math.abs(solve(middle).legFluxDensity()[leg]) - limit;
			if (Double.isNaN(value) || Math.abs(value) <= FOUND_WITHIN * limit) {
				return Double.isNaN(value) ? Double.NaN : middle;
			}
			if (value > 0) {
				high = middle;
				atHigh = value;
				atLow = stays > 0 ? atLow / 2 : atLow;
				stays = 1;
			} else {
				low = middle;
				atLow = value;
				atHigh = stays < 0 ? atHigh / 2 : atHigh;
				stays = -1;
			}
		}
		return high;
	}
}
