package gapwright.model.check;

import static gapwright.model.GapwrightPackage.Literals.*;

import java.util.HashMap;
import java.util.Map;

import gapwright.model.Design;
import gapwright.model.Element;
import gapwright.model.Tolerance;
import gapwright.model.TolerancedFeature;
import gapwright.model.TolerancedValue;
import gapwright.model.quantity.Dimension;

/** Judges tolerances: that each is on something, in a fitting unit, and leaves the value inside its domain. */
final class ToleranceCheck {

	private record Value(Element element, TolerancedFeature feature) {
	}

	private final Problems problems;
	private final Map<Value, Tolerance> seen = new HashMap<>();

	ToleranceCheck(Problems problems) {
		this.problems = problems;
	}

	void check(Design design) {
		design.getTolerances().forEach(this::check);
	}

	private void check(Tolerance tolerance) {
		if (tolerance.getTargets().isEmpty()) {
			problems.add(ProblemCode.TOLERANCE_WITHOUT_TARGET, tolerance, TOLERANCE__TARGETS, "the tolerance is on no element",
					"Choose the elements it is for, or delete it.");
		}
		String words = TolerancedValue.words(tolerance.getFeature());
		Dimension amount = TolerancedValue.dimension(tolerance.getFeature());
		if (tolerance.getDeviation() != null && tolerance.getDeviation().dimension() != Dimension.DEVIATION
				&& tolerance.getDeviation().dimension() != amount) {
			problems.add(ProblemCode.TOLERANCE_UNFIT, tolerance, TOLERANCE__DEVIATION,
					"deviation = '" + tolerance.getDeviation() + "': the " + words + " deviates by a share, e.g. 10 %"
							+ (amount == Dimension.DEVIATION ? "" : ", or by " + amount.noun() + ", e.g. " + amount.example()),
					"");
			return;
		}
		for (Element target : tolerance.getTargets()) {
			target(tolerance, target, words);
		}
	}

	private void target(Tolerance tolerance, Element target, String words) {
		if (!TolerancedValue.has(target, tolerance.getFeature())) {
			problems.add(ProblemCode.TOLERANCE_UNFIT, tolerance, TOLERANCE__TARGETS,
					"'" + target.getId() + "' has no " + words, "Choose another value or another element.");
			return;
		}
		Tolerance before = seen.putIfAbsent(new Value(target, tolerance.getFeature()), tolerance);
		if (before != null) {
			problems.add(ProblemCode.TOLERANCE_TWICE, tolerance, TOLERANCE__TARGETS, "the " + words + " of '" + target.getId()
					+ "' " + (before == tolerance ? "is named twice" : "already has the tolerance '" + before.getId() + "'"),
					"Keep one.");
		}
		double nominal = TolerancedValue.nominal(target, tolerance.getFeature());
		double deviation = TolerancedValue.amount(tolerance, nominal);
		if (Double.isNaN(nominal) || Double.isNaN(deviation)) {
			return;
		}
		String reached = reached(tolerance.getFeature(), nominal, deviation);
		if (reached != null) {
			problems.add(ProblemCode.TOLERANCE_REACHES_OUTSIDE, tolerance, TOLERANCE__DEVIATION, "deviation = '"
					+ tolerance.getDeviation() + "': the " + words + " of '" + target.getId() + "' reaches " + reached,
					"Make the deviation smaller.");
		}
	}

	/** @return what the outermost value would be that cannot be, or null when all can */
	private static String reached(TolerancedFeature feature, double nominal, double deviation) {
		return switch (feature) {
		case CURRENT -> null;
		case GAP_LENGTH -> nominal - deviation < 0 ? "a negative gap" : null;
		case REMANENCE -> nominal - deviation < 0 ? "a negative remanence" : null;
		case PERMEABILITY -> nominal - deviation < 1 ? "less than the permeability of air" : null;
		case STACKING_FACTOR -> nominal - deviation <= 0 || nominal + deviation > 1 ? "outside 0 to 1" : null;
		default -> nominal - deviation <= 0 ? "0 or below" : null;
		};
	}
}
