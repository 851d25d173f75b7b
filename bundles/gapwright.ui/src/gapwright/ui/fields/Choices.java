package gapwright.ui.fields;

import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.function.Function;

import org.eclipse.emf.common.util.Enumerator;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EEnumLiteral;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.util.EcoreUtil;

import gapwright.model.Element;

/**
 * What a choice offers.
 *
 * @param values of an element, in the order shown
 * @param label  of a value, null included
 */
record Choices(Function<EObject, List<?>> values, Function<Object, String> label) {

	static Choices literals(EEnum type) {
		List<Enumerator> values = type.getELiterals().stream().map(EEnumLiteral::getInstance).toList();
		return new Choices(element -> values, value -> FeatureText.label(type, (Enumerator) value));
	}

	/** The elements of the design that a reference may point at. */
	static Choices elements(EReference reference) {
		return new Choices(element -> candidates(element, reference), Choices::label);
	}

	private static List<?> candidates(EObject element, EReference reference) {
		List<EObject> found = new ArrayList<>();
		Iterator<EObject> all = EcoreUtil.getRootContainer(element).eAllContents();
		while (all.hasNext()) {
			EObject next = all.next();
			if (reference.getEReferenceType().isInstance(next)) {
				found.add(next);
			}
		}
		return found;
	}

	/** Name and id where both are there and differ: two legs may share a name. */
	private static String label(Object value) {
		String name = FeatureText.name((EObject) value);
		String id = value instanceof Element element ? element.getId() : null;
		return id == null || id.equals(name) ? name : name + " (" + id + ")";
	}
}
