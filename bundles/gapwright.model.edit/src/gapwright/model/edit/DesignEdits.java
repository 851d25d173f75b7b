package gapwright.model.edit;

import java.util.Collection;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.util.EcoreUtil;

import gapwright.model.Design;
import gapwright.model.GapwrightFactory;
import gapwright.model.edit.history.Edit;

/** Edits of a design as a whole, and those that every element shares. */
public final class DesignEdits {

	private DesignEdits() {
	}

	/**
	 * Sets one feature of one element.
	 *
	 * @param label what the undo menu shows
	 * @param value null leaves the feature out
	 */
	public static Edit set(String label, EObject element, EStructuralFeature feature, Object value) {
		return new Edit(label, element, () -> {
			if (value == null) {
				element.eUnset(feature);
			} else {
				element.eSet(feature, value);
			}
		});
	}

	/**
	 * Deletes elements with all that cannot be without them: the legs and air paths at a joint, the coils round a leg,
	 * a winding whose last coil goes, the drives of a winding. Legs of a deleted material are left without one.
	 */
	public static Edit delete(Collection<? extends EObject> elements) {
		Set<EObject> doomed = Dependants.of(elements);
		String label = elements.size() == 1 ? "Delete " + Kinds.of(elements.iterator().next()) : "Delete " + elements.size() + " elements";
		Set<EObject> owners = new LinkedHashSet<>();
		doomed.forEach(element -> owners.add(element.eContainer()));
		owners.addAll(Dependants.legsOf(doomed));
		return new Edit(label, owners, () -> {
			Dependants.legsOf(doomed).forEach(leg -> leg.setMaterial(null));
			// EcoreUtil.remove, not delete: a search for references through the whole model is not needed, Dependants knows them
			doomed.forEach(EcoreUtil::remove);
		});
	}

	/** Takes one plain value, such as a point of a table, out of its owner. */
	public static Edit remove(String label, EObject value) {
		return new Edit(label, value.eContainer(), () -> EcoreUtil.remove(value));
	}

	/** Gives the design limits of its own, to begin with the usual ones, or takes them away. */
	public static Edit limits(Design design, boolean own) {
		return new Edit(own ? "Add limits" : "Remove limits", List.of(design),
				() -> design.setLimits(own ? GapwrightFactory.eINSTANCE.createLimits() : null));
	}
}
