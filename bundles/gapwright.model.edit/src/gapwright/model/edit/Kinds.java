package gapwright.model.edit;

import java.util.Locale;

import org.eclipse.emf.ecore.EObject;

/** What an element is called in an undo menu. */
final class Kinds {

	private Kinds() {
	}

	/** For example "air path". */
	static String of(EObject element) {
		return element.eClass().getName().replaceAll("(?<=[a-z])(?=[A-Z])", " ").toLowerCase(Locale.ROOT);
	}
}
