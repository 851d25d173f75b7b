package gapwright.model;

import java.io.IOException;

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
		attributes(design);
		for (TreeIterator<EObject> all = design.eAllContents(); all.hasNext();) {
			EObject object = all.next();
			attributes(object);
			for (EReference reference : object.eClass().getEAllReferences()) {
				if (!reference.isContainment() && object.eGet(reference) instanceof EObject target
						&& EcoreUtil.getRootContainer(target) != design) {
					throw new IOException(name(object) + ": " + reference.getName()
							+ " refers to something that is not in the design any more");
				}
			}
		}
	}

	private static void attributes(EObject object) throws IOException {
		for (EAttribute attribute : object.eClass().getEAllAttributes()) {
			String wrong = object.eGet(attribute) instanceof String text ? AttributeText.unstorable(text) : null;
			if (wrong != null) {
				throw new IOException(name(object) + ": " + attribute.getName() + ": " + wrong);
			}
		}
	}

	private static String name(EObject object) {
		return object instanceof Element element && element.getId() != null ? element.getId() : object.eClass().getName();
	}
}
