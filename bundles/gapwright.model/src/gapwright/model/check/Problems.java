package gapwright.model.check;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;

/** Collects what the checks of one run find. */
final class Problems {

	private final List<Problem> found = new ArrayList<>();

	/** @param feature null when the whole element is meant */
	void add(ProblemCode code, EObject element, EStructuralFeature feature, String message, String hint) {
		found.add(new Problem(code.code(), code.severity(), element, feature, message, hint));
	}

	List<Problem> list() {
		return List.copyOf(found);
	}
}
