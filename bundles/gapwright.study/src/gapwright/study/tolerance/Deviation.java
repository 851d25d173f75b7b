package gapwright.study.tolerance;

import java.util.ArrayList;
import java.util.List;

import gapwright.model.TolerancedFeature;
import gapwright.study.StudyInput;
import gapwright.study.vary.DesignNumbers;
import gapwright.study.vary.Knob;

/** One tolerance at one operating point: the knobs it turns together and how far each goes. */
final class Deviation {

	private final String id;
	private final boolean normal;
	private final List<Knob> knobs = new ArrayList<>();
	private final double[] nominal;
	private final double[] amount;

	private Deviation(StudyInput.ToleranceData tolerance, List<Knob> turned, StudyInput input, StudyInput.PointData point) {
		id = tolerance.id();
		normal = tolerance.normal();
		knobs.addAll(turned);
		nominal = new double[knobs.size()];
		amount = new double[knobs.size()];
		for (int i = 0; i < nominal.length; i++) {
			Knob knob = knobs.get(i);
			nominal[i] = knob.get(input.numbers());
			double whole = switch (knob.feature()) {
			case CURRENT -> Math.abs(point.drives().get(knob.index()).meanCurrent());
			default -> Math.abs(nominal[i]);
			};
			amount[i] = !Double.isNaN(tolerance.share()) ? tolerance.share() * whole
					: knob.feature() == Knob.Feature.SATURATION ? tolerance.amount() / saturation(input, point, knob)
							: tolerance.amount();
		}
	}

	/** Amounts of saturation are in T, the knob is a factor. */
	private static double saturation(StudyInput input, StudyInput.PointData point, Knob knob) {
		return input.legs().stream().filter(leg -> leg.material().id().equals(knob.subject())).findFirst().orElseThrow()
				.saturation().at(point.celsius());
	}

	/** @return those that turn something in the network, in the order of the design */
	static List<Deviation> of(StudyInput input, StudyInput.PointData point, List<Knob> all) {
		List<Deviation> deviations = new ArrayList<>();
		for (StudyInput.ToleranceData tolerance : input.tolerances()) {
			List<Knob> turned = all.stream().filter(knob -> tolerance.targets().contains(knob.subject())
					&& feature(tolerance.feature()) == knob.feature()).toList();
			if (!turned.isEmpty()) {
				deviations.add(new Deviation(tolerance, turned, input, point));
			}
		}
		return deviations;
	}

	private static Knob.Feature feature(TolerancedFeature feature) {
		return Knob.Feature.valueOf(feature.getName());
	}

	String id() {
		return id;
	}

	boolean isNormal() {
		return normal;
	}

	List<Knob> knobs() {
		return knobs;
	}

	/** @return greatest deviation of one of its knobs */
	double amount(int knob) {
		return amount[knob];
	}

	/** @param share −1 to 1 of the greatest deviation */
	void apply(DesignNumbers numbers, double share) {
		for (int i = 0; i < nominal.length; i++) {
			knobs.get(i).set(numbers, nominal[i] + share * amount[i]);
		}
	}
}
