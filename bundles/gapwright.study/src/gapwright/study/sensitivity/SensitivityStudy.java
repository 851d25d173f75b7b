package gapwright.study.sensitivity;

import java.util.ArrayList;
import java.util.List;

import gapwright.physics.network.Network;
import gapwright.study.Progress;
import gapwright.study.StudyInput;
import gapwright.study.sensitivity.SensitivityResult.Figure;
import gapwright.study.sensitivity.SensitivityResult.Kind;
import gapwright.study.sensitivity.SensitivityResult.Value;
import gapwright.study.vary.DesignNumbers;
import gapwright.study.vary.JudgedLegs;
import gapwright.study.vary.Knob;
import gapwright.study.vary.Knobs;
import gapwright.study.vary.PointSolver;

/**
 * How every inductance and every leg's utilisation depends on every number of the design; exact, by the adjoint method. Of a
 * large design only the fullest legs, see {@link JudgedLegs}.
 */
public final class SensitivityStudy {

	private SensitivityStudy() {
	}

	/**
	 * @param operatingPoint id
	 * @param progress       asked between parameters
	 * @throws IllegalArgumentException                       when the point is not there or cannot be computed
	 * @throws java.util.concurrent.CancellationException when cancelled
	 */
	public static SensitivityResult of(StudyInput input, String operatingPoint, Progress progress) {
		StudyInput.PointData point = input.computable(operatingPoint);
		DesignNumbers numbers = input.numbers();
		Network network = point.network();
		PointSolver solver = new PointSolver(input, point);
		PointSolver.State state = solver.solve(numbers, network, null);
		if (state == null) {
			throw new IllegalArgumentException("the operating point '" + operatingPoint + "' has no solution, see the findings");
		}
		int[] legs = JudgedLegs.of(state);
		List<Figure> figures = figures(input, state, legs);
		List<Knob> knobs = Knobs.of(input);
		FigureSlopes slopes = new FigureSlopes(input, point, numbers, network, state, legs);
		double[][] derivative = new double[figures.size()][knobs.size()];
		List<Value> values = new ArrayList<>();
		for (int p = 0; p < knobs.size(); p++) {
			Progresses.check(progress);
			Knob knob = knobs.get(p);
			double scale = slopes.scale(knob);
			double[] column = slopes.of(knob);
			for (int f = 0; f < figures.size(); f++) {
				derivative[f][p] = column[f] / scale;
			}
			values.add(new Value(knob.subject(), knob.feature(), slopes.value(knob)));
			progress.done((p + 1.0) / knobs.size());
		}
		return new SensitivityResult(operatingPoint, figures, values, derivative);
	}

	/** The figures of a solved point: inductances of all pairs of whole windings, utilisations of legs with a saturation. */
	static List<Figure> figures(StudyInput input, PointSolver.State state, int[] legs) {
		List<Figure> figures = new ArrayList<>();
		for (int i = 0; i < input.windings().size(); i++) {
			for (int j = i; j < input.windings().size(); j++) {
				if (input.windings().get(i).whole() && input.windings().get(j).whole()) {
					figures.add(new Figure(Kind.INDUCTANCE, input.windings().get(i).id(), input.windings().get(j).id(),
							state.mean().differentialInductance()[i][j]));
				}
			}
		}
		for (int k : legs) {
			figures.add(new Figure(Kind.UTILISATION, input.legs().get(k).id(), input.legs().get(k).id(), state.utilisation(k)));
		}
		return figures;
	}
}
