package gapwright.model.edit;

import java.util.Collection;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.util.EcoreUtil;

import gapwright.model.Design;
import gapwright.model.Element;
import gapwright.model.GapwrightFactory;
import gapwright.model.GapwrightPackage;
import gapwright.model.Ids;
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
	 * @throws IllegalArgumentException when run, for an id that is none or that another element has
	 */
	public static Edit set(String label, EObject element, EStructuralFeature feature, Object value) {
		return new Edit(label, element, () -> {
			if (feature == GapwrightPackage.Literals.ELEMENT__ID) {
				requireFree((Element) element, (String) value);
			}
			if (value == null) {
				element.eUnset(feature);
			} else {
				element.eSet(feature, value);
			}
		});
	}

	private static void requireFree(Element element, String id) {
		String wrong = Ids.problem(id == null ? "" : id);
		Element other = wrong == null && EcoreUtil.getRootContainer(element) instanceof Design design
				? Ids.find(design, id) : null;
		if (wrong == null && other != null && other != element) {
			wrong = "the id '" + id + "' belongs to another " + Kinds.of(other);
		}
		if (wrong != null) {
			throw new IllegalArgumentException(wrong);
		}
	}

	/**
	 * Deletes elements with all that cannot be without them: the legs and air paths at a joint, the coils round a leg,
	 * a winding whose last coil goes, the drives and leakages of a winding, its part in connections. Legs of a deleted
	 * material are left without one; a tolerance goes with the last of its targets.
	 */
	public static Edit delete(Collection<? extends EObject> elements) {
		Set<EObject> doomed = Dependants.of(elements);
		String label = elements.size() == 1 ? "Delete " + Kinds.of(elements.iterator().next())
				: "Delete " + elements.size() + " elements";
		Set<EObject> owners = new LinkedHashSet<>();
		doomed.forEach(element -> owners.add(element.eContainer()));
		owners.addAll(Dependants.legsOf(doomed));
		owners.addAll(Dependants.tolerancesOf(doomed));
		return new Edit(label, owners, () -> {
			Dependants.legsOf(doomed).forEach(leg -> leg.setMaterial(null));
			Dependants.tolerancesOf(doomed).forEach(t -> t.getTargets().removeAll(Dependants.lostTargets(t, doomed)));
			// remove, not delete: the references are known, a search through the whole model is not needed
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
