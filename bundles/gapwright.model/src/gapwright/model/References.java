package gapwright.model;

import java.util.List;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;

/** What a reference refers to, be it to one or to many. */
public final class References {

	private References() {
	}

	@SuppressWarnings("unchecked")
	public static List<EObject> of(EObject object, EReference reference) {
		Object value = object.eGet(reference);
		return reference.isMany() ? (List<EObject>) value : value == null ? List.of() : List.of((EObject) value);
	}
}
