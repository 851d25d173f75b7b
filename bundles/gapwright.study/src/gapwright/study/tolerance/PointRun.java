package gapwright.study.tolerance;

import java.util.List;
import java.util.stream.IntStream;

import gapwright.physics.network.Network;
import gapwright.study.StudyInput;
import gapwright.study.sensitivity.FigureSlopes;
import gapwright.study.vary.DesignNumbers;
import gapwright.study.vary.JudgedLegs;
import gapwright.study.vary.PointSolver;

/** One operating point under changed numbers: its figures, and their slopes by every deviation. */
final class PointRun {

	private final StudyInput input;
	private final StudyInput.PointData point;
	private final List<Deviation> deviations;
	/** One a thread, since a solver is not safe for several. */
	private final ThreadLocal<PointSolver> solver;
	private final PointSolver.State nominal;
	private final int[] wholeWindings;
	private final int[] judgedLegs;

	PointRun(StudyInput input, StudyInput.PointData point, List<Deviation> deviations) {
		this.input = input;
		this.point = point;
		this.deviations = deviations;
		solver = ThreadLocal.withInitial(() -> new PointSolver(input, point));
		nominal = solver.get().solve(input.numbers(), point.network(), null);
		wholeWindings = IntStream.range(0, input.windings().size())
				.filter(w -> input.windings().get(w).whole()).toArray();
		judgedLegs = nominal == null ? new int[0] : JudgedLegs.of(nominal);
	}

	/** @return whether there is a solution to vary */
	boolean isSolved() {
		return nominal != null;
	}

	List<Deviation> deviations() {
		return deviations;
	}

	int figureCount() {
		return wholeWindings.length + judgedLegs.length;
	}

	boolean isInductance(int figure) {
		return figure < wholeWindings.length;
	}

	String subject(int figure) {
		return isInductance(figure) ? input.windings().get(wholeWindings[figure]).id()
				: input.legs().get(judgedLegs[figure - wholeWindings.length]).id();
	}

	double[] nominalFigures() {
		double[] figures = new double[figureCount()];
		write(nominal, figures);
		return figures;
	}

	private void write(PointSolver.State state, double[] figures) {
		for (int i = 0; i < wholeWindings.length; i++) {
			figures[i] = state.mean().differentialInductance()[wholeWindings[i]][wholeWindings[i]];
		}
		for (int i = 0; i < judgedLegs.length; i++) {
			figures[wholeWindings.length + i] = state.utilisation(judgedLegs[i]);
		}
	}

	DesignNumbers numbers(double[] shares) {
		DesignNumbers numbers = input.numbers().copy();
		for (int t = 0; t < shares.length; t++) {
			deviations.get(t).apply(numbers, shares[t]);
		}
		return numbers;
	}

	/** @param shares −1 to 1 of each deviation. @return whether there is a solution; the figures are then written */
	boolean figures(double[] shares, double[] figures) {
		return figures(numbers(shares), figures);
	}

	/** @param numbers with the deviations applied */
	boolean figures(DesignNumbers numbers, double[] figures) {
		PointSolver.State state = state(numbers);
		if (state == null) {
			return false;
		}
		write(state, figures);
		for (double figure : figures) {
			if (Double.isNaN(figure)) {
				return false;
			}
		}
		return true;
	}

	private PointSolver.State state(DesignNumbers numbers) {
		try {
			return solver.get().solve(numbers, numbers.network(point.network(), point.celsius()), nominal);
		} catch (IllegalArgumentException e) {
			// a number outside its domain has no solution
			return null;
		}
	}

	/** @return figures × deviations: change of the figure for the whole deviation, by the slopes there; null without a solution */
	double[][] slopes(double[] shares) {
		DesignNumbers numbers = numbers(shares);
		PointSolver.State state = state(numbers);
		if (state == null) {
			return null;
		}
		Network network = numbers.network(point.network(), point.celsius());
		FigureSlopes slopes = new FigureSlopes(input, point, numbers, network, state, judgedLegs);
		double[][] sum = new double[figureCount()][deviations.size()];
		for (int t = 0; t < deviations.size(); t++) {
			Deviation deviation = deviations.get(t);
			for (int i = 0; i < deviation.knobs().size(); i++) {
				double[] column = slopes.of(deviation.knobs().get(i));
				for (int f = 0; f < sum.length; f++) {
					sum[f][t] += column[position(f)] * deviation.amount(i);
				}
			}
		}
		return sum;
	}

	/** Place of a figure among those of a sensitivity study, which has mutual inductances too. */
	private int position(int figure) {
		int w = wholeWindings.length;
		int pairs = w * (w + 1) / 2;
		return isInductance(figure) ? figure * w - figure * (figure - 1) / 2 : pairs + figure - w;
	}
}
