package gapwright.model.edit;

import java.util.Collection;
import java.util.List;

import gapwright.model.Design;
import gapwright.model.Element;
import gapwright.model.GapwrightFactory;
import gapwright.model.Ids;
import gapwright.model.Tolerance;
import gapwright.model.TolerancedFeature;
import gapwright.model.TolerancedValue;
import gapwright.model.edit.history.Edit;
import gapwright.model.quantity.Quantity;

/** Edits of tolerances. */
public final class ToleranceEdits {

	private ToleranceEdits() {
	}

	/**
	 * Adds a tolerance, to begin with on one value.
	 *
	 * @param targets   elements that have the value; they deviate together
	 * @param deviation a share or an amount
	 * @throws IllegalArgumentException when run, if a target does not have the value
	 */
	public static Edit add(Design design, Collection<? extends Element> targets, TolerancedFeature feature, Quantity deviation) {
		return new Edit("Add tolerance", design, () -> {
			Tolerance tolerance = GapwrightFactory.eINSTANCE.createTolerance();
			tolerance.setId(Ids.next(design, "tolerance"));
			targets.forEach(target -> require(target, feature));
			tolerance.getTargets().addAll(targets);
			tolerance.setFeature(feature);
			tolerance.setDeviation(deviation);
			design.getTolerances().add(tolerance);
		});
	}

	/** Puts other targets in place of those a tolerance has. */
	public static Edit retarget(Tolerance tolerance, Collection<? extends Element> targets) {
		return new Edit("Change tolerance's elements", tolerance, () -> {
			targets.forEach(target -> require(target, tolerance.getFeature()));
			tolerance.getTargets().clear();
			tolerance.getTargets().addAll(List.copyOf(targets));
		});
	}

	private static void require(Element target, TolerancedFeature feature) {
		if (!TolerancedValue.has(target, feature)) {
			throw new IllegalArgumentException(Kinds.of(target) + " '" + target.getId() + "' has no "
					+ TolerancedValue.words(feature));
		}
	}
}
