package gapwright.study.sweep;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.CancellationException;

import gapwright.physics.network.Excitation;
import gapwright.physics.network.NetworkSolver;
import gapwright.physics.network.Solution;
import gapwright.study.Progress;
import gapwright.study.StudyInput;

/** Varies the current of one winding at an operating point; each point starts from the one before. */
public final class BiasSweep {

	/** Part of the range to which the current is found where a leg comes near saturation. */
	private static final double FOUND_WITHIN = 1e-9;

	private final StudyInput input;
	private final Progress progress;
	private final int winding;
	private final double[] held;
	private final NetworkSolver solver;
	private final SweepRequest request;
	private final StudyInput.PointData point;
	private Solution warm;

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
			progress.done((double) (i + 1) / count);
		}
		List<SweepLeg> legs = new ArrayList<>();
		for (int k = 0; k < density.length; k++) {
			double saturation = input.legs().get(k).saturation().at(point.celsius());
			double near = saturation * input.nearFraction();
			legs.add(new SweepLeg(input.legs().get(k).id(), density[k], saturation, near, reaches(k, current, density[k], near),
					reaches(k, current, density[k], saturation)));
		}
		return new SweepResult(point.id(), request.winding(), current, linkage, apparent, differential, legs);
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

	/** Scans outwards from the least current of both senses, then halves between the points where the limit is passed. */
	private double reaches(int leg, double[] current, double[] density, double limit) {
		Integer[] outwards = new Integer[current.length];
		Arrays.setAll(outwards, i -> i);
		Arrays.sort(outwards, (i, j) -> Double.compare(Math.abs(current[i]), Math.abs(current[j])));
		for (int i : outwards) {
			if (Math.abs(density[i]) >= limit) {
				int inwards = i > 0 && Math.abs(current[i - 1]) < Math.abs(current[i]) ? i - 1 : i + 1;
				boolean isBelow = inwards < current.length && Math.abs(current[inwards]) < Math.abs(current[i])
						&& Math.abs(density[inwards]) < limit;
				return isBelow ? between(leg, current[inwards], current[i], limit) : current[i];
			}
		}
		return Double.NaN;
	}

	private double between(int leg, double below, double above, double limit) {
		double low = below;
		double high = above;
		while (Math.abs(high - low) > FOUND_WITHIN * Math.abs(request.to() - request.from())) {
			double middle = (low + high) / 2;
			if (Math.abs(solve(middle).legFluxDensity()[leg]) >= limit) {
				high = middle;
			} else {
				low = middle;
			}
		}
		return high;
	}
}
