package gapwright.model;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EClassifier;
import org.eclipse.emf.ecore.EReference;

/** The model's names as messages use them. */
final class ModelWords {

	private ModelWords() {
	}

	/** @return "an air path" */
	static String article(EClass type) {
		String words = words(type.getName());
		return ("aeiou".indexOf(words.charAt(0)) >= 0 ? "an " : "a ") + words;
	}

	/** "OperatingPoint" becomes "operating point". */
	static String words(String name) {
		return name.replaceAll("(?<=[a-z])(?=[A-Z])", " ").toLowerCase(Locale.ROOT);
	}

	/** @return what xsi:type may be where the class is expected */
	static String concrete(EClass type) {
		List<String> names = new ArrayList<>();
		for (EClassifier classifier : GapwrightPackage.eINSTANCE.getEClassifiers()) {
			if (classifier instanceof EClass each && !each.isAbstract() && type.isSuperTypeOf(each)) {
				names.add("gapwright:" + each.getName());
			}
		}
		return String.join(", ", names);
	}

	/** @return names of all attributes and references of a class */
	static String attributes(EClass type) {
		return String.join(", ", type.getEAllStructuralFeatures().stream()
				.filter(f -> !(f instanceof EReference r) || !r.isContainment()).map(f -> f.getName()).toList());
	}

	/** @return names of all elements that may stand inside one of the class */
	static String children(EClass type) {
		List<String> names = type.getEAllContainments().stream().map(f -> f.getName()).toList();
		return names.isEmpty() ? "none" : String.join(", ", names);
	}
}
