package gapwright.model.check;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;

import gapwright.model.Element;

/**
 * Something about a design as drawn, before anything is computed.
 *
 * @param code     stable name, see the user guide
 * @param severity how much it matters
 * @param element  the object it is about
 * @param feature  its feature, or null when the whole element is meant
 * @param message  a sentence with what was found and what is allowed
 * @param hint     what to do, or ""
 */
public record Problem(String code, Severity severity, EObject element, EStructuralFeature feature, String message,
		String hint) {

	/** @return id of the element, or of the nearest one around it that has an id, or "" */
	public String subject() {
		for (EObject object = element; object != null; object = object.eContainer()) {
			if (object instanceof Element identified && identified.getId() != null) {
				return identified.getId();
			}
		}
		return "";
	}
}
