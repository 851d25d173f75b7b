package gapwright.study.sensitivity;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;

import gapwright.physics.material.CurveChange;
import gapwright.physics.network.Network;
import gapwright.physics.network.Parameter;
import gapwright.physics.network.Sensitivities;
import gapwright.physics.network.Solution;
import gapwright.study.StudyInput;
import gapwright.study.vary.DesignNumbers;
import gapwright.study.vary.Knob;
import gapwright.study.vary.PointSolver;

/**
 * Slopes of all figures of a solved point by one knob. Where a voltage imposes the linkage, the current answers:
 * at the swing's end L·di = dλ(mean) − dλ(end), since the swing is about the linkage at the mean current.
 */
public final class FigureSlopes {

	private final StudyInput input;
	private final StudyInput.PointData point;
	private final DesignNumbers numbers;
	private final Network network;
	private final PointSolver.State state;
	private final int[] legs;
	private final Map<Solution, Sensitivities> sensitivities = new IdentityHashMap<>();
	private final List<Integer> imposed = new ArrayList<>();

	/**
	 * @param network of the numbers, at the point's temperature
	 * @param legs    whose utilisation is asked for
	 */
	public FigureSlopes(StudyInput input, StudyInput.PointData point, DesignNumbers numbers, Network network,
			PointSolver.State state, int[] legs) {
		this.input = input;
		this.point = point;
		this.numbers = numbers;
		this.network = network;
		this.state = state;
		this.legs = legs;
		for (int w = 0; w < input.windings().size(); w++) {
			if (point.drives().get(w).imposesLinkage()) {
				imposed.add(w);
			}
		}
	}

	private Sensitivities at(Solution solution) {
		return sensitivities.computeIfAbsent(solution, s -> new Sensitivities(network, s));
	}

	/** @return slopes per unit of the knob, in the order of {@link SensitivityStudy#figures} */
	public double[] of(Knob knob) {
		List<Knob.Effect> effects = knob.effects(numbers, network);
		List<Double> slopes = new ArrayList<>();
		for (int i = 0; i < input.windings().size(); i++) {
			for (int j = i; j < input.windings().size(); j++) {
				if (input.windings().get(i).whole() && input.windings().get(j).whole()) {
					slopes.add(inductance(i, j, effects));
				}
			}
		}
		Map<Solution, double[]> answers = new IdentityHashMap<>();
		for (int k : legs) {
			slopes.add(utilisation(k, knob, effects, answers));
		}
		return slopes.stream().mapToDouble(Double::doubleValue).toArray();
	}

	private double inductance(int i, int j, List<Knob.Effect> effects) {
		double sum = 0;
		for (Knob.Effect effect : effects) {
			sum += effect.rate() * at(state.mean()).inductance(i, j, effect.parameter());
		}
		return sum;
	}

	private double utilisation(int leg, Knob knob, List<Knob.Effect> effects, Map<Solution, double[]> answers) {
		Solution peak = state.peak(leg);
		double density = 0;
		for (Knob.Effect effect : effects) {
			if (peak == state.mean() || !drivesImposed(effect)) {
				density += effect.rate() * at(peak).legFluxDensity(leg, effect.parameter());
			}
		}
		if (peak != state.mean() && !imposed.isEmpty()) {
			double[] current = answers.computeIfAbsent(peak, end -> answer(end, effects));
			for (int v = 0; v < current.length; v++) {
				density += current[v] * at(peak).legFluxDensity(leg, new Parameter.Current(imposed.get(v)));
			}
		}
		double saturation = numbers.saturation(leg, point.celsius());
		double slope = Math.signum(peak.legFluxDensity()[leg]) * density / saturation;
		boolean ownSaturation = knob.feature() == Knob.Feature.SATURATION
				&& input.legs().get(leg).material().id().equals(knob.subject());
		return ownSaturation ? slope - state.utilisation(leg) / knob.get(numbers) : slope;
	}

	private boolean drivesImposed(Knob.Effect effect) {
		return effect.parameter() instanceof Parameter.Current current && imposed.contains(current.winding());
	}

	/** How the currents of the windings with an imposed linkage answer, A per unit. */
	private double[] answer(Solution end, List<Knob.Effect> effects) {
		int n = imposed.size();
		double[][] system = new double[n][n + 1];
		for (int i = 0; i < n; i++) {
			for (int j = 0; j < n; j++) {
				system[i][j] = end.differentialInductance()[imposed.get(i)][imposed.get(j)];
			}
			for (Knob.Effect effect : effects) {
				system[i][n] += effect.rate() * at(state.mean()).linkage(imposed.get(i), effect.parameter());
				if (!drivesImposed(effect)) {
					system[i][n] -= effect.rate() * at(end).linkage(imposed.get(i), effect.parameter());
				}
			}
		}
		return SmallSystem.solve(system);
	}

	/** @return the number a knob stands for, SI */
	double value(Knob knob) {
		return switch (knob.feature()) {
		case PERMEABILITY -> CurveChange.initialPermeability(network.curve(legOf(knob)));
		case SATURATION -> numbers.saturation(legOf(knob), point.celsius());
		case CURRENT -> point.drives().get(knob.index()).meanCurrent() + knob.get(numbers);
		default -> knob.get(numbers);
		};
	}

	/** @return the number a knob stands for per unit of the knob: 1 but for factors */
	double scale(Knob knob) {
		return knob.feature() == Knob.Feature.PERMEABILITY || knob.feature() == Knob.Feature.SATURATION
				? value(knob) / knob.get(numbers) : 1;
	}

	private int legOf(Knob knob) {
		for (int k = 0; k < input.legs().size(); k++) {
			if (input.legs().get(k).material().id().equals(knob.subject())) {
				return k;
			}
		}
		throw new IllegalStateException("no leg of material " + knob.subject());
	}
}
