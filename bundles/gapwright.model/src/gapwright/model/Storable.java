package gapwright.model;

import java.io.IOException;
import java.util.HashSet;
import java.util.Set;

import org.eclipse.emf.common.util.TreeIterator;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.util.EcoreUtil;

/** Makes sure, before a byte is written, that a file can hold a design and that it can be read back. */
final class Storable {

	private Storable() {
	}

	/** @throws IOException naming element, feature and what cannot be stored */
	static void check(Design design) throws IOException {
		Set<String> ids = new HashSet<>();
		attributes(design);
		for (TreeIterator<EObject> all = design.eAllContents(); all.hasNext();) {
			EObject object = all.next();
			attributes(object);
			references(design, object);
			if (object instanceof Element element && (element.getId() == null || !ids.add(element.getId()))) {
				throw new IOException(name(object) + ": id: " + (element.getId() == null ? "is missing"
						: "is given twice, give one of the elements another"));
			}
		}
	}

	private static void references(Design design, EObject object) throws IOException {
		for (EReference reference : object.eClass().getEAllReferences()) {
			if (!reference.isContainment() && References.of(object, reference).stream()
					.anyMatch(target -> EcoreUtil.getRootContainer(target) != design)) {
				throw new IOException(name(object) + ": " + reference.getName()
						+ " refers to something that is not in the design any more");
			}
		}
	}

	private static void attributes(EObject object) throws IOException {
		for (EAttribute attribute : object.eClass().getEAllAttributes()) {
			if (!object.eIsSet(attribute)) {
				continue;
			}
			String text = EcoreUtil.convertToString(attribute.getEAttributeType(), object.eGet(attribute));
			String wrong = AttributeText.unstorable(text);
			if (wrong == null) {
				wrong = attribute.isID() ? Ids.problem(text) : AttributeText.problem(attribute, text);
			}
			if (wrong != null) {
				throw new IOException(name(object) + ": " + attribute.getName() + ": " + wrong);
			}
		}
	}

	private static String name(EObject object) {
		return object instanceof Element element && element.getId() != null ? element.getId() : object.eClass().getName();
	}
}
